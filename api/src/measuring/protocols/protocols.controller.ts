import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../../common/actor';
import { IdParam } from '../../common/dto/id.dto';
import { IfMatch } from '../../common/if-match';
import { Requires } from '../../common/requires.decorator';
import { SheetDto } from '../dto';
import {
  KindParam,
  NewProtocolDto,
  ProtocolHistoryDto,
  ProtocolListDto,
  ProtocolMadeDto,
  WornTogetherDto,
} from './protocol.dto';
import { ProtocolsService } from './protocols.service';
import { SheetProtocolService } from './sheet-protocol.service';

@ApiTags('Protocols')
@Controller('workroom')
export class ProtocolsController {
  constructor(
    private readonly protocols: ProtocolsService,
    private readonly sheets: SheetProtocolService,
  ) {}

  @Get('protocols')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: ProtocolListDto })
  list() {
    return this.protocols.list();
  }

  @Get('protocols/:kind')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: ProtocolHistoryDto })
  history(@Param() { kind }: KindParam, @Query() { wornTogether }: WornTogetherDto) {
    return this.protocols.history({ kind, wornTogether: wornTogether === 'true' });
  }

  @Post('protocols/:kind')
  @Requires('protocol:write')
  @ZodResponse({ status: 201, type: ProtocolMadeDto })
  make(
    @Param() { kind }: KindParam,
    @Query() { wornTogether }: WornTogetherDto,
    @IfMatch() seen: number,
    @Body() protocol: NewProtocolDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.protocols.make({ kind, wornTogether: wornTogether === 'true' }, seen, protocol, actor);
  }

  @Post('sheets/:id/newest-protocol')
  @HttpCode(200)
  @Requires('sheet:write')
  @ZodResponse({ status: 200, type: SheetDto })
  takeNewest(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.sheets.takeNewest(id, seen, actor);
  }
}
