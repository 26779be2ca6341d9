import { screen, waitFor, within } from '@testing-library/react';
import type { UserEvent } from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { idOf, staff } from '../../testing/fake-api/people.js';
import { bodiceSheetId, reading, skirtSheetId } from '../../testing/fake-api/sheets.js';
import { type Interception, renderWorkroom } from '../../testing/render-workroom.js';

/** Opens a sheet as the table does: cautions read, the garment laid open. */
async function openSheet(
  id: string,
  { house = new House(), intercept }: { house?: House; intercept?: Interception } = {},
) {
  const opened = renderWorkroom(`/sheets/${id}`, { house, intercept });
  const { user } = opened;
  await user.click(await screen.findByRole('button', { name: /We have read this/ }));
  await layAsAsked(user);
  return opened;
}

async function layAsAsked(user: UserEvent) {
  await user.click(await screen.findByRole('button', { name: /It lies so/ }));
  await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
}

const standing = (house: House, sheetId: string, pointId: string) =>
  house.sheet(sheetId)?.readings.filter((one) => one.pointId === pointId && one.stands) ?? [];
const rowOf = (label: RegExp) => screen.getByLabelText(label).closest('li')!;
const noNetwork: Interception = ({ method, url }) =>
  method === 'POST' && url.endsWith('/readings') ? Promise.reject(new TypeError('no network')) : undefined;

describe('before the sheet opens', () => {
  it('shows hazards with their cautions and the handling notes, once a day', async () => {
    const { user, unmount } = renderWorkroom(`/sheets/${bodiceSheetId}`);
    expect(await screen.findByText('Arsenic (greens, dyes, paints)')).toBeVisible();
    expect(screen.getByText(/Disposable gloves; wash hands/)).toBeVisible();
    expect(screen.getByText(/never by the shoulders/)).toBeVisible();
    expect(screen.queryByLabelText(/^Waist/)).toBeNull();
    await user.click(screen.getByRole('button', { name: /We have read this/ }));
    expect(await screen.findByLabelText(/^Waist,/)).toBeInTheDocument();
    unmount();
    renderWorkroom(`/sheets/${bodiceSheetId}`);
    expect(await screen.findByLabelText(/^Waist,/)).toBeInTheDocument();
  });
});

describe('entry by keyboard alone', () => {
  it('keeps a reading with Enter and goes on to the next point in handling order', async () => {
    const { user, house } = await openSheet(skirtSheetId);
    await waitFor(() => expect(screen.getByLabelText(/^Waistband,/)).toHaveFocus());
    await user.keyboard('612{Enter}');
    await waitFor(() => expect(screen.getByLabelText(/^Hip,/)).toHaveFocus());
    await waitFor(() =>
      expect(standing(house, skirtSheetId, 'waistband')[0]).toMatchObject({
        valueMm: '612',
        typed: '612',
        unit: 'mm',
        readBy: staff.recorder.id,
      }),
    );
    expect(await screen.findByText(/^All readings sent, \d\d:\d\d$/)).toBeVisible();
  });

  it('takes a hem in whole tapes and a rest', async () => {
    const { user, house } = await openSheet(skirtSheetId);
    screen.getByLabelText('Hem, whole tapes').focus();
    await user.keyboard('3{Enter}742');
    expect(rowOf(/^Hem, millimetres/)).toHaveTextContent('= 5242 mm');
    await user.keyboard('{Enter}');
    await waitFor(() =>
      expect(standing(house, skirtSheetId, 'hem')[0]).toMatchObject({
        valueMm: '5242',
        typed: '742',
        tapeCount: 3,
        tapeLengthMm: '1500',
      }),
    );
  });

  it('says why a point is not taken, from the row’s own menu', async () => {
    const { user, house } = await openSheet(skirtSheetId);
    screen.getByLabelText(/^Hip,/).focus();
    const menu = within(rowOf(/^Hip,/)).getByRole('button', { name: 'More for Hip' });
    menu.focus();
    await user.keyboard('{Enter}');
    await user.keyboard('{Enter}');
    const question = await screen.findByRole('dialog', { name: 'Hip: why is it not taken?' });
    await user.click(within(question).getByRole('button', { name: 'Keep the reason' }));
    expect(question).toHaveTextContent('Choose the reason that fits best.');
    within(question).getByLabelText('Does not apply to this cut').focus();
    await user.keyboard(' ');
    within(question).getByRole('button', { name: 'Keep the reason' }).focus();
    await user.keyboard('{Enter}');
    await waitFor(() =>
      expect(standing(house, skirtSheetId, 'hip')[0]).toMatchObject({
        state: 'not-taken',
        reason: 'not-applicable',
        valueMm: null,
      }),
    );
    expect(rowOf(/^Hip,/)).toHaveTextContent('not taken');
  });

  it('corrects by a new reading that takes the old one’s place; nothing is overwritten', async () => {
    const { user, house } = await openSheet(bodiceSheetId);
    const waist = screen.getByLabelText(/^Waist, m/);
    waist.focus();
    await user.keyboard('{Control>}a{/Control}618{Enter}');
    await waitFor(() =>
      expect(standing(house, bodiceSheetId, 'waist')[0]).toMatchObject({
        valueMm: '618',
        replaces: idOf(3002),
      }),
    );
    const readings = house.sheet(bodiceSheetId)!.readings.filter(({ pointId }) => pointId === 'waist');
    expect(readings).toHaveLength(2);
    // The level that was found still holds for the corrected reading.
    expect(standing(house, bodiceSheetId, 'waist')[0]?.levelFoundBy).toBe('seam');
  });

  it('keeps what was typed and its unit, comma and fraction alike', async () => {
    const { user, house } = await openSheet(skirtSheetId);
    await user.click(screen.getByRole('button', { name: 'in' }));
    screen.getByLabelText(/^Waistband,/).focus();
    await user.keyboard('24 3/8{Enter}');
    await waitFor(() =>
      expect(standing(house, skirtSheetId, 'waistband')[0]).toMatchObject({
        typed: '24 3/8',
        unit: 'in',
        valueMm: '619.125',
      }),
    );
    expect(screen.getByLabelText(/^Waistband, inches/)).toHaveValue('24 3/8');
  });

  it('says beside the row what cannot be read, stays there and sends nothing', async () => {
    const { user, asked } = await openSheet(skirtSheetId);
    await waitFor(() => expect(screen.getByLabelText(/^Waistband,/)).toHaveFocus());
    await user.keyboard('61x2{Enter}');
    expect(screen.getByLabelText(/^Waistband,/)).toHaveAccessibleDescription(/“61x2”/);
    expect(screen.getByLabelText(/^Waistband,/)).toHaveFocus();
    expect(asked.filter((call) => call.includes('/readings'))).toHaveLength(0);
  });

  it('warns of what is unusual without refusing it', async () => {
    const { user, house } = await openSheet(skirtSheetId);
    await waitFor(() => expect(screen.getByLabelText(/^Waistband,/)).toHaveFocus());
    await user.keyboard('162{Enter}');
    await waitFor(() => expect(standing(house, skirtSheetId, 'waistband')).toHaveLength(1));
    expect(rowOf(/^Waistband,/)).toHaveTextContent('162 mm; usual here is 460 mm to 900 mm');
  });
});

describe('handling', () => {
  it('says “Turn over: two people” when the work comes to the back, and only once', async () => {
    const { user } = await openSheet(skirtSheetId);
    screen.getByLabelText(/^Waist to hem, front/).focus();
    expect(await screen.findByRole('dialog', { name: 'Front up: two people' })).toBeVisible();
    await layAsAsked(user);
    screen.getByLabelText(/^Opening,/).focus();
    expect(await screen.findByRole('dialog', { name: 'Turn over: two people' })).toBeVisible();
    await layAsAsked(user);
    await waitFor(() => expect(screen.getByLabelText(/^Opening,/)).toHaveFocus());
    screen.getByLabelText(/^Waistband,/).focus();
    screen.getByLabelText(/^Opening,/).focus();
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});

describe('a second reading', () => {
  it('is blind until it is in, then says how far apart the two are', async () => {
    const { user, house } = await openSheet(bodiceSheetId);
    await user.click(screen.getByRole('button', { name: 'More for Waist' }));
    await user.click(await screen.findByRole('menuitem', { name: 'Read a second time, blind' }));
    const second = await screen.findByLabelText(/^Waist, reading 2/);
    await waitFor(() => expect(second).toHaveFocus());
    expect(screen.queryByDisplayValue('612')).toBeNull();
    await user.keyboard('614{Enter}');
    await waitFor(() =>
      expect(
        house.sheet(bodiceSheetId)!.readings.some(({ pointId, round }) => pointId === 'waist' && round === 2),
      ).toBe(true),
    );
    expect(await screen.findByDisplayValue('612')).toBeVisible();
    expect(rowOf(/^Waist, reading 2/)).toHaveTextContent('2 mm apart');
  });
});

describe('nothing typed is lost', () => {
  it('keeps readings and half-typed text over a reload, and sends each reading once', async () => {
    const house = new House();
    const first = await openSheet(skirtSheetId, { house, intercept: noNetwork });
    await waitFor(() => expect(screen.getByLabelText(/^Waistband,/)).toHaveFocus());
    await first.user.keyboard('612{Enter}');
    expect(await screen.findByText('Kept on this tablet')).toBeVisible();
    await waitFor(() => expect(screen.getByLabelText(/^Hip,/)).toHaveFocus());
    await first.user.keyboard('98');
    await first.offline.drafts.flush();
    first.unmount();
    first.offline.close();
    expect(house.sheet(skirtSheetId)!.readings).toHaveLength(0);

    renderWorkroom(`/sheets/${skirtSheetId}`, { house, store: first.store });
    expect(await screen.findByLabelText(/^Hip,/)).toHaveValue('98');
    expect(screen.getByLabelText(/^Waistband,/)).toHaveValue('612');
    await waitFor(() => expect(standing(house, skirtSheetId, 'waistband')).toHaveLength(1));
    expect(house.sheet(skirtSheetId)!.readings).toHaveLength(1);
  });

  it('shows both readings where another device was first, and keeps the one that is chosen', async () => {
    const house = new House();
    const { user } = await openSheet(skirtSheetId, { house });
    house.sheet(skirtSheetId)!.readings.push(reading(3900, 'waistband', '615'));
    await waitFor(() => expect(screen.getByLabelText(/^Waistband,/)).toHaveFocus());
    await user.keyboard('612{Enter}');
    expect(await screen.findByText('1 reading needs your decision')).toBeVisible();
    const row = rowOf(/^Waistband,/);
    expect(row).toHaveTextContent('612 mm');
    expect(row).toHaveTextContent('615 mm');
    await user.click(within(row).getByRole('button', { name: 'Keep the one keyed here' }));
    await waitFor(() =>
      expect(standing(house, skirtSheetId, 'waistband')[0]).toMatchObject({
        valueMm: '612',
        replaces: idOf(3900),
      }),
    );
  });
});

describe('the diagram', () => {
  it('lights the line of the row at hand, and leads from a line to its row', async () => {
    const { user, container } = await openSheet(bodiceSheetId);
    screen.getByLabelText(/^Waist, m/).focus();
    await waitFor(() =>
      expect(container.querySelector('.drawing-point-current')).toHaveAttribute('data-point', 'waist'),
    );
    await user.click(container.querySelector('[data-point="neck"] circle')!);
    await waitFor(() => expect(screen.getByLabelText(/^Neck, m/)).toHaveFocus());
  });
});

describe('findings and the box list', () => {
  const finished = () => {
    const house = new House();
    const sheet = house.sheet(skirtSheetId)!;
    const values = {
      waistband: '640',
      hem: '600',
      'waist-to-hem-front': '1020',
      'waist-to-hem-back': '1030',
    };
    sheet.readings = Object.entries(values).map(([pointId, value], index) =>
      reading(4000 + index, pointId, value),
    );
    return house;
  };

  it('says in a sentence what a check found, and takes a reason', async () => {
    const house = finished();
    const { user } = await openSheet(skirtSheetId, { house });
    await user.click(screen.getByRole('tab', { name: /Findings/ }));
    const panel = await screen.findByRole('tabpanel', { name: /Findings/ });
    const finding = (await within(panel).findAllByRole('listitem')).find(
      (item) => /hem/i.test(item.textContent ?? '') && within(item).queryByRole('textbox'),
    )!;
    await user.click(within(finding).getByRole('button', { name: 'Keep the reason' }));
    expect(finding).toHaveTextContent('Write the reason, or read the point again.');
    await user.type(within(finding).getByRole('textbox'), 'Read twice; it is so');
    await user.click(within(finding).getByRole('button', { name: 'Keep the reason' }));
    expect(await screen.findByText(/“Read twice; it is so”, Wren Aldous/)).toBeVisible();
  });

  it('works out what follows, with formula and figures', async () => {
    const house = finished();
    const { user } = await openSheet(skirtSheetId, { house });
    await user.click(screen.getByRole('tab', { name: 'Worked out' }));
    expect(await screen.findByText(/1030 mm − 1020 mm = 10 mm/)).toBeVisible();
  });

  it('lists what is still to take, and completes the sheet when nothing stops it', async () => {
    const house = new House();
    const { user } = await openSheet(skirtSheetId, { house });
    await user.click(screen.getByRole('tab', { name: 'Box list' }));
    expect(await screen.findByText('Waistband: take it, or say why not')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Complete the sheet' }));
    expect(await screen.findByText(/A stop is not answered yet/)).toBeVisible();

    const values = {
      waistband: '640',
      hem: '3100',
      'waist-to-hem-front': '1020',
      'waist-to-hem-back': '1030',
    };
    house.sheet(skirtSheetId)!.readings = Object.entries(values).map(([pointId, value], index) =>
      reading(4000 + index, pointId, value),
    );
    await user.click(screen.getByRole('button', { name: 'Complete the sheet' }));
    expect(await screen.findByText(/This sheet is complete/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Reopen the sheet' }));
    await waitFor(() => expect(house.sheet(skirtSheetId)?.state).toBe('open'));
  });
});

describe('opening a sheet', () => {
  it('asks who held the tape, or why one measured alone, before it opens', async () => {
    const { user, router } = renderWorkroom(`/garments/${idOf(101)}/parts/${idOf(1010)}/sheets/new`);
    await user.type(await screen.findByLabelText('Place'), 'Textile room');
    await user.type(screen.getByLabelText('Tape'), 'White tape');
    await user.click(screen.getByRole('button', { name: 'Open the sheet' }));
    expect(
      await screen.findByRole('link', { name: 'Say who held the tape, or why one person measured alone' }),
    ).toBeVisible();
    await user.click(screen.getByLabelText('Imogen Sallow: Held the tape and steadied the garment'));
    await user.click(screen.getByRole('button', { name: 'Open the sheet' }));
    await waitFor(() => expect(router.state.location.pathname).toMatch(/^\/sheets\//));
  });
});
