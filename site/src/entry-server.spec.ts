import { createHash } from 'node:crypto';
import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { describe, expect, it } from 'vitest';
import { inlineScriptHashes, render, siteAssets } from './entry-server';
import { askPage, testAssets } from './testing/ask-page';
import { fixtureCatalogue } from './testing/fixture-catalogue';

const failing: SiteCatalogue = {
  search: () => Promise.reject(new Error('no database')),
  garment: () => Promise.reject(new Error('no database')),
  front: () => Promise.reject(new Error('no database')),
};

const templates = [
  ['/', 200, 'The measured catalogue', 'Historic dress'],
  ['/search', 200, 'Search the catalogue', '19 garments'],
  ['/search?kind=dress', 200, '7 garments found', '7 garments'],
  ['/search?kind=hat&measure=waist%3A560..620', 200, '0 garments found', '0 garments'],
  ['/g/lh-1966-30', 200, 'Visiting dress in teal silk and velvet, about 1885', 'Visiting dress'],
  ['/g/lh-1966-30/v/1', 200, 'Visiting dress in teal silk and velvet, about 1885', 'Visiting dress'],
  ['/how-we-measure', 200, 'How we measure', 'How we measure'],
  ['/how-we-measure?kind=skirt', 200, 'How we measure skirts', 'How we measure'],
  ['/how-we-measure/waist', 200, 'Waist: how we measure', 'Waist'],
  ['/how-we-measure/elbow-room', 404, 'No such measuring point', 'Nothing is kept'],
  ['/g/lh-1958-8', 410, 'This garment is no longer shown', 'no longer shown'],
  ['/g/lh-1966-31', 404, 'Nothing is kept at this address', 'Nothing is kept'],
  ['/g/lh-1966-30/v/9', 404, 'Nothing is kept at this address', 'Nothing is kept'],
  ['/g/lh-1966-30/v/03', 404, 'Nothing is kept at this address', 'Nothing is kept'],
  ['/wardrobe', 404, 'Nothing is kept at this address', 'Nothing is kept'],
] as const;

describe.each(templates)('%s', (path, status, title, heading) => {
  it(`answers ${status} with its title and one heading`, async () => {
    const { status: answered, document, text } = await askPage(path);
    expect(answered).toBe(status);
    expect(document.title).toBe(`${title} | Larkmoor House Museum of Dress`);
    expect(document.querySelectorAll('title')).toHaveLength(
      1 + document.querySelectorAll('svg title').length,
    );
    expect(document.querySelectorAll('h1')).toHaveLength(1);
    expect(text('h1')).toContain(heading);
  });

  it('holds no inline style and no script but those the security policy names', async () => {
    const { document, html } = await askPage(path);
    expect(document.querySelectorAll('[style], style')).toHaveLength(0);
    const scripts = [...document.querySelectorAll('script:not([src]):not([type="application/json"])')];
    const hashes = scripts.map((script) => {
      return `sha256-${createHash('sha256')
        .update(script.textContent ?? '')
        .digest('base64')}`;
    });
    expect(hashes).toEqual(inlineScriptHashes);
    expect(html).not.toMatch(/ on[a-z]+="/);
  });

  it('names its one address without the unit, and keeps caches asking', async () => {
    const { attribute, headers } = await askPage(`${path}${path.includes('?') ? '&' : '?'}unit=cm`);
    expect(attribute('link[rel=canonical]', 'href')).toMatch(/^https:\/\/larkmoor\.example\//);
    expect(attribute('link[rel=canonical]', 'href')).not.toContain('unit');
    expect(headers['Cache-Control']).toBe('public, no-cache');
    expect(headers.ETag).toMatch(/^"[\w-]{22}"$/);
  });

  it('preloads both fonts and loads one module', async () => {
    const { document } = await askPage(path);
    expect(document.querySelectorAll('link[rel=preload][as=font]')).toHaveLength(2);
    expect(document.querySelectorAll('script[src]')).toHaveLength(1);
  });
});

describe('the unit', () => {
  it('of the address stands on <html> and goes along with every link of the page', async () => {
    const { document } = await askPage('/g/lh-1966-30?unit=in');
    expect(document.documentElement.dataset.unit).toBe('in');
    const links = [...document.querySelectorAll('main a, .site-nav a')].map(
      (link) => link.getAttribute('href') ?? '',
    );
    const within = links.filter((href) => href.startsWith('/') && !href.startsWith('/media/'));
    expect(within.length).toBeGreaterThan(20);
    expect(within.filter((href) => !href.includes('unit=in'))).toEqual([]);
  });

  it('is millimetres where the address names none, or none that there is', async () => {
    expect((await askPage('/?unit=ell')).document.documentElement.dataset.unit).toBe('mm');
  });

  it('can be changed by a link, without a script', async () => {
    const { document } = await askPage('/search?kind=dress');
    const links = [...document.querySelectorAll('.unit-switch a')].map((link) => link.getAttribute('href'));
    expect(links).toEqual(['mm', 'cm', 'in'].map((unit) => `/search?kind=dress&unit=${unit}`));
    expect(document.querySelector('.unit-switch [aria-current]')?.textContent).toContain('mm');
  });
});

describe('a page that fails', () => {
  it('says so with 500, tells nothing of the inside, and is left as it is', async () => {
    const { status, document, html, text } = await askPage('/search', failing);
    expect(status).toBe(500);
    expect(text('h1')).toBe('This page could not be fetched');
    expect(html).not.toContain('no database');
    expect(document.querySelector('#hydration')).toBeNull();
    expect(document.querySelector('script[src]')).toBeNull();
  });
});

describe('the ETag', () => {
  it('is the same for the same page and another for another page or build', async () => {
    const [first, again, other] = await Promise.all([askPage('/'), askPage('/'), askPage('/search')]);
    const built = await render(
      { url: 'https://larkmoor.example/', method: 'GET', headers: {} },
      fixtureCatalogue,
      {
        ...testAssets,
        buildId: 'next',
      },
    );
    expect(first.headers.ETag).toBe(again.headers.ETag);
    expect(first.headers.ETag).not.toBe(other.headers.ETag);
    expect('headers' in built && built.headers.ETag).not.toBe(first.headers.ETag);
  });
});

describe('the assets of a build', () => {
  it('are read from the manifest, fonts and all', () => {
    const found = siteAssets({
      'src/entry-client.tsx': {
        file: 'assets/entry-1.js',
        isEntry: true,
        css: ['assets/site-2.css'],
        assets: ['assets/inter-3.woff2'],
      },
      'fonts/cormorant.woff2': { file: 'assets/cormorant-4.woff2' },
    });
    expect(found).toMatchObject({
      entryScript: '/assets/entry-1.js',
      styles: ['/assets/site-2.css'],
      preloadFonts: ['/assets/cormorant-4.woff2', '/assets/inter-3.woff2'],
    });
  });

  it('are refused, with what to do, where there is no build', () => {
    expect(() => siteAssets({})).toThrow('npm run build -w site');
  });
});
