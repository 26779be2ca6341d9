import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { idOf, staff } from '../../testing/fake-api/people.js';
import { renderWorkroom } from '../../testing/render-workroom.js';
import { changesSentence } from './changes-sentence.js';

const inReview = `/garments/${idOf(101)}/review`;
const approved = `/garments/${idOf(102)}/review`;
const published = `/garments/${idOf(103)}/review`;
const curatorIn = () => new House(staff.secondCurator);

describe('the review', () => {
  it('shows the queue, the record as the public will see it, and what changed in words', async () => {
    renderWorkroom(inReview, { house: curatorIn() });
    const page = await screen.findByRole('article', { name: 'As the public will see it' });
    expect(within(page).getByRole('heading', { name: 'Bodice of dark red wool' })).toBeVisible();
    expect(await screen.findByText('Waist (bodice)')).toBeVisible();
    const queue = screen.getByRole('complementary', { name: 'Review queue' });
    expect(await within(queue).findByRole('link', { name: /Tailored jacket/ })).toHaveAttribute(
      'href',
      approved,
    );
    const change = screen.getByText('Title').closest('li');
    expect(change).toHaveTextContent('ChangedTitlebefore: Red bodicenow: Bodice of dark red wool');
  });

  it('gives the sentence why one may not approve, and no button', async () => {
    const house = new House(staff.curator);
    house.mayNotApprove = 'You held the tape when the bodice was measured on 1 December 2026.';
    renderWorkroom(inReview, { house });
    expect(await screen.findByText(/You held the tape when the bodice/)).toBeVisible();
    expect(screen.getByText('You cannot approve this.')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Approve' })).toBeNull();
  });

  it('says the API’s refusal where the screen did not know better', async () => {
    const house = curatorIn();
    const { user } = renderWorkroom(inReview, { house });
    const approve = await screen.findByRole('button', { name: 'Approve' });
    house.mayNotApprove = 'You edited this record.';
    await user.click(approve);
    expect(await screen.findByRole('alert')).toHaveTextContent('Not done: You edited this record.');
    expect(house.garment(idOf(101))?.stage).toBe('in-review');
  });

  it('returns with a reason, and not without', async () => {
    const house = curatorIn();
    const { user } = renderWorkroom(inReview, { house });
    await user.click(await screen.findByRole('button', { name: 'Return with a reason' }));
    await user.click(await screen.findByRole('button', { name: 'Return it' }));
    expect(await screen.findByLabelText('What should be done')).toHaveAccessibleDescription(
      /Write something here/,
    );
    await user.type(screen.getByLabelText('What should be done'), 'Name the maker');
    await user.click(screen.getByRole('button', { name: 'Return it' }));
    await waitFor(() =>
      expect(house.garment(idOf(101))).toMatchObject({
        stage: 'draft',
        returned: { reason: 'Name the maker' },
      }),
    );
  });

  it('approves, then publishes after a question that names what changes', async () => {
    const house = curatorIn();
    house.garments[1]!.publishedVersion = 3;
    const { user } = renderWorkroom(inReview, { house });
    await user.click(await screen.findByRole('button', { name: 'Approve' }));
    await user.click(await screen.findByRole('button', { name: 'Publish version 4' }));
    const question = await screen.findByRole('dialog', { name: 'Publish version 4?' });
    expect(question).toHaveTextContent('Changes Title. Adds Waist (bodice). Removes Picture, side.');
    await user.click(within(question).getByRole('button', { name: 'Not yet' }));
    expect(house.garment(idOf(101))?.stage).toBe('approved');
    await user.click(screen.getByRole('button', { name: 'Publish version 4' }));
    await user.click(
      within(await screen.findByRole('dialog')).getByRole('button', { name: 'Publish version 4' }),
    );
    await waitFor(() =>
      expect(house.garment(idOf(101))).toMatchObject({ stage: 'published', publishedVersion: 4 }),
    );
  });

  it('withdraws with a public wording, and not without', async () => {
    const house = curatorIn();
    const { user } = renderWorkroom(published, { house });
    await user.click(await screen.findByRole('button', { name: 'Withdraw' }));
    await user.click(await screen.findByRole('button', { name: 'Withdraw every version' }));
    expect(await screen.findByLabelText('What the public reads')).toHaveAccessibleDescription(
      /Write something here/,
    );
    await user.type(
      screen.getByLabelText('What the public reads'),
      'Withdrawn while its history is looked into.',
    );
    await user.click(screen.getByRole('button', { name: 'Withdraw every version' }));
    await waitFor(() => expect(house.garment(idOf(103))?.stage).toBe('withdrawn'));
  });

  it('lets a recorder read, and decide nothing', async () => {
    renderWorkroom(approved);
    expect(await screen.findByRole('article')).toBeVisible();
    expect(await screen.findByText('New to the public')).toBeVisible();
    expect(screen.queryByRole('button', { name: /Publish|Return|Withdraw/ })).toBeNull();
  });
});

describe('what a publication changes, in a sentence', () => {
  const change = (kind: 'added' | 'removed' | 'changed', label: string) => ({
    kind,
    label,
    area: 'record' as const,
    before: null,
    after: null,
  });

  it('is the first time, nothing, or the things by name', () => {
    expect(changesSentence({ nextVersion: 1, changes: [] })).toMatch(/first time/);
    expect(changesSentence({ nextVersion: 2, changes: [] })).toMatch(/Nothing differs/);
    expect(
      changesSentence({
        nextVersion: 2,
        changes: [change('changed', 'Title'), change('changed', 'Maker'), change('added', 'Picture, back')],
      }),
    ).toBe('Changes Title, Maker. Adds Picture, back.');
  });

  it('names eight at most and counts the rest', () => {
    const changes = Array.from({ length: 11 }, (_, index) => change('changed', `Box ${index + 1}`));
    expect(changesSentence({ nextVersion: 2, changes })).toMatch(/Box 8 and 3 more\.$/);
  });
});
