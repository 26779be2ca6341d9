import { screen, waitFor, within } from '@testing-library/react';
import { emptyCutSheet, keptCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import { NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { idOf, staff } from '../../testing/fake-api/people.js';
import { renderWorkroom } from '../../testing/render-workroom.js';

const dress = idOf(100);
const bodice = idOf(1000);
const skirt = idOf(1001);
const page = (partId: string) => `/garments/${dress}/parts/${partId}/cut-sheet`;

async function open(partId: string, house = new House()) {
  const workroom = renderWorkroom(page(partId), { house });
  await screen.findByRole('form', { name: 'Cut sheet' });
  return { ...workroom, house };
}
const save = () => screen.getByRole('button', { name: 'Save the cut sheet' });
const kept = (house: House, partId: string) => house.cutSheets.get(partId)?.body;
const box = (name: string | RegExp, place = 0) => screen.getAllByLabelText(name)[place]!;

describe('the page of a cut sheet', () => {
  it('is reached from its part', async () => {
    const { user } = renderWorkroom(`/garments/${dress}`);
    await user.click(await screen.findByRole('link', { name: 'Cut sheet of Bodice' }));
    expect(await screen.findByRole('heading', { name: 'Cut sheet: Bodice' })).toHaveFocus();
  });

  it('waits in words, and says that it failed', async () => {
    let down = true;
    const { user } = renderWorkroom(page(skirt), {
      intercept: ({ url }) =>
        down && url.includes('/cut-sheet') ? Promise.reject(new TypeError('no route')) : undefined,
    });
    expect(await screen.findByText('Fetching the cut sheet')).toBeInTheDocument();
    expect(await screen.findByRole('alert')).toHaveTextContent('did not answer');
    down = false;
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Nothing is written yet.')).toBeVisible();
    expect(screen.getByText('No pieces yet.')).toBeVisible();
  });

  it('says so where there is no such part', async () => {
    renderWorkroom(page(idOf(4040)));
    expect(await screen.findByRole('heading', { name: 'There is no such part' })).toBeVisible();
  });

  it('can be read but not written by the desk', async () => {
    await open(bodice, new House(staff.desk));
    expect(box('Name')).toBeDisabled();
    expect(screen.queryByRole('button', { name: 'Save the cut sheet' })).toBeNull();
    expect(screen.getByText(/Writing it is for recorders and curators/)).toBeVisible();
  });
});

describe('writing a cut sheet', () => {
  it('keeps what was typed, its unit and the exact millimetres; an empty box is not nothing', async () => {
    const { user, house } = await open(skirt);
    await user.click(screen.getByRole('button', { name: 'Add a piece' }));
    await user.type(box('Name'), 'Gore');
    await user.clear(box('How many'));
    await user.type(box('How many'), '4');
    await user.type(box(/^Waist width/), '0');
    await user.type(box(/^Hem width/), '24 3/8 in');
    await user.click(save());
    await screen.findByText(/^Saved, /);
    expect(kept(house, skirt)?.pieces).toMatchObject([
      {
        name: 'Gore',
        count: 4,
        grain: 'not-known',
        widths: {
          bust: null,
          waist: { typed: '0', unit: 'mm', mm: '0' },
          hip: null,
          // 24 3/8 in = 619.125 mm exactly: international yard and pound agreement, 1959.
          hem: { typed: '24 3/8 in', unit: 'in', mm: '619.125' },
        },
      },
    ]);
  });

  it('says beside the box and above the form what is to be mended, and keeps what stands there', async () => {
    const { user, house } = await open(skirt);
    await user.click(screen.getByRole('button', { name: 'Add a piece' }));
    await user.type(box(/^Waist width/), '20b');
    await user.clear(box('How many'));
    await user.type(box('How many'), 'two');
    await user.click(save());
    const summary = await screen.findByRole('group', { name: 'There are 3 things to mend' });
    expect(summary).toHaveFocus();
    const links = within(summary)
      .getAllByRole('link')
      .map(({ textContent }) => textContent);
    expect(links).toEqual([
      'Piece 1, name: Write something here',
      'Piece 1, how many: Write a whole number, such as 2',
      'Piece 1, waist width: “b” is not a unit used here. Use mm, cm, in.',
    ]);
    await user.click(within(summary).getByRole('link', { name: /waist width/ }));
    expect(box(/^Waist width/)).toHaveFocus();
    expect(box(/^Waist width/)).toHaveValue('20b');
    expect(kept(house, skirt)).toBeUndefined();
  });

  it('holds the panels’ sums against the rounds that were read, as they are typed', async () => {
    const { user } = await open(bodice);
    const sums = screen.getByRole('region', { name: 'Sums of the panels' });
    expect(sums).toHaveTextContent(
      'Apart. The panels’ sum at the bust is 16 mm less than the bust or chest that was read: 8 panels, 864 mm, against 880 mm; 11 mm is allowed.',
    );
    await user.clear(box(/^Bust width/));
    await user.type(box(/^Bust width/), '180');
    expect(sums).toHaveTextContent(
      'Agrees. The panels’ sum at the bust agrees with the bust or chest that was read: 8 panels, 880 mm, against 880 mm.',
    );
  });

  it('puts a row back where it was', async () => {
    const { user } = await open(bodice);
    const names = () => screen.getAllByLabelText('Name').map((one) => (one as HTMLInputElement).value);
    const before = names();
    await user.type(box('Name', 1), ' panel');
    await user.click(screen.getByRole('button', { name: 'Remove piece 2' }));
    expect(names()).toEqual(before.filter((_name, place) => place !== 1));
    expect(screen.getByText(/Piece 2 removed/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Put it back' }));
    expect(names()).toEqual(before.map((name, place) => (place === 1 ? `${name} panel` : name)));
  });

  it('spells out the unit of what stands there when figures are typed in another', async () => {
    const { user, house } = await open(bodice);
    await user.selectOptions(screen.getByLabelText('Figures are typed in'), 'inches');
    expect(box(/^Waist width/)).toHaveValue('116 mm');
    expect(box(/^Intake/)).toHaveValue('1 1/4 in');
    await user.clear(box(/^Waist width/));
    await user.type(box(/^Waist width/), '4 1/2');
    await user.click(save());
    await screen.findByText(/^Saved, /);
    expect(kept(house, bodice)).toMatchObject({
      unit: 'in',
      pieces: [
        { widths: { waist: { mm: '114.3' }, bust: { typed: '172 mm', unit: 'mm', mm: '172' } } },
        {},
        {},
        {},
        {},
      ],
    });
  });

  it('asks before what was typed is left behind', async () => {
    const { user, router } = await open(bodice);
    await user.type(screen.getByLabelText(/^Note on the cut/), ' More.');
    await user.click(screen.getByRole('link', { name: /Dress of teal silk/ }));
    const question = await screen.findByRole('dialog', { name: 'Leave without saving?' });
    await user.click(within(question).getByRole('button', { name: 'Stay here' }));
    expect(router.state.location.pathname).toBe(page(bodice));
    await user.click(save());
    await screen.findByText(/^Saved, /);
    await user.click(screen.getByRole('link', { name: /Dress of teal silk/ }));
    await waitFor(() => expect(router.state.location.pathname).toBe(`/garments/${dress}`));
  });

  it('loses nothing of two who write at once', async () => {
    const { user, house } = await open(bodice);
    await user.type(screen.getByLabelText(/^Note on the cut/), ' Mine.');
    const before = house.cutSheets.get(bodice)!;
    house.cutSheets.set(bodice, {
      ...before,
      version: before.version + 1,
      body: { ...before.body, note: 'Theirs.', bones: [] },
    });
    await user.click(save());
    const notice = await screen.findByRole('group', { name: /Imogen Sallow saved this cut sheet/ });
    expect(notice).toHaveFocus();
    expect(screen.getByLabelText(/^Note on the cut/)).toHaveValue(`${before.body.note} Mine.`);
    expect(screen.getByText('No bones yet.')).toBeVisible();
    await user.click(within(notice).getByRole('button', { name: 'Take theirs for Note on the cut' }));
    expect(screen.getByLabelText(/^Note on the cut/)).toHaveValue('Theirs.');
    await user.click(save());
    await screen.findByText(/^Saved, /);
    expect(kept(house, bodice)).toMatchObject({ note: 'Theirs.', bones: [] });
  });
});

describe('a hand-drawn pattern', () => {
  // jsdom lays nothing out: a picture of 2100 × 2800 pixels shown at a tenth of its size.
  beforeEach(() => {
    vi.spyOn(Element.prototype, 'getBoundingClientRect').mockReturnValue(new DOMRect(0, 0, 210, 280));
  });
  afterEach(() => vi.restoreAllMocks());

  const picture = () => screen.getByRole('region', { name: 'Picture of the pattern' }).querySelector('svg')!;
  const values = (label: RegExp) =>
    screen.getAllByLabelText(label).map((one) => (one as HTMLInputElement).value);

  async function withPattern() {
    const house = new House();
    const body = keptCutSheet(NewCutSheet.parse({ ...emptyCutSheet, pieces: [] }));
    house.cutSheets.set(skirt, { ...house.cutSheets.get(bodice)!, partId: skirt, body });
    const room = await open(skirt, house);
    await room.user.selectOptions(await screen.findByLabelText('Picture of the pattern'), 'Front, picture 1');
    return room;
  }

  it('is marked by taps, one mark after the other, and read at its scale', async () => {
    const { user, house } = await withPattern();
    await user.type(screen.getByLabelText(/^On the garment/), '400');
    await user.type(screen.getByLabelText(/^On the paper/), '100');
    const tap = (x: number, y: number) =>
      user.pointer({ keys: '[MouseLeft]', target: picture(), coords: { clientX: x, clientY: y } });
    await tap(10, 20);
    await tap(170, 20);
    expect(screen.getByText('1 mm = 4.00 px; drawn 1:4')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Add a pair of marks' }));
    await user.type(screen.getByLabelText('What'), 'Side seam');
    await tap(20, 30);
    await tap(20, 110);
    // 800 px at 4 px a millimetre.
    expect(screen.getByText(/^200\.0 mm ± /)).toBeVisible();
    await user.click(save());
    await screen.findByText(/^Saved, /);
    expect(kept(house, skirt)?.pattern).toMatchObject({
      marks: { from: { x: 100, y: 200 }, to: { x: 1700, y: 200 } },
      distance: { mm: '400' },
      pairs: [{ name: 'Side seam', from: { x: 200, y: 300 }, to: { x: 200, y: 1100 } }],
    });
  });

  it('is marked by the keyboard alone: by numbers, then pixel by pixel', async () => {
    const { user } = await withPattern();
    await user.type(screen.getByLabelText('A, pixels across'), '100');
    await user.type(screen.getByLabelText('A, pixels down'), '2799');
    const mark = screen.getByRole('button', { name: /^Mark A, 100 across, 2799 down/ });
    mark.focus();
    await user.keyboard('{ArrowRight}{Shift>}{ArrowLeft}{/Shift}{ArrowDown}{ArrowDown}{ArrowDown}');
    expect(values(/^A, pixels/)).toEqual(['91', '2800']);
  });

  it('wants both marks of its scale before it is kept', async () => {
    const { user } = await withPattern();
    await user.click(save());
    const summary = await screen.findByRole('group', { name: /things to mend/ });
    expect(summary).toHaveTextContent('Scale, first mark: Set this mark');
    expect(within(summary).getAllByRole('link')).toHaveLength(2);
  });
});
