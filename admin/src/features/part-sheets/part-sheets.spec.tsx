import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { staff } from '../../testing/fake-api/people.js';
import { overTheYears } from '../../testing/fake-api/sheets-over-the-years.js';
import { renderWorkroom } from '../../testing/render-workroom.js';

const dressIn = (house: House) =>
  house.garments.find(({ record }) => record.ownNumber === overTheYears.garmentNumber)!;

function open(house = new House()) {
  const garment = dressIn(house);
  const path = `/garments/${garment.id}/parts/${garment.parts[0]!.id}/sheets`;
  return { ...renderWorkroom(path, { house }), garment };
}

const rowOf = (name: RegExp) => screen.getByRole('rowheader', { name }).closest('tr')!;
const cellsOf = (name: RegExp) =>
  within(rowOf(name))
    .getAllByRole('cell')
    .map(({ textContent }) => textContent);

describe('the sheets of a part over the years', () => {
  it('stand beside one another, oldest first, with who measured and what was noted', async () => {
    open();
    const table = await screen.findByRole('table');
    const heads = within(table).getAllByRole('columnheader');
    expect(heads.map(({ textContent }) => textContent)).toEqual([
      'mm',
      '22 April 2009Complete',
      '14 September 2021CompleteSpeaks for the partPublic, version 1',
      '6 October 2026For study',
    ]);
    expect(cellsOf(/Measured by/)[0]).toBe('Wren Aldous read; Imogen Sallow held');
    expect(cellsOf(/Condition and treatment/)).toEqual([
      expect.stringMatching(/^The hem is turned up/),
      expect.stringMatching(/^Condition, Imogen Sallow: Tacking of the hem taken out/),
      'Nothing noted',
    ]);
  });

  it('tell a change in words where it is more than two careful readings may differ', async () => {
    open();
    await screen.findByRole('table');
    // 1229 to 1246 is beyond the 5 mm of a length above a metre; 842 to 844 is within 3 mm.
    expect(cellsOf(/^Neck to hem, front/)[1]).toMatch(/^1246 ± .*17 mm longer$/);
    expect(cellsOf(/^Bust/)[2]).toMatch(/^844 ± [\d.]+$/);
    expect(cellsOf(/^Sleeve at its widest/)).toEqual([
      'Too fragile to handle',
      expect.stringMatching(/^352/),
      'Not on this sheet',
    ]);
    expect(
      screen.getAllByRole('rowheader', { name: /as worn/ }).map(({ textContent }) => textContent),
    ).toEqual([expect.stringMatching(/right, as worn$/), expect.stringMatching(/left, as worn$/)]);
  });

  it('let another speak, with a reason that is asked for', async () => {
    const { user, garment } = open();
    expect(await screen.findByText(/It speaks for the part, as the newest complete one/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Choose another sheet' }));
    await user.selectOptions(screen.getByRole('combobox', { name: 'Sheet' }), '22 April 2009');
    await user.click(screen.getByRole('button', { name: 'Let it speak' }));
    const why = screen.getByRole('textbox', { name: 'Why' });
    expect(why).toHaveAccessibleDescription(/Write something here/);
    await user.type(why, 'Before the hem was taken down, as in the loan of 2009.');
    await user.click(screen.getByRole('button', { name: 'Let it speak' }));
    expect(
      await screen.findByText(
        /sheet of 22 April 2009 speaks for the part, chosen by Wren Aldous.*as in the loan/,
      ),
    ).toBeVisible();
    expect(garment.stage).toBe('draft');
    expect(screen.queryByRole('option', { name: '6 October 2026' })).toBeNull();
  });

  it('say why another cannot be chosen, and keep what was typed where it was refused', async () => {
    const house = new House();
    dressIn(house).stage = 'in-review';
    open(house);
    expect(await screen.findByText(/This record is in review/)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Choose another sheet' })).toBeNull();
  });

  it('keep what was typed where somebody else wrote in between', async () => {
    const { user, garment } = open();
    await user.click(await screen.findByRole('button', { name: 'Choose another sheet' }));
    await user.type(screen.getByRole('textbox', { name: 'Why' }), 'As it was before.');
    garment.version += 1;
    await user.click(screen.getByRole('button', { name: 'Let it speak' }));
    expect(await screen.findByText(/Somebody saved in between/)).toBeVisible();
    expect(screen.getByRole('textbox', { name: 'Why' })).toHaveValue('As it was before.');
  });

  it('say that there are none, and where to begin', async () => {
    const house = new House();
    const [, second] = house.garments;
    second!.stage = 'draft';
    renderWorkroom(`/garments/${second!.id}/parts/${second!.parts[0]!.id}/sheets`, { house });
    expect(await screen.findByText('Not measured yet')).toBeVisible();
    expect(screen.getByRole('link', { name: 'New measuring sheet' })).toBeVisible();
  });

  it('can be read by the desk, which chooses nothing', async () => {
    const house = new House(staff.desk);
    open(house);
    expect(await screen.findByRole('table')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Choose another sheet' })).toBeNull();
  });

  it('say that they failed, and that a part is unknown', async () => {
    const house = new House();
    const path = `/garments/${house.garments[0]!.id}/parts/${house.newId()}/sheets`;
    renderWorkroom(path, { house });
    expect(await screen.findByRole('heading', { name: 'There is no such part' })).toBeVisible();
  });
});

describe('a garment of two parts', () => {
  it('may be measured laid together as worn', async () => {
    const house = new House();
    const { user } = renderWorkroom(`/garments/${house.garments[0]!.id}`, { house });
    await user.click(await screen.findByRole('button', { name: 'Measure the parts laid together as worn' }));
    expect(await screen.findByRole('heading', { name: 'Laid together as worn' })).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Measure the parts laid together as worn' })).toBeNull();
    expect(screen.queryByRole('link', { name: 'Cut sheet of Laid together as worn' })).toBeNull();
  });
});
