// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { provideDrawings } from '../../components/diagram/drawings';
import MeasuringSheet from '../../components/diagram/measuring-sheet';
import OutlineShapes from '../../components/diagram/outline-shapes';
import { dressInTwoParts } from '../../testing/fixture-dress';
import { PartSection } from './part-section';

const skirt = dressInTwoParts.parts[1];

beforeEach(() => {
  provideDrawings({ Sheet: MeasuringSheet, Outline: OutlineShapes });
  Element.prototype.scrollIntoView = () => undefined;
  const section = skirt && <PartSection part={skirt} index={1} alone={false} picture={null} heading={null} />;
  const router = createMemoryRouter([{ path: '*', element: section }], { initialEntries: ['/g/lh-1966-30'] });
  render(<RouterProvider router={router} />);
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
