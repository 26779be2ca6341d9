import { Controller, Get, Inject, NotFoundException, Req, Res } from '@nestjs/common';
import { ApiExcludeController } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { join } from 'node:path';
import { ContentSecurity } from '../common/content-security';
import { Public } from '../common/public.decorator';
import { BUILT_FOLDERS, type BuiltFolders } from './built-folders';
import { SitePages } from './site-pages.service';
import { StaticFiles } from './static-files';

/** Addresses of programs: what is not found there is told as a problem document, not as a page. */
const forPrograms = /^\/(?:api|media|health|assets)(?:\/|$)/;

/** The public site: its built files, and for every other address a page that it renders itself. */
@ApiExcludeController()
@Controller()
@Public()
export class PagesController {
  private readonly files: StaticFiles;

  constructor(
    private readonly pages: SitePages,
    private readonly contentSecurity: ContentSecurity,
    @Inject(BUILT_FOLDERS) folders: BuiltFolders,
  ) {
    this.files = new StaticFiles(join(folders.site, 'client'));
  }

  @Get('{*page}')
  async page(@Req() request: Request, @Res() response: Response): Promise<void> {
    const name = request.path.slice(1);
    if (this.files.has(name)) return await this.files.send(name, request, response);
    if (forPrograms.test(request.path) || !request.originalUrl.startsWith('/')) {
      throw new NotFoundException(`Cannot GET ${request.path}`);
    }
    const made = await this.pages.page(request.originalUrl, request.method);
    this.allowScripts(response);
    if ('redirect' in made) response.redirect(made.status, made.redirect);
    else response.status(made.status).set(made.headers).send(made.html);
  }

  /** The policy was set before the first page loaded the site and with it the hashes of its scripts. */
  private allowScripts(response: Response): void {
    const policy = String(response.getHeader('Content-Security-Policy') ?? '');
    const scripts = `script-src ${this.contentSecurity.scriptSources}`;
    response.setHeader('Content-Security-Policy', policy.replace(/script-src [^;]*/, scripts));
  }
}
