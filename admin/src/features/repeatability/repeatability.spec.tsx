import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { House } from '../../testing/fake-api/house.js';
import { renderWorkroom } from '../../testing/render-workroom.js';

const figureOf = (card: HTMLElement, term: string) =>
  within(card).getByText(term).nextElementSibling?.textContent;

describe('the page of repeatability', () => {
  it('shows each point by itself, with its figures, its plot and its pairs', async () => {
    const { user } = renderWorkroom('/repeatability');
    const waist = await screen.findByRole('article', { name: 'Waist' });
    // Ten waists read by two, Σd² 38: TEM = √(38 ÷ 20), Ulijaszek & Kerr, Br J Nutr 82 (1999) 165–177.
    expect(figureOf(waist, 'Technical error')).toBe('1.4 mm, 0.22 % of the mean');
    expect(figureOf(waist, 'Reliability, R')).toBe('0.998');
    expect(figureOf(waist, 'Limits of agreement')).toBe('−3.8 to +4.2 mm');
    expect(
      within(waist).getByText('From 10 read twice or more. Every later reading is another reader’s.'),
    ).toBeVisible();
    expect(within(waist).getByRole('img', { name: /^Waist: difference of two readings/ })).toBeVisible();
    await user.click(within(waist).getByText('The 10 pairs as a table'));
    expect(within(within(waist).getByRole('table')).getAllByRole('row')).toHaveLength(11);
    expect(screen.getAllByRole('article')).toHaveLength(3);
  });

  it('is honest about few pieces, and about one', async () => {
    renderWorkroom('/repeatability');
    const hem = await screen.findByRole('article', { name: 'Hem' });
    expect(
      within(hem).getByText(/^Only 3 were read twice: the next one may change these figures much/),
    ).toBeVisible();
    const cuff = screen.getByRole('article', { name: 'Cuff' });
    expect(figureOf(cuff, 'Technical error')).toBe('cannot be told yet');
    expect(figureOf(cuff, 'Limits of agreement')).toBe('cannot be told yet');
    expect(within(cuff).getByText(/Each by one reader/)).toBeVisible();
  });

  it('takes study sheets or record sheets alone, and its address keeps which', async () => {
    const { user, asked } = renderWorkroom('/repeatability?from=study');
    await screen.findByRole('article', { name: 'Waist' });
    expect(screen.getByRole('link', { name: 'Study sheets' })).toHaveAttribute('aria-current', 'true');
    await user.click(screen.getByRole('link', { name: 'Record sheets' }));
    expect(await screen.findByRole('article', { name: 'Hem' })).toBeVisible();
    expect(screen.queryByRole('article', { name: 'Waist' })).toBeNull();
    expect(asked.filter((one) => one === 'GET /workroom/repeatability')).toHaveLength(2);
  });

  it('says how to begin where nothing was read twice', async () => {
    const house = new House();
    house.repeated.clear();
    renderWorkroom('/repeatability', { house });
    expect(await screen.findByText('Nothing was read twice yet')).toBeVisible();
    expect(screen.getByText(/Choose points to read twice/)).toBeVisible();
  });

  it('says that it failed', async () => {
    renderWorkroom('/repeatability', {
      intercept: ({ url }) =>
        url.includes('/repeatability') ? new Response('gone', { status: 500 }) : undefined,
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('answered 500');
  });

  it('is found from anywhere', async () => {
    renderWorkroom('/protocols');
    const menu = await screen.findByRole('navigation', { name: 'Workroom' });
    expect(within(menu).getByRole('link', { name: 'Repeatability' })).toHaveAttribute(
      'href',
      '/repeatability',
    );
  });
});
