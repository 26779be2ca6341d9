import type { StoredTableNote } from '@ellwand/shared/records/table-note';
import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { idOf, staff } from '../../testing/fake-api/people.js';
import { renderWorkroom } from '../../testing/render-workroom.js';
import { laidIn } from './lay-in.js';

const noted = (number: number, thing: 'label' | 'condition' | 'remark', text: string): StoredTableNote => ({
  id: idOf(number),
  device: 'Tablet 7c1d',
  saidAt: `2026-12-01T10:0${number % 10}:00.000Z`,
  by: staff.curator.id,
  byName: staff.curator.name,
  receivedAt: '2026-12-01T10:30:00.000Z',
  about: 'described',
  thing,
  text,
});

function houseWith(...notes: StoredTableNote[]): House {
  const house = new House();
  house.sheets[0]!.tableNotes.push(...notes);
  return house;
}

const panel = () => screen.findByRole('region', { name: 'Noted at the table, not yet in the record' });
const address = `/garments/${idOf(100)}`;

describe('what was noted at the table', () => {
  it('is laid into its box after what stands there, and done once the record is saved', async () => {
    const house = houseWith(noted(7001, 'condition', 'A tear of 22 mm at the left underarm.'));
    const { user } = renderWorkroom(address, { house });
    const waiting = within(await panel());
    expect(waiting.getByText(/^Imogen Sallow/)).toBeVisible();
    await user.click(waiting.getByRole('button', { name: /^Lay into “Condition”/ }));
    const box = screen.getByRole('textbox', { name: /^Condition/ });
    expect(box).toHaveValue(
      'Splits at the underarms, stable. Velvet crushed at the hem.\nA tear of 22 mm at the left underarm.',
    );
    expect(box).toHaveFocus();
    expect(house.settled.size).toBe(0);
    await user.click(screen.getByRole('button', { name: 'Save the record' }));
    await waitFor(() => expect(house.settled.get(idOf(7001))).toBe('laid-in'));
    await waitFor(() => expect(screen.queryByText('Noted at the table, not yet in the record')).toBeNull());
    expect(house.garments[0]!.record.condition).toContain('A tear of 22 mm');
  });

  it('is set aside without touching the record', async () => {
    const house = houseWith(
      noted(7002, 'remark', 'Smells of camphor.'),
      noted(7003, 'label', 'No label found.'),
    );
    const { user } = renderWorkroom(address, { house });
    const waiting = within(await panel());
    await user.click(waiting.getByRole('button', { name: /^Set aside : remark/ }));
    await waitFor(() => expect(waiting.queryByText(/camphor/)).toBeNull());
    expect(waiting.getByText(/No label found/)).toBeVisible();
    expect(screen.getByRole('textbox', { name: /^Handling notes/ })).toHaveValue(
      'The silk splits at both underarms. Lift on the board, never by the shoulders.',
    );
  });

  it('is no matter where nothing waits', async () => {
    renderWorkroom(address);
    await screen.findByRole('textbox', { name: /^Condition/ });
    expect(screen.queryByText('Noted at the table, not yet in the record')).toBeNull();
  });

  it('says that it failed, and leaves the record to be written', async () => {
    renderWorkroom(address, {
      intercept: ({ url }) =>
        url.includes('/noted-at-table') ? new Response('gone', { status: 500 }) : undefined,
    });
    expect(await screen.findByRole('alert')).toBeVisible();
    expect(screen.getByRole('button', { name: 'Save the record' })).toBeVisible();
  });
});

it('lays a note in once, however often it is asked to', () => {
  const once = laidIn('Sound.', 'A tear of 22 mm.');
  expect(once).toBe('Sound.\nA tear of 22 mm.');
  expect(laidIn(once, 'A tear of 22 mm.')).toBe(once);
  expect(laidIn('  ', 'A tear of 22 mm.')).toBe('A tear of 22 mm.');
});
