import { NotedList, NoteSettlement } from '@ellwand/shared/records/noted';
import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../../common/actor';
import { IdParam } from '../../common/dto/id.dto';
import { Requires } from '../../common/requires.decorator';
import { NotedService } from './noted.service';

class NotedListDto extends createZodDto(NotedList) {}
class NoteSettlementDto extends createZodDto(NoteSettlement) {}

@ApiTags('Measuring')
@Controller('workroom')
export class NotedController {
  constructor(private readonly noted: NotedService) {}

  @Get('garments/:id/noted-at-table')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: NotedListDto })
  list(@Param() { id }: IdParam) {
    return this.noted.list(id);
  }

  @Post('table-notes/:id/settle')
  @HttpCode(200)
  @Requires('garment:write')
  @ZodResponse({ status: 200, type: NotedListDto })
  settle(@Param() { id }: IdParam, @Body() { how }: NoteSettlementDto, @CurrentActor() actor: Actor) {
    return this.noted.settle(id, how, actor);
  }
}
