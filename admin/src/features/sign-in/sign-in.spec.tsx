import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { safeNext } from '../../config/paths.js';
import { House } from '../../testing/fake-api/house.js';
import { idOf, INVITATION_TOKEN, PASSWORD, staff } from '../../testing/fake-api/people.js';
import { renderWorkroom } from '../../testing/render-workroom.js';

const nobodyIn = () => {
  const house = new House(null);
  house.refreshes = false;
  return house;
};

describe('signing in', () => {
  it('leads whoever is not signed in to the door, and afterwards to where they were going', async () => {
    const { user, router } = renderWorkroom('/?stage=draft', { house: nobodyIn() });
    await user.type(await screen.findByLabelText('E-mail address'), staff.recorder.email);
    await user.type(screen.getByLabelText('Password'), PASSWORD);
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('heading', { name: 'Garments', level: 1 })).toBeVisible();
    expect(router.state.location.search).toBe('?stage=draft');
  });

  it('says what to mend first, with the focus on it, and sends nothing', async () => {
    const { user, asked } = renderWorkroom('/sign-in', { house: nobodyIn() });
    await user.click(await screen.findByRole('button', { name: 'Sign in' }));
    const summary = await screen.findByRole('group', { name: 'There are 2 things to mend' });
    await waitFor(() => expect(summary).toHaveFocus());
    await user.click(within(summary).getByRole('link', { name: 'Write your password' }));
    expect(screen.getByLabelText('Password')).toHaveFocus();
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(/Write your password/);
    expect(asked).not.toContain('POST /session');
  });

  it('does not tell which of address and password was wrong, and keeps the address', async () => {
    const { user } = renderWorkroom('/sign-in', { house: nobodyIn() });
    await user.type(await screen.findByLabelText('E-mail address'), staff.recorder.email);
    await user.type(screen.getByLabelText('Password'), 'not the password');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText(/do not belong together/)).toBeVisible();
    expect(screen.getByLabelText('E-mail address')).toHaveValue(staff.recorder.email);
  });

  it('asks for patience after many tries', async () => {
    const tooMany = new Response(
      JSON.stringify({ type: 'x', title: 'Slow down', status: 429, code: 'sign-in.slow' }),
      { status: 429 },
    );
    const { user } = renderWorkroom('/sign-in', {
      house: nobodyIn(),
      intercept: ({ url, method }) => (url.endsWith('/session') && method === 'POST' ? tooMany : undefined),
    });
    await user.type(await screen.findByLabelText('E-mail address'), staff.recorder.email);
    await user.type(screen.getByLabelText('Password'), PASSWORD);
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText(/Wait a minute/)).toBeVisible();
  });

  it.each(['//elsewhere.example', 'https://elsewhere.example', '/\\elsewhere.example', null])(
    'never leads out of the house: %s',
    (next) => {
      expect(safeNext(next)).toBe('/');
    },
  );
});

describe('a session that ends while somebody works', () => {
  it('is refreshed once and the request sent again, without a word', async () => {
    const house = new House();
    let refused = false;
    const { asked } = renderWorkroom('/', {
      house,
      intercept: ({ url }) => {
        if (!url.includes('/workroom/garments') || refused) return undefined;
        refused = true;
        return new Response(
          JSON.stringify({ type: 'x', title: 'Ended', status: 401, code: 'session.ended' }),
          { status: 401 },
        );
      },
    });
    expect(await screen.findByText('LH.1966.30')).toBeVisible();
    expect(asked.filter((call) => call === 'POST /session/refresh')).toHaveLength(1);
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('asks to sign in over the page, keeps what was typed, and saves it afterwards', async () => {
    const house = new House();
    const { user } = renderWorkroom(`/garments/${idOf(100)}`, { house });
    const title = await screen.findByLabelText('Title');
    await user.clear(title);
    await user.type(title, 'Promenade dress');
    house.signedIn = null;
    house.refreshes = false;
    await user.click(screen.getByRole('button', { name: 'Save the record' }));
    const dialog = await screen.findByRole('dialog', { name: 'Sign in again' });
    expect(within(dialog).getByLabelText('E-mail address')).toHaveValue(staff.recorder.email);
    await user.type(within(dialog).getByLabelText('Password'), PASSWORD);
    await user.click(within(dialog).getByRole('button', { name: 'Sign in' }));
    await waitFor(() => expect(house.garment(idOf(100))?.record.title).toBe('Promenade dress'));
    expect(await screen.findByText(/^Saved, /)).toBeVisible();
  });

  it('signing out shows nothing more', async () => {
    const { user, house } = renderWorkroom('/');
    await user.click(await screen.findByRole('button', { name: 'Sign out' }));
    expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeVisible();
    expect(house.signedIn).toBeNull();
  });
});

describe('an invitation', () => {
  it('shows what one is invited to, and lets one in with a password', async () => {
    const { user, house } = renderWorkroom(`/invitation#${INVITATION_TOKEN}`, { house: nobodyIn() });
    expect(await screen.findByRole('heading', { name: 'Welcome to Larkmoor House' })).toBeVisible();
    expect(screen.getByText(/invited as recorder/)).toBeVisible();
    await user.type(screen.getByLabelText('New password'), 'thimble ledger tape');
    await user.click(screen.getByRole('button', { name: 'Set the password and go in' }));
    expect(await screen.findByRole('heading', { name: 'Garments' })).toBeVisible();
    expect(house.signedIn?.name).toBe('Odette Farrow');
  });

  it('lays the API’s refusal of a password beside the password', async () => {
    const { user } = renderWorkroom(`/invitation#${INVITATION_TOKEN}`, { house: nobodyIn() });
    await user.type(await screen.findByLabelText('New password'), 'password1234');
    await user.click(screen.getByRole('button', { name: 'Set the password and go in' }));
    await waitFor(() =>
      expect(screen.getByLabelText('New password')).toHaveAccessibleDescription(
        /Many people use this password/,
      ),
    );
  });

  it('says the same of a link that was used, ran out or is wrong', async () => {
    renderWorkroom(`/invitation#${'x'.repeat(43)}`, { house: nobodyIn() });
    expect(await screen.findByRole('heading', { name: 'This invitation cannot be used' })).toBeVisible();
  });

  it('opens an empty house for its first administrator', async () => {
    const { user, router } = renderWorkroom(`/first-administrator#${'k'.repeat(43)}`, { house: nobodyIn() });
    await user.type(await screen.findByLabelText('Your name'), 'Ansel Dray');
    await user.type(screen.getByLabelText('E-mail address'), 'ansel.dray@larkmoor.example');
    await user.type(screen.getByLabelText('New password'), 'thimble ledger tape');
    await user.click(screen.getByRole('button', { name: 'Open the house' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/people'));
  });
});
