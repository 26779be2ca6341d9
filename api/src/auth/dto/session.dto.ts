import {
  AcceptInvitation,
  FirstAdministrator,
  InvitationShown,
  InvitationToken,
  Session,
  SignIn,
} from '@ellwand/shared/records/session';
import { createZodDto } from 'nestjs-zod';

export class SignInDto extends createZodDto(SignIn) {}
export class SessionDto extends createZodDto(Session) {}
export class InvitationTokenDto extends createZodDto(InvitationToken) {}
export class InvitationShownDto extends createZodDto(InvitationShown) {}
export class AcceptInvitationDto extends createZodDto(AcceptInvitation) {}
export class FirstAdministratorDto extends createZodDto(FirstAdministrator) {}
