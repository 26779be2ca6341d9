import { Controller, Get, Inject, NotFoundException, Req, Res } from '@nestjs/common';
import { ApiExcludeController } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { Public } from '../common/public.decorator';
import { BUILT_FOLDERS, type BuiltFolders } from './built-folders';
import { plainPage } from './plain-page';
import { StaticFiles } from './static-files';

const prefix = '/workroom/';
const shell = 'index.html';

/** The Workroom's built files. They hold no data, so anybody may fetch them; the API asks who is there. */
@ApiExcludeController()
@Controller('workroom')
@Public()
export class WorkroomController {
  private readonly files: StaticFiles;

  constructor(@Inject(BUILT_FOLDERS) folders: BuiltFolders) {
    this.files = new StaticFiles(folders.workroom);
  }

  /** The slash matters: the service worker's scope and every address in the build begin with it. */
  @Get()
  async door(@Req() request: Request, @Res() response: Response): Promise<void> {
    if (request.path === prefix) return await this.sendShell(request, response);
    const [, search = ''] = /(\?.*)$/.exec(request.originalUrl) ?? [];
    response.redirect(308, `${prefix}${search}`);
  }

  @Get('{*path}')
  async file(@Req() request: Request, @Res() response: Response): Promise<void> {
    const name = request.path.slice(prefix.length);
    if (name !== shell && this.files.has(name)) return await this.files.send(name, request, response);
    // An old shell that asks for files of a build that is gone must not be given a page in their stead.
    if (name.startsWith('assets/')) throw new NotFoundException(`Cannot GET ${request.path}`);
    await this.sendShell(request, response);
  }

  /** Every other address is one of the application's own, which it reads in the browser. */
  private async sendShell(request: Request, response: Response): Promise<void> {
    if (this.files.has(shell)) return await this.files.send(shell, request, response, 'no-store');
    const page = plainPage('The Workroom is not built yet', 'Run <code>npm start</code>, which builds it.');
    response.status(503).set({ 'Cache-Control': 'no-store', 'Retry-After': '30' }).type('html').send(page);
  }
}
