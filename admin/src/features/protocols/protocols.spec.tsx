import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { staff } from '../../testing/fake-api/people.js';
import { trainLoop } from '../../testing/fake-api/protocols.js';
import { renderWorkroom } from '../../testing/render-workroom.js';

const administratorIn = () => new House(staff.administrator);
const newestOf = (house: House, kind: string) =>
  house.protocols.filter((each) => each.kind === kind).reduce((a, b) => (b.version > a.version ? b : a));
const pointsOf = (house: House, kind: string) => newestOf(house, kind).points.map(({ pointId }) => pointId);
const rowsOf = (heading: string) =>
  within(screen.getByRole('region', { name: heading }))
    .getAllByRole('listitem')
    .map((row) => row.querySelector('p')?.textContent);

async function openEditor(house = administratorIn(), path = '/protocols/skirt') {
  const workroom = renderWorkroom(path, { house });
  await screen.findByRole('heading', { name: 'What changes in version 3' });
  return workroom;
}

describe('the list of protocols', () => {
  it('shows every kind with its points, version, who and why', async () => {
    renderWorkroom('/protocols', { house: new House(staff.recorder) });
    const link = await screen.findByRole('link', { name: 'Skirts' });
    expect(link).toHaveAttribute('href', '/protocols/skirt');
    const card = within(link.closest('li')!);
    expect(card.getByText('9 points, 4 required')).toBeVisible();
    expect(card.getByText('Version 2')).toBeVisible();
    expect(card.getByText('Ansel Dray, 12 November 2026')).toBeVisible();
    expect(screen.getAllByRole('link', { name: /as worn/ })[0]).toHaveAttribute(
      'href',
      '/protocols/dress?wornTogether=true',
    );
    expect(screen.getAllByText('As the house began')).toHaveLength(19);
  });

  it('says that it failed', async () => {
    renderWorkroom('/protocols', {
      intercept: ({ url }) =>
        url.includes('/protocols') ? new Response('gone', { status: 500 }) : undefined,
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('answered 500');
  });
});

describe('a protocol', () => {
  it('is read, and not changed, by whoever is no administrator', async () => {
    renderWorkroom('/protocols/skirt', { house: new House(staff.recorder) });
    expect(await screen.findByRole('heading', { name: 'Opened, inside' })).toBeVisible();
    expect(rowsOf('Opened, inside')).toEqual(['Waistband', 'Hip', 'Hem', 'Band to train loop', 'Hem depth']);
    expect(screen.queryByRole('button', { name: /^(Drop|Up|Add)/ })).toBeNull();
    expect(screen.queryByText(/What changes/)).toBeNull();
  });

  it('tells its versions, what each changed, and shows an earlier one', async () => {
    const { user } = await openEditor();
    const versions = within(screen.getByRole('region', { name: 'Versions' }));
    expect(versions.getByText('Own point “Band to train loop” asked for, may be left out.')).toBeVisible();
    await user.click(versions.getByRole('link', { name: 'Show version 1' }));
    expect(await screen.findByText(/An earlier version/)).toBeVisible();
    expect(rowsOf('Opened, inside')).toEqual(['Waistband', 'Hip', 'Hem', 'Hem depth']);
    expect(screen.queryByRole('button', { name: /^Drop/ })).toBeNull();
  });

  it('is put in order, dropped from, added to, and made anew with a reason', async () => {
    const { user, house } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Up Hem' }));
    expect(rowsOf('Opened, inside')).toEqual(['Waistband', 'Hem', 'Hip', 'Band to train loop', 'Hem depth']);
    await user.click(screen.getByRole('button', { name: 'Drop Hem depth' }));
    await user.type(screen.getByLabelText('Find a point'), 'selvedge');
    await user.click(screen.getByRole('button', { name: 'Add Cloth width' }));
    await user.selectOptions(screen.getByLabelText('Whether Cloth width may be left out'), 'Required');
    await user.selectOptions(screen.getByLabelText('Rounds of Waistband'), '2 rounds');
    const changes = within(screen.getByRole('region', { name: 'What changes in version 3' }));
    expect(changes.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
      '“Cloth width” asked for, required.',
      '“Hem depth” dropped.',
      '“Hip” moved after “Hem”.',
      '“Waistband” read in 2 rounds, not 1.',
    ]);
    await user.click(screen.getByRole('button', { name: 'Make version 3' }));
    expect(screen.getByRole('link', { name: 'Say why there is a new version' })).toBeVisible();
    await user.type(screen.getByLabelText('Why there is a new version'), 'Cloth widths date skirts.');
    await user.click(screen.getByRole('button', { name: 'Make version 3' }));
    expect(await screen.findByText('Version 3 is made. New sheets are taken by it.')).toBeVisible();
    expect(pointsOf(house, 'skirt').slice(0, 5)).toEqual([
      'waistband',
      'hem',
      'hip',
      trainLoop.id,
      'cloth-width',
    ]);
    expect(newestOf(house, 'skirt')).toMatchObject({ version: 3, note: 'Cloth widths date skirts.' });
    expect(await screen.findByRole('heading', { name: 'What changes in version 4' })).toBeVisible();
  });

  it('takes every step back', async () => {
    const { user } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Drop Hem' }));
    await user.click(screen.getByRole('button', { name: 'Down Waistband' }));
    expect(rowsOf('Opened, inside')[0]).toBe('Hip');
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(rowsOf('Opened, inside')).toEqual(['Waistband', 'Hip', 'Hem', 'Band to train loop', 'Hem depth']);
    expect(screen.getByRole('button', { name: 'Undo' })).toBeDisabled();
  });

  it('keeps the draft where somebody made a version in between, and lets one decide', async () => {
    const { user, house } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Drop Hem depth' }));
    await user.type(screen.getByLabelText('Why there is a new version'), 'Too seldom read.');
    const theirs = { ...newestOf(house, 'skirt'), version: 3, madeBy: 'Imogen Sallow', note: 'No hips.' };
    house.protocols.push({ ...theirs, points: theirs.points.filter(({ pointId }) => pointId !== 'hip') });
    await user.click(screen.getByRole('button', { name: 'Make version 3' }));
    const notice = within(
      await screen.findByRole('group', { name: 'Imogen Sallow made version 3 while you were at it' }),
    );
    expect(notice.getByText('“Hip” dropped.')).toBeVisible();
    expect(rowsOf('Opened, inside')).not.toContain('Hem depth');
    await user.click(notice.getByRole('button', { name: 'Go on with mine, after version 3' }));
    expect(screen.getByText('“Hip” asked for, may be left out.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Make version 4' }));
    expect(await screen.findByText(/Version 4 is made/)).toBeVisible();
    expect(pointsOf(house, 'skirt')).toContain('hip');
    expect(pointsOf(house, 'skirt')).not.toContain('hem-depth');
  });

  it('is refused at the point that stands wrong, in words', async () => {
    const { user } = await openEditor();
    for (const select of screen.getAllByLabelText(/^Whether .* may be left out$/)) {
      await user.selectOptions(select, 'May be left out');
    }
    await user.type(screen.getByLabelText('Why there is a new version'), 'Nothing must be.');
    await user.click(screen.getByRole('button', { name: 'Make version 3' }));
    const summary = within(screen.getByRole('group', { name: 'There is one thing to mend' }));
    expect(summary.getByText('Require at least one point: every one may be left out.')).toBeVisible();
  });
});

describe('a point of the museum’s own', () => {
  const fill = async (user: ReturnType<typeof renderWorkroom>['user']) => {
    await user.type(screen.getByLabelText('Name'), 'Loop to hem');
    await user.type(screen.getByLabelText('Definition'), 'Inside, from the train loop down to the hem.');
    await user.type(screen.getByLabelText('From'), 'the lower end of the loop');
    await user.type(screen.getByLabelText('To'), 'the lower edge of the hem');
    await user.selectOptions(screen.getByLabelText('Searched with'), 'Skirt length');
    await user.type(screen.getByLabelText('From, mm'), '300');
    await user.type(screen.getByLabelText('To, mm'), '90 cm');
  };

  it('is made with its line drawn by keyboard alone, and stands in its handling step', async () => {
    const { user, house } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Make a point of our own' }));
    await user.click(screen.getByRole('button', { name: 'Put it in the protocol' }));
    expect(screen.getByRole('link', { name: 'Write its name' })).toBeVisible();
    expect(screen.getByRole('link', { name: /^Draw the line/ })).toBeVisible();
    await fill(user);
    await user.click(screen.getByRole('button', { name: 'Add a place' }));
    await user.click(screen.getByRole('button', { name: 'Add a place' }));
    const across = screen.getByLabelText('Across, place 1, millimetres');
    await user.clear(across);
    await user.type(across, '-20{Enter}');
    await user.type(across, '{Shift>}{ArrowUp}{/Shift}{ArrowDown}');
    expect(across).toHaveValue('-11');
    await user.click(screen.getByRole('button', { name: 'Left 10 millimetres, place 1' }));
    expect(across).toHaveValue('-21');
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(across).toHaveValue('-11');
    await user.click(screen.getByRole('button', { name: 'Put it in the protocol' }));
    expect(await screen.findByText('“Loop to hem” made.')).toBeVisible();
    expect(rowsOf('Opened, inside').at(-1)).toBe('Loop to hem');
    await user.type(screen.getByLabelText('Why there is a new version'), 'Loops and trains.');
    await user.click(screen.getByRole('button', { name: 'Make version 3' }));
    expect(await screen.findByText(/Version 3 is made/)).toBeVisible();
    const own = newestOf(house, 'skirt').ownPoints.find(({ id }) => id === 'own-loop-to-hem');
    expect(own).toMatchObject({ range: { fromMm: '300', toMm: '900' }, group: 'skirt-length' });
    expect(own?.line.along).toHaveLength(2);
    expect(own?.line.along[0]?.[0]).toBe(-11);
  });

  it('is drawn by taps on the garment, each of which can be taken back', async () => {
    const { user } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Make a point of our own' }));
    const drawing = screen.getByTestId('line-drawing');
    const svg = drawing.querySelector('svg')!;
    const [, , width = 0, height = 0] = svg.getAttribute('viewBox')!.split(' ').map(Number);
    const box = {
      left: 0,
      top: 0,
      width,
      height,
      right: width,
      bottom: height,
      x: 0,
      y: 0,
      toJSON: () => ({}),
    };
    vi.spyOn(svg, 'getBoundingClientRect').mockReturnValue(box);
    fireEvent.click(drawing, { clientX: width / 2, clientY: height / 3 });
    fireEvent.click(drawing, { clientX: width / 2, clientY: height / 2 });
    expect(screen.getAllByLabelText(/^Down, place/)).toHaveLength(2);
    const [first, second] = screen.getAllByLabelText<HTMLInputElement>(/^Down, place/);
    expect(Number(second?.value)).toBeGreaterThan(Number(first?.value));
    // Off the drawing is its edge: the line stays on the garment.
    fireEvent.click(drawing, { clientX: width * 3, clientY: height / 2 });
    expect(screen.getAllByLabelText(/^Across, place/)).toHaveLength(3);
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(screen.getAllByLabelText(/^Down, place/)).toHaveLength(1);
  });

  it('keeps its meaning once it stands in a version: only line, range and advice may be bettered', async () => {
    const { user } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Change Band to train loop' }));
    expect(screen.getByText(/it keeps its meaning/)).toBeVisible();
    expect(screen.queryByLabelText('Definition')).toBeNull();
    const watch = screen.getByLabelText(/^What to watch for/);
    await user.clear(watch);
    await user.type(watch, 'New thread tells of a new loop.');
    await user.click(screen.getByRole('button', { name: 'Keep the changes' }));
    expect(await screen.findByText('What to watch for at “Band to train loop” changed.')).toBeVisible();
  });

  it('does not take a name that the catalogue has', async () => {
    const { user } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Make a point of our own' }));
    await fill(user);
    await user.clear(screen.getByLabelText('Name'));
    await user.type(screen.getByLabelText('Name'), 'high hip');
    await user.click(screen.getByRole('button', { name: 'Add a place' }));
    await user.click(screen.getByRole('button', { name: 'Add a place' }));
    await user.click(screen.getByRole('button', { name: 'Put it in the protocol' }));
    expect(screen.getByRole('link', { name: /The catalogue has a point called “high hip”/ })).toBeVisible();
  });
});
