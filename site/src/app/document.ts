import { museum } from '../config/museum';
import { paths } from '../config/paths';
import { escapeHtml } from '../lib/escape-html';
import { jsonForScript } from '../lib/json-script';
import { unitScript } from '../components/units/unit-script';
import { documentTitle } from './document-title';
import type { PageHead } from './page-handle';

/** What the built site consists of, as the API reads it from the manifest. */
export interface SiteAssets {
  readonly entryScript: string;
  readonly styles: readonly string[];
  readonly preloadFonts: readonly string[];
  readonly buildId: string;
}

/** What the browser goes on from. */
export interface Hydration {
  readonly loaderData: Record<string, unknown>;
}

export interface DocumentParts {
  readonly head: PageHead;
  /** Scheme and host of the site, or empty where they are not known. */
  readonly origin: string;
  readonly unit: string;
  readonly body: string;
  /** Null on a page that stays as it is sent: no script then takes it over. */
  readonly hydration: Hydration | null;
  readonly assets: SiteAssets;
}

/** The whole document. Classes only, no `style`, and no script but those the security policy knows. */
export function documentHtml({ head, origin, unit, body, hydration, assets }: DocumentParts): string {
  const scripts =
    hydration === null
      ? ''
      : `<script type="application/json" id="hydration">${jsonForScript(hydration)}</script>` +
        `<script type="module" src="${escapeHtml(assets.entryScript)}"></script>`;
  return (
    `<!doctype html><html lang="en" data-unit="${escapeHtml(unit)}"><head><meta charset="utf-8">` +
    '<meta name="viewport" content="width=device-width, initial-scale=1">' +
    `${headHtml(head, origin)}${assetsHtml(assets)}<script>${unitScript}</script></head>` +
    `<body><div id="root">${body}</div>${scripts}</body></html>`
  );
}

function headHtml(head: PageHead, origin: string): string {
  const title = documentTitle(head.title);
  const canonical = origin + head.canonicalPath;
  const meta = (attribute: 'name' | 'property', name: string, content: string) =>
    `<meta ${attribute}="${name}" content="${escapeHtml(content)}">`;
  const picture = head.image ? origin + paths.picture(head.image.id, widest(head.image.widths), 'jpg') : null;
  return [
    `<title>${escapeHtml(title)}</title>`,
    meta('name', 'description', head.description),
    `<link rel="canonical" href="${escapeHtml(canonical)}">`,
    head.unlisted ? meta('name', 'robots', 'noindex') : '',
    meta('name', 'theme-color', '#F6F7F5'),
    meta('property', 'og:title', head.title),
    meta('property', 'og:description', head.description),
    meta('property', 'og:type', 'website'),
    meta('property', 'og:url', canonical),
    meta('property', 'og:site_name', museum.name),
    picture
      ? meta('property', 'og:image', picture) + meta('property', 'og:image:alt', head.image?.alt ?? '')
      : '',
    '<link rel="icon" href="/favicon.svg" type="image/svg+xml">',
  ].join('');
}

const widest = (widths: readonly number[]): number =>
  Math.max(...widths.filter((width) => width <= 1280), 320);

function assetsHtml({ preloadFonts, styles }: SiteAssets): string {
  const fonts = preloadFonts.map(
    (href) => `<link rel="preload" href="${escapeHtml(href)}" as="font" type="font/woff2" crossorigin>`,
  );
  const sheets = styles.map((href) => `<link rel="stylesheet" href="${escapeHtml(href)}">`);
  return [...fonts, ...sheets].join('');
}
