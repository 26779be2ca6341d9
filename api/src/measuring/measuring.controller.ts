import { Body, Controller, Get, HttpCode, Param, Post, Put } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../common/actor';
import { IdParam } from '../common/dto/id.dto';
import { IfMatch } from '../common/if-match';
import { Requires } from '../common/requires.decorator';
import {
  FindingAnswerDto,
  NewReadingsDto,
  NewSheetDto,
  ReadingResultsDto,
  SheetDto,
  SheetFactsDto,
  SheetFindingsDto,
  NewTableNotesDto,
  TableNoteResultsDto,
} from './dto';
import { FindingsService } from './findings/findings.service';
import { ReadingsService } from './readings/readings.service';
import { TableNotesService } from './table-notes/table-notes.service';
import { SheetsService } from './sheets/sheets.service';

@ApiTags('Measuring')
@Controller('workroom')
export class MeasuringController {
  constructor(
    private readonly sheets: SheetsService,
    private readonly readings: ReadingsService,
    private readonly findings: FindingsService,
    private readonly notes: TableNotesService,
  ) {}

  @Post('parts/:id/sheets')
  @Requires('sheet:write')
  @ZodResponse({ status: 201, type: SheetDto })
  open(@Param() { id }: IdParam, @Body() sheet: NewSheetDto, @CurrentActor() actor: Actor) {
    return this.sheets.open(id, sheet, actor);
  }

  @Get('sheets/:id')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: SheetDto })
  read(@Param() { id }: IdParam) {
    return this.sheets.read(id);
  }

  @Put('sheets/:id/facts')
  @Requires('sheet:write')
  @ZodResponse({ status: 200, type: SheetDto })
  setFacts(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() facts: SheetFactsDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.sheets.setFacts(id, seen, facts, actor);
  }

  @Post('sheets/:id/readings')
  @HttpCode(200)
  @Requires('sheet:write')
  @ZodResponse({ status: 200, type: ReadingResultsDto })
  takeIn(@Param() { id }: IdParam, @Body() { readings }: NewReadingsDto, @CurrentActor() actor: Actor) {
    return this.readings.takeIn(id, readings, actor);
  }

  @Post('sheets/:id/table-notes')
  @HttpCode(200)
  @Requires('sheet:write')
  @ZodResponse({ status: 200, type: TableNoteResultsDto })
  takeNotes(@Param() { id }: IdParam, @Body() { notes }: NewTableNotesDto, @CurrentActor() actor: Actor) {
    return this.notes.takeIn(id, notes, actor);
  }

  @Get('sheets/:id/findings')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: SheetFindingsDto })
  readFindings(@Param() { id }: IdParam) {
    return this.findings.read(id);
  }

  @Post('sheets/:id/findings/answers')
  @HttpCode(200)
  @Requires('sheet:write')
  @ZodResponse({ status: 200, type: SheetFindingsDto })
  answer(@Param() { id }: IdParam, @Body() { key, reason }: FindingAnswerDto, @CurrentActor() actor: Actor) {
    return this.findings.answer(id, key, reason, actor);
  }

  @Post('sheets/:id/complete')
  @HttpCode(200)
  @Requires('sheet:write')
  @ZodResponse({ status: 200, type: SheetDto })
  complete(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.sheets.complete(id, seen, actor);
  }

  @Post('sheets/:id/reopen')
  @HttpCode(200)
  @Requires('sheet:write')
  @ZodResponse({ status: 200, type: SheetDto })
  reopen(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.sheets.reopen(id, seen, actor);
  }
}
