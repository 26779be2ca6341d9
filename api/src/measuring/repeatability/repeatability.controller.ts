import { Controller, Get, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Requires } from '../../common/requires.decorator';
import { RepeatabilityDto, RepeatabilityQueryDto } from './repeatability.dto';
import { RepeatabilityService } from './repeatability.service';

@ApiTags('Measuring')
@Controller('workroom/repeatability')
export class RepeatabilityController {
  constructor(private readonly repeatability: RepeatabilityService) {}

  @Get()
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: RepeatabilityDto })
  read(@Query() { from }: RepeatabilityQueryDto) {
    return this.repeatability.read(from);
  }
}
