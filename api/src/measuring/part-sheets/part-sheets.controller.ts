import { PartSheets, SpeakingSheet } from '@ellwand/shared/records/part-sheets';
import { Body, Controller, Get, Param, Put } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../../common/actor';
import { IdParam } from '../../common/dto/id.dto';
import { IfMatch } from '../../common/if-match';
import { Requires } from '../../common/requires.decorator';
import { PartSheetsService } from './part-sheets.service';

class PartSheetsDto extends createZodDto(PartSheets) {}
class SpeakingSheetDto extends createZodDto(SpeakingSheet) {}

@ApiTags('Measuring')
@Controller('workroom/parts/:id')
export class PartSheetsController {
  constructor(private readonly sheets: PartSheetsService) {}

  @Get('sheets')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: PartSheetsDto })
  read(@Param() { id }: IdParam) {
    return this.sheets.read(id);
  }

  @Put('speaking-sheet')
  @Requires('garment:write')
  @ZodResponse({ status: 200, type: PartSheetsDto })
  choose(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() choice: SpeakingSheetDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.sheets.choose(id, seen, choice, actor);
  }
}
