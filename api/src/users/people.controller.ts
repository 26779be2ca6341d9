import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../common/actor';
import { IdParam } from '../common/dto/id.dto';
import { IfMatch } from '../common/if-match';
import { Requires } from '../common/requires.decorator';
import {
  ColleaguesDto,
  InvitationDto,
  InvitationsDto,
  NewInvitationDto,
  PagingDto,
  PeopleDto,
  PersonChangeDto,
  PersonDto,
} from './dto/people.dto';
import { InvitationsService } from './invitations.service';
import { PeopleService } from './people.service';

@ApiTags('People')
@Controller('workroom')
export class PeopleController {
  constructor(
    private readonly people: PeopleService,
    private readonly invitations: InvitationsService,
  ) {}

  @Get('users')
  @Requires('user:manage')
  @ZodResponse({ status: 200, type: PeopleDto })
  list(@Query() paging: PagingDto) {
    return this.people.list(paging);
  }

  @Patch('users/:id')
  @Requires('user:manage')
  @ZodResponse({ status: 200, type: PersonDto })
  change(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() change: PersonChangeDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.people.change(id, seen, change, actor);
  }

  @Get('colleagues')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: ColleaguesDto })
  colleagues() {
    return this.people.colleagues();
  }

  @Get('invitations')
  @Requires('user:manage')
  @ZodResponse({ status: 200, type: InvitationsDto })
  listInvitations() {
    return this.invitations.list();
  }

  @Post('invitations')
  @Requires('user:manage')
  @ZodResponse({ status: 201, type: InvitationDto })
  invite(@Body() wanted: NewInvitationDto, @CurrentActor() actor: Actor) {
    return this.invitations.invite(wanted, actor);
  }

  @Delete('invitations/:id')
  @Requires('user:manage')
  @HttpCode(204)
  withdraw(@Param() { id }: IdParam, @CurrentActor() actor: Actor): Promise<void> {
    return this.invitations.withdraw(id, actor);
  }
}
