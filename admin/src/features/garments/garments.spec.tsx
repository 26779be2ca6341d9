import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { GarmentRecord } from '@ellwand/shared/records/garment';
import { House } from '../../testing/fake-api/house.js';
import { idOf, staff } from '../../testing/fake-api/people.js';
import { renderWorkroom } from '../../testing/render-workroom.js';
import { changesBehind, mergedUnder } from './record-changes.js';
import { emptyRecord, RecordForm, typedRecord } from './record-form.js';

const dress = idOf(100);

describe('the list of garments', () => {
  it('shows number, title, stage and what is open, and the count', async () => {
    renderWorkroom('/');
    const row = (await screen.findByText('LH.1966.30')).closest('tr');
    expect(row).toHaveTextContent('2 sheets open');
    expect(row).toHaveTextContent('Draft');
    expect(screen.getByRole('status')).toHaveTextContent('7 garments');
  });

  it('waits in words before anything has come', async () => {
    renderWorkroom('/', {
      intercept: ({ url }) =>
        url.includes('/workroom/garments') ? new Promise<Response>(() => undefined) : undefined,
    });
    expect(await screen.findByText('Fetching the garments')).toBeInTheDocument();
  });

  it('says that it failed and tries again when asked', async () => {
    let down = true;
    const { user } = renderWorkroom('/', {
      intercept: ({ url }) =>
        down && url.includes('/workroom/garments') ? Promise.reject(new TypeError('no route')) : undefined,
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('did not answer');
    down = false;
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('LH.1966.30')).toBeVisible();
  });

  it('gives one next step where nothing was found, and where there is nothing yet', async () => {
    const { user, router } = renderWorkroom('/?q=crinoline');
    await user.click(await screen.findByRole('button', { name: 'Show all garments' }));
    expect(await screen.findByText('LH.1966.30')).toBeVisible();
    expect(router.state.location.search).toBe('');
  });

  it('says so in an empty house', async () => {
    const house = new House();
    house.garments.length = 0;
    renderWorkroom('/', { house });
    expect(await screen.findByRole('link', { name: 'Record the first garment' })).toHaveAttribute(
      'href',
      '/garments/new',
    );
  });

  it('searches and filters in the address, and pages', async () => {
    const house = new House();
    const [first] = house.garments;
    for (let number = 0; number < 30; number += 1)
      house.garments.push({ ...first!, id: idOf(8000 + number), images: [], parts: [] });
    const { user, router } = renderWorkroom('/', { house });
    await user.type(await screen.findByRole('searchbox'), 'teal');
    await user.click(screen.getByRole('button', { name: 'Search' }));
    await user.selectOptions(screen.getByLabelText('Stage'), 'Draft');
    expect(await screen.findByText('31 garments found')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Next page' }));
    expect(router.state.location.search).toBe('?q=teal&stage=draft&page=2');
    expect(await screen.findByText('Page 2 of 2')).toBeVisible();
  });

  it('offers no new garment to whoever may only read', async () => {
    renderWorkroom('/', { house: new House(staff.desk) });
    expect(await screen.findByText('LH.1966.30')).toBeVisible();
    expect(screen.queryByRole('link', { name: 'New garment' })).toBeNull();
  });
});

describe('a new garment', () => {
  it('is made in two parts by one choice', async () => {
    const { user, house, router } = renderWorkroom('/garments/new');
    await user.click(await screen.findByLabelText('Two parts: a bodice and a skirt'));
    await user.type(screen.getByLabelText('Own number'), 'LH.2026.1');
    await user.type(screen.getByLabelText('Title'), 'Day dress');
    await user.type(screen.getByLabelText('Date'), '1872/1874');
    await user.type(screen.getByLabelText('Credit line'), 'Bequest of Elsin Ware');
    await user.click(screen.getByRole('button', { name: 'Make the garment' }));
    await waitFor(() => expect(router.state.location.pathname).not.toBe('/garments/new'));
    expect(house.garments[0]?.parts.map(({ kind, suffix }) => kind + suffix)).toEqual([
      'bodice.1',
      'skirt.2',
    ]);
  });

  it('names every thing to mend, first, and keeps what was typed', async () => {
    const { user } = renderWorkroom('/garments/new');
    await user.type(await screen.findByLabelText('Title'), 'Day dress');
    await user.type(screen.getByLabelText('Date'), 'about 1870');
    await user.click(screen.getByRole('button', { name: 'Make the garment' }));
    const summary = await screen.findByRole('group', { name: /things to mend/ });
    await waitFor(() => expect(summary).toHaveFocus());
    expect(within(summary).getByRole('link', { name: /Write a year or a span/ })).toHaveAttribute(
      'href',
      '#date',
    );
    expect(screen.getByLabelText('Date')).toHaveValue('about 1870');
    expect(screen.getByLabelText('Date')).toHaveAccessibleDescription(/Write a year or a span/);
  });
});

describe('the record’s editor', () => {
  it('saves with the version it was opened at', async () => {
    const { user, house } = renderWorkroom(`/garments/${dress}`);
    const maker = await screen.findByLabelText(/^Maker \(/);
    await user.clear(maker);
    await user.type(maker, 'Hollin & Daughters');
    await user.click(screen.getByRole('button', { name: 'Save the record' }));
    expect(await screen.findByText(/^Saved, /)).toBeVisible();
    expect(house.garment(dress)?.record.maker).toBe('Hollin & Daughters');
  });

  it('shows what another person saved meanwhile, keeps the typed text, and saves over it when told', async () => {
    const { user, house } = renderWorkroom(`/garments/${dress}`);
    const title = await screen.findByLabelText('Title');
    await user.clear(title);
    await user.type(title, 'My title');
    const garment = house.garment(dress)!;
    Object.assign(garment, {
      version: garment.version + 1,
      record: { ...garment.record, title: 'Her title', place: 'Brackwater' },
    });
    await user.click(screen.getByRole('button', { name: 'Save the record' }));
    const notice = await screen.findByRole('group', { name: /Imogen Sallow saved this record/ });
    await waitFor(() => expect(notice).toHaveFocus());
    expect(within(notice).getByRole('row', { name: /Title/ })).toHaveTextContent('Her titleMy title');
    expect(screen.getByLabelText('Title')).toHaveValue('My title');
    // What only she changed is hers; nothing of it is written over.
    expect(screen.getByLabelText(/^Place/)).toHaveValue('Brackwater');
    await user.click(screen.getByRole('button', { name: 'Save the record' }));
    expect(await screen.findByText(/^Saved, /)).toBeVisible();
    expect(house.garment(dress)?.record).toMatchObject({ title: 'My title', place: 'Brackwater' });
  });

  it('takes the other’s text for a box when asked', async () => {
    const { user, house } = renderWorkroom(`/garments/${dress}`);
    await user.type(await screen.findByLabelText('Title'), ' of mine');
    const garment = house.garment(dress)!;
    Object.assign(garment, {
      version: garment.version + 1,
      record: { ...garment.record, title: 'Her title' },
    });
    await user.click(screen.getByRole('button', { name: 'Save the record' }));
    await user.click(await screen.findByRole('button', { name: 'Take theirs for Title' }));
    expect(screen.getByLabelText('Title')).toHaveValue('Her title');
  });

  it('says in words why a record in review cannot be written', async () => {
    renderWorkroom(`/garments/${idOf(101)}`);
    expect(await screen.findByText(/This record is in review/)).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Save the record' })).toBeNull();
  });

  it('brings the usual caution with a hazard', async () => {
    const { user } = renderWorkroom(`/garments/${dress}`);
    await user.selectOptions(await screen.findByLabelText('Mercury (fur felt)'), 'suspected');
    expect(screen.getByText(/a dust mask does not stop it/)).toBeVisible();
  });

  it('says what keeps a record from review, each with its way there', async () => {
    const { user } = renderWorkroom(`/garments/${dress}`);
    await user.click(await screen.findByRole('button', { name: 'Send to review' }));
    const link = await screen.findByRole('link', { name: 'The sheet of the bodice is not complete.' });
    expect(link).toHaveAttribute('href', `/sheets/${idOf(2001)}`);
  });
});

describe('the record as it is typed', () => {
  it('comes back from the form as it went in', () => {
    const record = new House().garment(dress)!.record;
    expect(RecordForm.parse(typedRecord(record))).toEqual(record);
  });

  it('tells an empty box from an empty text: no maker, no label, no hazards', () => {
    const record = RecordForm.parse({
      ...emptyRecord('Gift'),
      ownNumber: 'LH.1',
      title: 'Hat',
      date: '1840',
    });
    expect(record).toEqual(
      GarmentRecord.parse({
        ownNumber: 'LH.1',
        title: 'Hat',
        kind: 'dress',
        date: '1840',
        creditLine: 'Gift',
      }),
    );
  });

  it('merges box by box: mine where I typed, theirs where only they did', () => {
    const opened = { ...emptyRecord(), title: 'a', place: 'a', maker: 'a' };
    const theirs = { ...opened, title: 'b', place: 'b' };
    const mine = { ...opened, title: 'c', maker: 'c' };
    expect(mergedUnder(opened, theirs, mine)).toMatchObject({ title: 'c', place: 'b', maker: 'c' });
    expect(changesBehind(opened, theirs, mine).map(({ box }) => box)).toEqual(['title', 'place']);
  });
});
