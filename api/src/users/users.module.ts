import { Module } from '@nestjs/common';
import { AcceptanceController } from './acceptance.controller';
import { AcceptanceService } from './acceptance.service';
import { DamageReportsService } from './damage-reports.service';
import { InvitationsService } from './invitations.service';
import { PeopleController } from './people.controller';
import { PeopleService } from './people.service';
import { SettingsController } from './settings.controller';

@Module({
  controllers: [AcceptanceController, PeopleController, SettingsController],
  providers: [AcceptanceService, DamageReportsService, InvitationsService, PeopleService],
})
export class UsersModule {}
