import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Inject, Injectable } from '@nestjs/common';
import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { ContentSecurity } from '../common/content-security';
import { BUILT_FOLDERS, type BuiltFolders } from './built-folders';

interface SiteRequest {
  readonly url: string;
  readonly method: string;
  readonly headers: Readonly<Record<string, string>>;
}

/** A whole document, or where to go instead. */
export type SiteResponse =
  | { readonly status: number; readonly html: string; readonly headers: Readonly<Record<string, string>> }
  | { readonly redirect: string; readonly status: number };

/** What the site's build for the server puts out (site/src/entry-server.tsx). */
interface SiteModule {
  render(request: SiteRequest, catalogue: SiteCatalogue, assets: unknown): Promise<SiteResponse>;
  siteAssets(manifest: unknown): unknown;
  readonly inlineScriptHashes: readonly string[];
}

type Render = (request: SiteRequest, catalogue: SiteCatalogue) => Promise<SiteResponse>;

/** The public site as it was built: loaded once, when the first page is asked for. */
@Injectable()
export class SiteBuild {
  private loading: Promise<Render> | null = null;

  constructor(
    @Inject(BUILT_FOLDERS) private readonly folders: BuiltFolders,
    private readonly contentSecurity: ContentSecurity,
  ) {}

  /** @returns null where the site has not been built */
  async renderer(): Promise<Render | null> {
    if (!existsSync(this.entry) || !existsSync(this.manifest)) return null;
    this.loading ??= this.load().catch((fault: unknown) => {
      this.loading = null;
      throw fault;
    });
    return this.loading;
  }

  private get entry(): string {
    return join(this.folders.site, 'server', 'entry-server.js');
  }

  private get manifest(): string {
    return join(this.folders.site, 'client', '.vite', 'manifest.json');
  }

  private async load(): Promise<Render> {
    // Compiled to require(), which loads the build's ES module on every Node that Ellwand runs on.
    const site = (await import(this.entry)) as SiteModule;
    const assets = site.siteAssets(JSON.parse(readFileSync(this.manifest, 'utf8')));
    this.contentSecurity.allowScripts(site.inlineScriptHashes);
    return (request, catalogue) => site.render(request, catalogue, assets);
  }
}
