import { Controller, Get, Header, Param, Query, StreamableFile } from '@nestjs/common';
import { ApiProduces, ApiTags } from '@nestjs/swagger';
import { IdParam } from '../../common/dto/id.dto';
import { Requires } from '../../common/requires.decorator';
import { KindParam, PaperQuery } from './printed.dto';
import { type PrintedSheet, PrintedSheetsService } from './printed-sheets.service';

/** Measuring sheets as PDF. They show drafts: nobody keeps them on the way. */
@ApiTags('Measuring')
@ApiProduces('application/pdf')
@Controller('workroom')
export class PrintedSheetsController {
  constructor(private readonly printed: PrintedSheetsService) {}

  @Get('sheets/:id/sheet.pdf')
  @Requires('garment:read')
  @Header('Cache-Control', 'no-store')
  async filled(@Param() { id }: IdParam, @Query() { paper }: PaperQuery) {
    return asFile(await this.printed.filled(id, paper));
  }

  @Get('kinds/:kind/blank-sheet.pdf')
  @Requires('garment:read')
  @Header('Cache-Control', 'no-store')
  async blank(@Param() { kind }: KindParam, @Query() { paper }: PaperQuery) {
    return asFile(await this.printed.blank(kind, paper));
  }

  @Get('parts/:id/blank-sheet.pdf')
  @Requires('garment:read')
  @Header('Cache-Control', 'no-store')
  async blankFor(@Param() { id }: IdParam, @Query() { paper }: PaperQuery) {
    return asFile(await this.printed.blankFor(id, paper));
  }
}

const asFile = ({ pdf, fileName }: PrintedSheet) =>
  new StreamableFile(pdf, { type: 'application/pdf', disposition: `inline; filename="${fileName}"` });
