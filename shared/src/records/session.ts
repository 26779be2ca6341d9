import { z } from 'zod';
import { line, Moment, pageOf, Uuid } from './common.js';
import { Role } from './roles.js';

/** One address and nothing else: a second recipient or a header cannot hide in it. */
export const EmailAddress = z.email('Write one e-mail address, such as name@museum.example').max(254);

/** At least twelve characters, any characters, no composition rules; common passwords are refused by the API. */
export const NewPassword = z
  .string()
  .min(12, 'Use at least 12 characters. Three or four words that do not belong together are easy to keep')
  .max(256, 'Use at most 256 characters');

export const SignIn = z.strictObject({
  email: EmailAddress,
  password: z.string().min(1, 'Write your password').max(256),
});
export type SignIn = z.infer<typeof SignIn>;

/** Answer of `GET /session` and `POST /session`: who is signed in. */
export const Session = z.object({
  user: z.object({ id: Uuid, name: z.string(), email: z.string(), roles: z.array(Role) }),
  /** When the short access token ends; the Workroom refreshes a little before. */
  accessEndsAt: Moment,
});
export type Session = z.infer<typeof Session>;

export const NewInvitation = z.strictObject({
  email: EmailAddress,
  name: line(120),
  roles: z.array(Role).min(1, 'Choose at least one role'),
});
export type NewInvitation = z.infer<typeof NewInvitation>;

export const Invitation = z.object({
  id: Uuid,
  email: z.string(),
  name: z.string(),
  roles: z.array(Role),
  invitedBy: z.string(),
  createdAt: Moment,
  expiresAt: Moment,
  state: z.enum(['open', 'accepted', 'expired', 'withdrawn']),
});
export type Invitation = z.infer<typeof Invitation>;

/** The secret part of an invitation's link: 32 random bytes, base64url. It travels in the body, never in a query. */
export const InvitationToken = z.strictObject({
  token: z.string().regex(/^[\w-]{43}$/, 'The link is not complete'),
});

/** `POST /invitations/look-up`: what the person is shown before choosing a password. */
export const InvitationShown = z.object({
  email: z.string(),
  name: z.string(),
  roles: z.array(Role),
  museum: z.string(),
});
export type InvitationShown = z.infer<typeof InvitationShown>;

export const AcceptInvitation = InvitationToken.extend({ name: line(120), password: NewPassword });
export type AcceptInvitation = z.infer<typeof AcceptInvitation>;

/** `POST /first-administrator`: works once, in an empty house, with the address that `npm start -- --empty` printed. */
export const FirstAdministrator = InvitationToken.extend({
  email: EmailAddress,
  name: line(120),
  password: NewPassword,
});
export type FirstAdministrator = z.infer<typeof FirstAdministrator>;

export const Person = z.object({
  id: Uuid,
  email: z.string(),
  name: z.string(),
  roles: z.array(Role),
  active: z.boolean(),
  version: z.number().int(),
  lastSignInAt: Moment.nullable(),
});
export type Person = z.infer<typeof Person>;
export const People = pageOf(Person);

/** `GET /workroom/colleagues`: whoever may be named on a sheet. */
export const Colleague = z.object({ id: Uuid, name: z.string() });
export const Colleagues = z.object({ items: z.array(Colleague) });

export const PersonChange = z.strictObject({
  name: line(120).optional(),
  roles: z.array(Role).min(1, 'Choose at least one role').optional(),
  active: z.boolean().optional(),
});
export type PersonChange = z.infer<typeof PersonChange>;
