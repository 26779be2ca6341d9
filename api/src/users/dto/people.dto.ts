import { Paging } from '@ellwand/shared/records/common';
import {
  Colleagues,
  Invitation,
  NewInvitation,
  People,
  Person,
  PersonChange,
} from '@ellwand/shared/records/session';
import { createZodDto } from 'nestjs-zod';
import { z } from 'zod';

export class PagingDto extends createZodDto(Paging) {}
export class PeopleDto extends createZodDto(People) {}
export class PersonDto extends createZodDto(Person) {}
export class PersonChangeDto extends createZodDto(PersonChange) {}
export class ColleaguesDto extends createZodDto(Colleagues) {}
export class NewInvitationDto extends createZodDto(NewInvitation) {}
export class InvitationDto extends createZodDto(Invitation) {}
export class InvitationsDto extends createZodDto(z.object({ items: z.array(Invitation) })) {}
