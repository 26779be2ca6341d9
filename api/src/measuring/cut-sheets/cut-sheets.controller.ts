import { Body, Controller, Get, Param, Put } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../../common/actor';
import { IdParam } from '../../common/dto/id.dto';
import { IfMatch } from '../../common/if-match';
import { Requires } from '../../common/requires.decorator';
import { CutSheetDto, NewCutSheetDto } from './cut-sheet.dto';
import { CutSheetsService } from './cut-sheets.service';

@ApiTags('Measuring')
@Controller('workroom/parts/:id/cut-sheet')
export class CutSheetsController {
  constructor(private readonly cutSheets: CutSheetsService) {}

  @Get()
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: CutSheetDto })
  read(@Param() { id }: IdParam) {
    return this.cutSheets.read(id);
  }

  @Put()
  @Requires('garment:write')
  @ZodResponse({ status: 200, type: CutSheetDto })
  write(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() sheet: NewCutSheetDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.cutSheets.write(id, seen, sheet, actor);
  }
}
