import { Body, Controller, Delete, Get, HttpCode, Param, Post, Put, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../common/actor';
import { IdParam } from '../common/dto/id.dto';
import { IfMatch } from '../common/if-match';
import { Requires } from '../common/requires.decorator';
import {
  GarmentDto,
  GarmentPageDto,
  GarmentQueryDto,
  GarmentRecordDto,
  NewGarmentDto,
  NewPartDto,
} from './dto/garment.dto';
import { GarmentListService } from './garment-list.service';
import { GarmentsService } from './garments.service';
import { WornTogetherService } from './worn-together.service';

@ApiTags('Garments')
@Controller('workroom')
export class GarmentsController {
  constructor(
    private readonly garments: GarmentsService,
    private readonly lists: GarmentListService,
    private readonly together: WornTogetherService,
  ) {}

  @Get('garments')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: GarmentPageDto })
  list(@Query() query: GarmentQueryDto) {
    return this.lists.list(query);
  }

  @Post('garments')
  @Requires('garment:write')
  @ZodResponse({ status: 201, type: GarmentDto })
  make(@Body() made: NewGarmentDto, @CurrentActor() actor: Actor) {
    return this.garments.make(made, actor);
  }

  @Get('garments/:id')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: GarmentDto })
  read(@Param() { id }: IdParam) {
    return this.garments.read(id);
  }

  @Put('garments/:id/record')
  @Requires('garment:write')
  @ZodResponse({ status: 200, type: GarmentDto })
  rewrite(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() record: GarmentRecordDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.garments.rewrite(id, seen, record, actor);
  }

  @Post('garments/:id/parts')
  @Requires('garment:write')
  @ZodResponse({ status: 201, type: GarmentDto })
  addPart(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() part: NewPartDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.garments.addPart(id, seen, part, actor);
  }

  @Post('garments/:id/worn-together')
  @Requires('garment:write')
  @ZodResponse({ status: 201, type: GarmentDto })
  layTogether(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.together.make(id, seen, actor);
  }

  @Delete('parts/:id')
  @HttpCode(200)
  @Requires('garment:write')
  @ZodResponse({ status: 200, type: GarmentDto })
  removePart(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.garments.removePart(id, seen, actor);
  }
}
