import { Module } from '@nestjs/common';
import { AcceptanceController } from './acceptance.controller';
import { AcceptanceService } from './acceptance.service';
import { InvitationsService } from './invitations.service';
import { PeopleController } from './people.controller';
import { PeopleService } from './people.service';

@Module({
  controllers: [AcceptanceController, PeopleController],
  providers: [AcceptanceService, InvitationsService, PeopleService],
})
export class UsersModule {}
