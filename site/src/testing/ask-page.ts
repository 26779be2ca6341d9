import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { JSDOM } from 'jsdom';
import { render, type SiteAssets, type SiteResponse } from '../entry-server';
import { fixtureCatalogue } from './fixture-catalogue';

export const testAssets: SiteAssets = {
  entryScript: '/assets/entry.js',
  styles: ['/assets/site.css'],
  preloadFonts: ['/assets/inter.woff2', '/assets/cormorant.woff2'],
  buildId: 'test',
};

/** What the server answers to a path: a page, or the way to one. */
export function ask(path: string, catalogue: SiteCatalogue = fixtureCatalogue): Promise<SiteResponse> {
  return render(
    { url: `https://larkmoor.example${path}`, method: 'GET', headers: {} },
    catalogue,
    testAssets,
  );
}

/** A page as a document to ask questions of. Throws where the path is sent on elsewhere. */
export async function askPage(path: string, catalogue?: SiteCatalogue) {
  const answer = await ask(path, catalogue);
  if ('redirect' in answer) throw new Error(`${path} was sent on to ${answer.redirect}`);
  const { document } = new JSDOM(answer.html).window;
  return {
    ...answer,
    document,
    text: (selector: string) => document.querySelector(selector)?.textContent ?? '',
    attribute: (selector: string, name: string) => document.querySelector(selector)?.getAttribute(name),
    all: (selector: string) => [...document.querySelectorAll<HTMLElement>(selector)],
    hrefs: (selector: string) =>
      [...document.querySelectorAll(selector)].map((link) => link.getAttribute('href') ?? ''),
  };
}
