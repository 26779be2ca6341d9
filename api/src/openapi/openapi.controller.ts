import { Controller, Get, Header } from '@nestjs/common';
import { ApiExcludeEndpoint } from '@nestjs/swagger';
import { Public } from '../common/public.decorator';
import { docsPage, docsStyle } from './docs-page';
import { OpenApi } from './openapi.service';

const anHour = 'public, max-age=3600';

/** The API's description: for programs as OpenAPI, for people as a page. */
@Public()
@Controller('api')
export class OpenApiController {
  constructor(private readonly openApi: OpenApi) {}

  @Get('openapi.json')
  @ApiExcludeEndpoint()
  @Header('Cache-Control', anHour)
  document() {
    return this.openApi.document;
  }

  @Get('docs')
  @ApiExcludeEndpoint()
  @Header('Content-Type', 'text/html; charset=utf-8')
  @Header('Cache-Control', anHour)
  page(): string {
    return docsPage(this.openApi.document);
  }

  @Get('docs.css')
  @ApiExcludeEndpoint()
  @Header('Content-Type', 'text/css; charset=utf-8')
  @Header('Cache-Control', anHour)
  style(): string {
    return docsStyle;
  }
}
