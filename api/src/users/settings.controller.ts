import { DamageReports } from '@ellwand/shared/records/noted';
import { Body, Controller, Get, Put } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../common/actor';
import { Requires } from '../common/requires.decorator';
import { DamageReportsService } from './damage-reports.service';

class DamageReportsDto extends createZodDto(DamageReports) {}

@ApiTags('People')
@Controller('workroom/settings')
export class SettingsController {
  constructor(private readonly damage: DamageReportsService) {}

  @Get('damage-reports')
  @Requires('user:manage')
  @ZodResponse({ status: 200, type: DamageReportsDto })
  read() {
    return this.damage.read();
  }

  @Put('damage-reports')
  @Requires('user:manage')
  @ZodResponse({ status: 200, type: DamageReportsDto })
  set(@Body() reports: DamageReportsDto, @CurrentActor() actor: Actor) {
    return this.damage.set(reports, actor);
  }
}
