import type { SiteAssets } from './document';

/** The part of a Vite manifest that is read here. */
export type SiteManifest = Readonly<
  Record<
    string,
    {
      readonly file: string;
      readonly isEntry?: boolean;
      readonly css?: readonly string[];
      readonly assets?: readonly string[];
    }
  >
>;

/** What a page must name, from the manifest of the browser's build. Throws where it has no entry. */
export function siteAssets(manifest: SiteManifest): SiteAssets {
  const entry = Object.values(manifest).find(({ isEntry }) => isEntry === true);
  if (!entry)
    throw new Error('The manifest of the site has no entry: build it with "npm run build -w site".');
  const address = (file: string) => `/${file}`;
  const fonts = [...(entry.assets ?? []), ...Object.values(manifest).map(({ file }) => file)];
  return {
    entryScript: address(entry.file),
    styles: (entry.css ?? []).map(address),
    preloadFonts: [...new Set(fonts.filter((file) => file.endsWith('.woff2')))].sort().map(address),
    // Names of built files carry their hash, so that the entry's name tells one build from another.
    buildId: [entry.file, ...(entry.css ?? [])].join(' '),
  };
}
