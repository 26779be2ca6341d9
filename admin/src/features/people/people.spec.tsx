import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { staff } from '../../testing/fake-api/people.js';
import { renderWorkroom } from '../../testing/render-workroom.js';

const administratorIn = () => new House(staff.administrator);
const named = (house: House, name: string) => house.people.find((one) => one.name === name);

describe('people', () => {
  it('invites with at least one role, and shows the invitation as open', async () => {
    const { user, house } = renderWorkroom('/people', { house: administratorIn() });
    await user.type(await screen.findByLabelText('Name'), 'Lowell Finch');
    await user.type(screen.getByLabelText('E-mail address'), 'lowell.finch@larkmoor.example');
    await user.click(screen.getByRole('button', { name: 'Send the invitation' }));
    expect(await screen.findByRole('link', { name: 'Choose at least one role' })).toBeVisible();
    await user.click(screen.getByLabelText(/^Curator/));
    await user.click(screen.getByRole('button', { name: 'Send the invitation' }));
    expect(await screen.findByText(/on its way to lowell.finch@larkmoor.example/)).toBeVisible();
    expect(
      await screen.findByRole('button', { name: 'Take back the invitation of Lowell Finch' }),
    ).toBeVisible();
    expect(house.invitations.at(-1)?.roles).toEqual(['curator']);
  });

  it('takes an invitation back', async () => {
    const { user, house } = renderWorkroom('/people', { house: administratorIn() });
    await user.click(
      await screen.findByRole('button', { name: 'Take back the invitation of Odette Farrow' }),
    );
    expect(await screen.findByText('Everybody who was invited has come in.')).toBeVisible();
    expect(house.invitations).toEqual([]);
  });

  it('changes roles and closes access, but not one’s own', async () => {
    const { user, house } = renderWorkroom('/people', { house: administratorIn() });
    await user.click(await screen.findByRole('button', { name: 'Change roles of Pia Hollin' }));
    const dialog = await screen.findByRole('dialog', { name: 'Roles of Pia Hollin' });
    await user.click(within(dialog).getByLabelText(/^Recorder/));
    await user.click(within(dialog).getByRole('button', { name: 'Save the roles' }));
    await waitFor(() => expect(named(house, 'Pia Hollin')?.roles).toEqual(['recorder', 'desk']));
    await user.click(await screen.findByRole('button', { name: 'Close access of Wren Aldous' }));
    await waitFor(() => expect(named(house, 'Wren Aldous')?.active).toBe(false));
    expect(screen.queryByRole('button', { name: 'Close access of Ansel Dray' })).toBeNull();
  });
});

describe('the audit trail', () => {
  it('says who did what, and leads to the garment', async () => {
    renderWorkroom('/audit', { house: administratorIn() });
    const link = await screen.findByRole('link', { name: 'Wren Aldous opened a sheet for LH.1966.30.1' });
    expect(link).toHaveAttribute('href', expect.stringMatching(/^\/garments\//));
  });

  it('says that it failed', async () => {
    renderWorkroom('/audit', {
      house: administratorIn(),
      intercept: ({ url }) => (url.includes('/audit') ? new Response('gone', { status: 500 }) : undefined),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('answered 500');
  });
});

describe('who is told of damage', () => {
  it('is every curator, until somebody is named', async () => {
    const house = new House(staff.administrator);
    const { user } = renderWorkroom('/people', { house });
    const group = await screen.findByRole('group', { name: /^Every curator is written to/ });
    await user.click(within(group).getByRole('checkbox', { name: 'Pia Hollin' }));
    expect(await screen.findByRole('group', { name: /^Written to when measuring stops/ })).toBeVisible();
    expect(house.damageReportedTo).toEqual([staff.desk.id]);
    await user.click(screen.getByRole('checkbox', { name: 'Pia Hollin' }));
    expect(await screen.findByRole('group', { name: /^Every curator/ })).toBeVisible();
  });
});
