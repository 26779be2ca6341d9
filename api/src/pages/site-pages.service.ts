import { Inject, Injectable, Logger } from '@nestjs/common';
import { InProcessCatalogue } from '../catalogue/site-catalogue.service';
import { ENVIRONMENT } from '../common/environment.token';
import type { Environment } from '../config/environment';
import { plainPage } from './plain-page';
import { SiteBuild, type SiteResponse } from './site-build';

const headers = { 'Content-Type': 'text/html; charset=utf-8', 'Cache-Control': 'no-store' };

const notBuilt: SiteResponse = {
  status: 503,
  html: plainPage('The catalogue is not built yet', 'Run <code>npm start</code>, which builds it.'),
  headers: { ...headers, 'Retry-After': '30' },
};
const failed: SiteResponse = {
  status: 500,
  html: plainPage(
    'This page could not be made',
    'The fault is ours and has been noted. Try again in a moment.',
  ),
  headers,
};

/** Renders the public pages in this process, handing them the catalogue instead of a network. */
@Injectable()
export class SitePages {
  private readonly log = new Logger('pages');

  constructor(
    private readonly build: SiteBuild,
    private readonly catalogue: InProcessCatalogue,
    @Inject(ENVIRONMENT) private readonly environment: Pick<Environment, 'publicUrl'>,
  ) {}

  /** @param target path and query as they were asked for, beginning with a slash */
  async page(target: string, method: string): Promise<SiteResponse> {
    try {
      const render = await this.build.renderer();
      if (!render) return notBuilt;
      // Put together as text: resolved as an address, `//elsewhere` would name another host.
      const response = await render(
        { url: this.environment.publicUrl + target, method, headers: {} },
        this.catalogue,
      );
      return 'redirect' in response ? { ...response, redirect: this.localPath(response.redirect) } : response;
    } catch (fault) {
      this.log.error(fault instanceof Error ? fault.stack : String(fault));
      return failed;
    }
  }

  /** A redirect stays in this house, whatever was in the address that led to it. */
  private localPath(location: string): string {
    const { origin } = new URL(this.environment.publicUrl);
    const url = new URL(location, origin);
    return url.origin === origin
      ? `/${`${url.pathname}${url.search}${url.hash}`.replace(/^[/\\]+/, '')}`
      : '/';
  }
}
