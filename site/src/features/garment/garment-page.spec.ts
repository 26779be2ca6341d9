import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { describe, expect, it } from 'vitest';
import { askPage } from '../../testing/ask-page';
import { fixtureCatalogue } from '../../testing/fixture-catalogue';
import { dressInTwoParts } from '../../testing/fixture-dress';

describe('a garment’s page', () => {
  it('holds every measurement in millimetres, centimetres and inches', async () => {
    const { document } = await askPage('/g/lh-1966-30');
    const row = [...document.querySelectorAll('.measures tbody tr')].find((each) =>
      each.querySelector('th a')?.textContent?.startsWith('Waist'),
    );
    const figures = [...(row?.querySelectorAll('.measures-value [data-unit]') ?? [])];
    expect(figures.map((figure) => [figure.getAttribute('data-unit'), figure.textContent])).toEqual([
      ['mm', '612'],
      ['cm', '61.2'],
      ['in', '24 1/8'],
    ]);
    const uncertainty = [...(row?.querySelectorAll('.measures-uncertainty [data-unit]') ?? [])];
    expect(uncertainty.map(({ textContent }) => textContent)).toEqual(['1.2', '0.12', '1/16']);
  });

  it('has a row for every published measurement, each leading to its point', async () => {
    const { document } = await askPage('/g/lh-1966-30');
    const wanted = dressInTwoParts.parts.flatMap((part) => part.measurements.map(({ pointId }) => pointId));
    const linked = [...document.querySelectorAll('.measures tbody th a')].map((link) =>
      link.getAttribute('href'),
    );
    expect(linked.sort()).toEqual(wanted.map((pointId) => `/how-we-measure/${pointId}`).sort());
  });

  it('gives each letter of the table a line of the diagram, and the reverse', async () => {
    const { document } = await askPage('/g/lh-1966-30');
    for (const part of document.querySelectorAll('.part')) {
      const rows = [...part.querySelectorAll('.measures .letter')].map(({ textContent }) => textContent);
      const drawn = [...part.querySelectorAll('.only-wide [data-point] .drawing-letter')];
      expect(rows.length).toBeGreaterThan(0);
      expect(drawn.map(({ textContent }) => textContent).sort()).toEqual([...rows].sort());
    }
  });

  it('says how a figure was come by: half, tape lengths, level, readings', async () => {
    const { document } = await askPage('/g/lh-1966-30');
    const words = document.querySelector('article')?.textContent ?? '';
    expect(words).toContain('half 146 mm');
    expect(words).toContain('1 × 1500 mm + 1242 mm');
    expect(words).toContain('level at the seam');
    expect(words).toContain('one reading');
    expect(words).toContain('498 mm − 100 mm = 398 mm');
  });

  it('stands every girth beside the sentence on what it is not', async () => {
    const { document } = await askPage('/g/lh-1966-30');
    const notes = [...document.querySelectorAll('.part .inside-note')];
    expect(notes).toHaveLength(2);
    expect(notes[0]?.textContent).toBe(
      'Inside of the garment as fastened; not the wearer’s body, nor a modern size.',
    );
  });

  it('tells what was not taken and why', async () => {
    const { text } = await askPage('/g/lh-1966-30');
    expect(text('.not-taken')).toContain('Sleeve at its widest: too fragile to be handled for it');
  });

  it('offers every picture in AVIF and JPEG with its alternative text, caption and credit', async () => {
    const { document } = await askPage('/g/lh-1966-30');
    const figures = [...document.querySelectorAll('.pictures figure')];
    expect(figures).toHaveLength(dressInTwoParts.images.length);
    for (const figure of figures) {
      expect(figure.querySelector('source')?.getAttribute('srcset')).toMatch(
        /\/320\.avif 320w, .*\/1920\.avif 1920w$/,
      );
      expect(figure.querySelector('img')?.getAttribute('srcset')).toMatch(/\/640\.jpg 640w/);
      expect(figure.querySelector('img')?.getAttribute('alt')).not.toBe('');
      expect(figure.textContent).toContain('Larkmoor House Museum of Dress');
    }
  });

  it('says how to cite it by an address that can be followed from paper', async () => {
    const { text } = await askPage('/g/lh-1966-30');
    expect(text('.garment-end')).toContain(
      'Larkmoor House Museum of Dress, LH.1966.30: Visiting dress in teal silk and velvet, about 1885. ' +
        'Version 3, 14 March 2026. https://larkmoor.example/g/lh-1966-30/v/3',
    );
  });

  it('names the version to cite and the licence in its Link header', async () => {
    const { headers } = await askPage('/g/lh-1966-30');
    expect(headers.Link).toContain('<https://larkmoor.example/g/lh-1966-30/v/3>; rel="cite-as"');
    expect(headers.Link).toContain('<http://creativecommons.org/publicdomain/zero/1.0/>; rel="license"');
  });

  it('says of an old version that it is not the current one', async () => {
    expect((await askPage('/g/lh-1966-30/v/1')).text('.old-version')).toContain(
      'Version 1 is not the current one',
    );
    expect((await askPage('/g/lh-1966-30')).document.querySelector('.old-version')).toBeNull();
  });

  it('shows text as text, whatever was written in it', async () => {
    const hostile = '</script><img src=x onerror=alert(1)>';
    const catalogue: SiteCatalogue = {
      ...fixtureCatalogue,
      garment: () =>
        Promise.resolve({
          found: 'garment',
          garment: { ...dressInTwoParts, title: hostile, description: hostile },
        }),
    };
    const { document, text } = await askPage('/g/lh-1966-30', catalogue);
    expect(document.querySelector('img[src=x]')).toBeNull();
    expect(text('h1')).toBe(hostile);
    const data = JSON.parse(text('#hydration')) as {
      loaderData: { garment: { found: { garment: { title: string } } } };
    };
    expect(data.loaderData.garment.found.garment.title).toBe(hostile);
  });
});
