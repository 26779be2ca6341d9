// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import type { PublishedPart } from '@ellwand/shared/records/published-garment';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { provideDrawings } from '../../components/diagram/drawings';
import MeasuringSheet from '../../components/diagram/measuring-sheet';
import OutlineShapes from '../../components/diagram/outline-shapes';
import { dressInTwoParts } from '../../testing/fixture-dress';
import { PartSection } from './part-section';

const [, skirt] = dressInTwoParts.parts;
if (!skirt) throw new Error('the dress of the fixtures has a skirt');

function show(part: PublishedPart) {
  const section = <PartSection part={part} index={1} alone={false} picture={null} heading={null} />;
  const router = createMemoryRouter([{ path: '*', element: section }], { initialEntries: ['/g/lh-1966-30'] });
  render(<RouterProvider router={router} />);
}

beforeEach(() => {
  provideDrawings({ Sheet: MeasuringSheet, Outline: OutlineShapes });
  Element.prototype.scrollIntoView = () => undefined;
  show(skirt);
});
afterEach(cleanup);

const rowOf = (pointId: string) => document.getElementById(`part-2-${pointId}`)?.closest('tr');
const linesOf = (pointId: string) => [...document.querySelectorAll(`[data-point="${pointId}"]`)];
const button = (name: RegExp) => screen.getByRole('button', { name });

it('lights a line in both widths of the drawing while its row is pointed at', () => {
  const row = rowOf('waistband');
  if (row) fireEvent.pointerEnter(row);
  expect(linesOf('waistband').map((line) => line.hasAttribute('data-lit'))).toEqual([true, true]);
  expect(linesOf('hem').map((line) => line.hasAttribute('data-lit'))).toEqual([false, false]);
  if (row) fireEvent.pointerLeave(row);
  expect(linesOf('waistband').some((line) => line.hasAttribute('data-lit'))).toBe(false);
});

it('lights a row while its line is pointed at', () => {
  fireEvent.pointerOver(linesOf('hem')[0]?.querySelector('.drawing-hit') ?? document.body);
  expect(rowOf('hem')?.hasAttribute('data-lit')).toBe(true);
});

it('goes from a line to its row by a click, and keeps both lit', () => {
  fireEvent.click(linesOf('hem-depth')[0]?.querySelector('.drawing-hit') ?? document.body);
  expect(document.activeElement).toBe(button(/show hem depth/));
  expect(button(/show hem depth/).getAttribute('aria-pressed')).toBe('true');
  expect(linesOf('hem-depth').every((line) => line.hasAttribute('data-chosen'))).toBe(true);
});

it('lights a line for whoever comes by keyboard, and puts it out by a second press', async () => {
  act(() => button(/show waistband/).focus());
  expect(linesOf('waistband').every((line) => line.hasAttribute('data-lit'))).toBe(true);
  await userEvent.keyboard('{Enter}');
  expect(button(/show waistband/).getAttribute('aria-pressed')).toBe('true');
  await userEvent.keyboard('{Enter}');
  expect(button(/show waistband/).getAttribute('aria-pressed')).toBe('false');
});

describe('a part measured by a later protocol', () => {
  const loop: PublishedPart['ownPoints'][number] = {
    id: 'own-band-to-loop',
    group: 'skirt-length',
    name: 'Band to train loop',
    definition: 'Inside, from the band down to the loop that lifts the train.',
    from: 'the lower edge of the band',
    to: 'the loop’s stitching',
    side: 'inside',
    how: 'straight',
    handlingStep: 'opened-inside',
    range: null,
    watchFor: '',
    takesTapeLengths: false,
    levelRecorded: false,
    paired: false,
    line: {
      view: 'inside',
      along: [
        [-30, 40],
        [-30, 640],
      ],
    },
  };
  const [first] = skirt.measurements;
  const pointIds = [loop.id, ...skirt.measurements.map(({ pointId }) => pointId).reverse()];

  beforeEach(() => {
    cleanup();
    if (!first) throw new Error('the skirt of the fixtures is measured');
    const measured = { ...first, pointId: loop.id, label: loop.name, valueMm: '812' };
    show({
      ...skirt,
      measurements: [...skirt.measurements, measured],
      protocol: { version: 2, pointIds },
      ownPoints: [loop],
    });
  });

  it('has its rows and letters in that protocol’s order', () => {
    const letters = [...document.querySelectorAll('.measures .letter')];
    expect(letters.map(({ textContent }) => textContent).join('')).toBe('ABCDEF');
    expect(letters.map(({ id }) => id.replace('part-2-', ''))).toEqual(pointIds);
  });

  it('draws the museum’s own line in both widths, and lights it with its row', () => {
    const lines = linesOf(loop.id);
    expect(lines).toHaveLength(2);
    expect(lines[0]?.querySelector('.drawing-letter')?.textContent).toBe('A');
    const row = rowOf(loop.id);
    if (row) fireEvent.pointerEnter(row);
    expect(lines.every((line) => line.hasAttribute('data-lit'))).toBe(true);
  });

  it('defines the museum’s own point, which has no page to lead to', () => {
    expect(screen.queryByRole('link', { name: loop.name })).toBeNull();
    expect(rowOf(loop.id)?.textContent).toContain('Inside, straight; ');
    expect(screen.getByText(loop.definition)).toBeTruthy();
    expect(screen.getByText('From the lower edge of the band to the loop’s stitching.')).toBeTruthy();
  });
});

describe('a part of which both sides were read', () => {
  const [first] = skirt.measurements;
  if (!first) throw new Error('the skirt of the fixtures is measured');
  const side = { ...first, pointId: 'waist-to-hem-side', label: 'Waist to hem, side' };

  beforeEach(() => {
    cleanup();
    show({
      ...skirt,
      measurements: [
        { ...side, worn: 'right', valueMm: '1030' },
        { ...side, worn: 'left', valueMm: '1042', gapMm: '28', depthMm: '60' },
        { ...first, method: 'flat-doubled', halfMm: '310' },
      ],
      notTaken: [{ ...side, pointId: 'side-seam', label: 'Side seam', worn: 'left', reason: 'too-fragile' }],
    });
  });

  it('names the side in each row, and lights one line for both', () => {
    const rows = ['waist-to-hem-side', 'waist-to-hem-side-left'].map(rowOf);
    expect(rows.map((row) => row?.querySelector('th')?.firstChild?.textContent)).toEqual(
      Array(2).fill('Waist to hem, side'),
    );
    expect(rows[0]?.textContent).toContain('right, as worn');
    expect(rows[1]?.textContent).toContain('left, as worn');
    expect(linesOf('waist-to-hem-side')).toHaveLength(2);
    fireEvent.click(button(/waist to hem, side, left, as worn on the diagram/));
    expect(rows.map((row) => row?.hasAttribute('data-lit'))).toEqual([true, true]);
    expect(screen.getByText(/left, as worn: too fragile/)).toBeTruthy();
  });

  it('tells what the tape crossed, how deep the level lay, and a method that is not the point’s own', () => {
    const left = rowOf('waist-to-hem-side-left')?.textContent;
    expect(left).toContain('60 mm');
    expect(left).toContain('below the waist');
    expect(left).toMatch(/the tape crossed a gap of 28 mm.*, taken off; 2 readings/);
    expect(rowOf(first.pointId)?.textContent).toMatch(
      /Inside, flat and doubled instead of round; half 310 mm/,
    );
  });
});

it('says how a part is cut, in the tables that have something to say, and nothing of one that has none', () => {
  expect(screen.queryByRole('heading', { name: /is cut$/ })).toBeNull();
  const [bodice] = dressInTwoParts.parts;
  cleanup();
  if (bodice) show(bodice);
  expect(screen.getByRole('heading', { name: 'How the bodice is cut' })).toBeTruthy();
  const panels = screen.getByRole('region', { name: 'Panel widths of the bodice' });
  expect(panels.querySelectorAll('thead th').length).toBe(3);
  const sum = [...panels.querySelectorAll('tfoot tr')][0];
  expect(sum?.textContent).toContain('872 mm');
  expect(sum?.textContent).toContain('± 3.2');
  expect(screen.queryByRole('region', { name: /Pleats|Fullness/ })).toBeNull();
});
