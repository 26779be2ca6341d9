import { describe, expect, it } from 'vitest';
import { ask, askPage } from '../../testing/ask-page';

describe('a search', () => {
  it('sends a form’s figures on to the one address, in millimetres and in order', async () => {
    expect(
      await ask('/search?q=&typed=in&min.waist=22&max.waist=24+3/8&kind=skirt&kind=dress&sort=relevance'),
    ).toEqual({
      status: 302,
      redirect: '/search?kind=dress&kind=skirt&measure=waist%3A558.8..619.125',
    });
  });

  it('takes any number of ranges, those already there and a new one', async () => {
    expect(await ask('/search?measure=bust%3A800..&min.waist=560&new.point=hem&max.new=3000')).toEqual({
      status: 302,
      redirect: '/search?measure=bust%3A800..&measure=hem%3A..3000&measure=waist%3A560..',
    });
  });

  it('keeps the unit of the link and the layout while it tidies the rest', async () => {
    expect(await ask('/search?view=table&unit=in&page=1&q=silk')).toEqual({
      status: 302,
      redirect: '/search?q=silk&unit=in&view=table',
    });
  });

  it('keeps a figure it cannot read in its box, and says first in the page how to mend it', async () => {
    const { document, attribute } = await askPage('/search?typed=mm&min.waist=wide&max.waist=600');
    expect(attribute('#box-min-waist', 'value')).toBe('wide');
    expect(attribute('#box-min-waist', 'aria-invalid')).toBe('true');
    expect(document.querySelector('.problem-summary a')?.getAttribute('href')).toBe('#box-min-waist');
    expect(document.querySelector('.problem-summary')?.textContent).toContain(
      'Write millimetres, for example 560',
    );
  });

  it('shows a range in the unit of the address, its bounds unmoved', async () => {
    const { attribute } = await askPage('/search?measure=waist%3A571.5..609.6&unit=in');
    expect(attribute('#box-min-waist', 'value')).toBe('22 1/2');
    expect(attribute('#box-max-waist', 'value')).toBe('24');
    expect(attribute('input[name=was]', 'value')).toBe('waist:571.5..609.6');
    expect(attribute('input[name=typed]', 'value')).toBe('in');
  });

  it('is told by its heading and by one status', async () => {
    const { document } = await askPage('/search?kind=dress');
    const told = [...document.querySelectorAll('.search [role=status]')].map(
      ({ textContent }) => textContent,
    );
    expect(told).toEqual(['7 garments found']);
  });

  it('gives each filter a chip that leads to the search without it', async () => {
    const { document } = await askPage('/search?kind=dress&measure=waist%3A560..620');
    const chips = [...document.querySelectorAll('.chip')].map((chip) => chip.getAttribute('href'));
    expect(chips).toEqual(['/search?measure=waist%3A560..620', '/search?kind=dress']);
    expect(document.querySelector('.chip-clear')?.getAttribute('href')).toBe('/search');
  });

  it('advises, when nothing is found, what to leave out', async () => {
    const { text, attribute } = await askPage('/search?kind=hat&measure=waist%3A560..620');
    expect(text('.nothing')).toContain('Without its measuring range the search finds more.');
    expect(attribute('.nothing .button', 'href')).toBe('/search?kind=hat');
  });

  it('puts measurements in columns in its table view', async () => {
    const { document } = await askPage('/search?kind=dress&view=table');
    const heads = [...document.querySelectorAll('.table thead th')].map(({ textContent }) => textContent);
    expect(heads).toEqual(['Garment', 'Kind', 'Date', 'Bust or chest', 'Waist', 'Hem', 'Under-bust']);
    expect(document.querySelectorAll('.table tbody tr')).toHaveLength(7);
  });

  it('leads on to further pages by links', async () => {
    const { document } = await askPage('/search?page=2&size=6');
    const pages = [...document.querySelectorAll('.pages ol a')].map((link) => link.getAttribute('href'));
    expect(pages).toEqual([
      '/search?size=6',
      '/search?page=2&size=6',
      '/search?page=3&size=6',
      '/search?page=4&size=6',
    ]);
    expect(document.querySelector('.pages [aria-current=page]')?.textContent).toBe('2');
  });
});
