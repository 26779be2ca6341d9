// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { UNIT_KEY } from './unit-script';
import { UnitSwitch } from './unit-switch';

beforeEach(() => {
  localStorage.clear();
  document.documentElement.dataset.unit = 'mm';
});
afterEach(cleanup);

function show(address: string) {
  const router = createMemoryRouter([{ path: '*', Component: UnitSwitch }], { initialEntries: [address] });
  render(<RouterProvider router={router} />);
  return router;
}

it('shows the chosen unit at once, and remembers it', async () => {
  show('/g/lh-1966-30');
  await userEvent.click(screen.getByRole('link', { name: 'in: inches' }));
  expect(document.documentElement.dataset.unit).toBe('in');
  expect(localStorage.getItem(UNIT_KEY)).toBe('in');
  expect(screen.getByRole('link', { current: true }).textContent).toContain('inches');
});

it('takes a unit out of the address, which would else win again', async () => {
  const router = show('/search?kind=dress&unit=cm');
  await userEvent.click(screen.getByRole('link', { name: 'mm: millimetres' }));
  expect(router.state.location.search).toBe('?kind=dress');
});

it('leaves an address without a unit alone', async () => {
  const router = show('/search?kind=dress');
  await userEvent.click(screen.getByRole('link', { name: 'cm: centimetres' }));
  expect(router.state.location.key).toBe('default');
});
