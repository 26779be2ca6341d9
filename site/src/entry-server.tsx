import { createHash } from 'node:crypto';
import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { renderToString } from 'react-dom/server';
import {
  createStaticHandler,
  createStaticRouter,
  type StaticHandler,
  type StaticHandlerContext,
  StaticRouterProvider,
} from 'react-router-dom';
import { documentHtml, type Hydration, type SiteAssets } from './app/document';
import { type PageHead, pageOf } from './app/page-handle';
import { siteRoutes } from './app/routes';
import { unitScript } from './components/units/unit-script';
import { provideDrawings } from './components/diagram/drawings';
import MeasuringSheet from './components/diagram/measuring-sheet';
import OutlineShapes from './components/diagram/outline-shapes';
import { knownOrigin, UNKNOWN_ORIGIN } from './lib/origin';
import { isUnit } from './lib/range-boxes';

provideDrawings({ Sheet: MeasuringSheet, Outline: OutlineShapes });

export type { SiteAssets, SiteCatalogue };
export { siteAssets } from './app/site-assets';

export interface SiteRequest {
  /** Absolute, as the visitor sees it; a bare path leaves canonical links without a host. */
  readonly url: string;
  readonly method: string;
  readonly headers: Readonly<Record<string, string>>;
}

export type SiteResponse =
  | { readonly status: number; readonly html: string; readonly headers: Record<string, string> }
  | { readonly redirect: string; readonly status: number };

/** Sources for `script-src` in the content security policy: the one inline script there is. */
export const inlineScriptHashes: string[] = [
  `sha256-${createHash('sha256').update(unitScript).digest('base64')}`,
];

/** One handler for each catalogue: making the routes costs more than a page. */
const handlers = new WeakMap<SiteCatalogue, StaticHandler>();
function handlerFor(catalogue: SiteCatalogue): StaticHandler {
  const handler = handlers.get(catalogue) ?? createStaticHandler(siteRoutes(catalogue));
  handlers.set(catalogue, handler);
  return handler;
}

/** Answers a page of the public catalogue as a whole document. GET and HEAD only. */
export async function render(
  request: SiteRequest,
  catalogue: SiteCatalogue,
  assets: SiteAssets,
): Promise<SiteResponse> {
  const url = new URL(request.url, UNKNOWN_ORIGIN);
  const handler = handlerFor(catalogue);
  const found = await handler.query(new Request(url, { headers: { Accept: 'text/html' } }));
  if (found instanceof Response) {
    return { redirect: found.headers.get('Location') ?? '/', status: found.status };
  }
  const origin = knownOrigin(url);
  const { head, status } = pageSaid(found, url);
  const router = createStaticRouter(handler.dataRoutes, found);
  const unit = url.searchParams.get('unit');
  const html = documentHtml({
    head,
    origin,
    unit: isUnit(unit) ? unit : 'mm',
    body: renderToString(<StaticRouterProvider router={router} context={found} hydrate={false} />),
    // A page that failed is sent as it is: the browser has nothing to go on from.
    hydration: found.errors ? null : ({ loaderData: found.loaderData } satisfies Hydration),
    assets,
  });
  return { status, html, headers: headersFor(html, head, origin, assets) };
}

const failed: PageHead = {
  title: 'This page could not be fetched',
  description: 'The catalogue did not answer.',
  canonicalPath: '/',
  unlisted: true,
};

function pageSaid(found: StaticHandlerContext, url: URL): { head: PageHead; status: number } {
  const page = found.errors ? null : pageOf(found.matches, found.loaderData);
  if (!page) return { head: failed, status: found.errors ? Math.max(found.statusCode, 500) : 500 };
  return {
    head: page.handle.head(page.data, { url, params: page.params }),
    status: page.handle.status(page.data),
  };
}

/** Whatever may be withdrawn is asked for again each time; an unchanged page then costs a 304. */
function headersFor(
  html: string,
  head: PageHead,
  origin: string,
  assets: SiteAssets,
): Record<string, string> {
  const digest = createHash('sha256').update(assets.buildId).update(html).digest('base64url').slice(0, 22);
  const links = (head.links ?? []).map(({ rel, href }) => {
    return `<${href.startsWith('/') ? origin + href : href}>; rel="${rel}"`;
  });
  return {
    'Content-Type': 'text/html; charset=utf-8',
    'Cache-Control': 'public, no-cache',
    ETag: `"${digest}"`,
    ...(links.length > 0 ? { Link: links.join(', ') } : {}),
  };
}
