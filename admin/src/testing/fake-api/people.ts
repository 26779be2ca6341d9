import type { Role } from '@ellwand/shared/records/roles';
import type { Invitation, Person } from '@ellwand/shared/records/session';
import type { z } from 'zod';

/** UUIDv7-shaped ids that sort in the order they were given. */
export const idOf = (number: number): string => `01938000-0000-7000-8000-${String(number).padStart(12, '0')}`;

const person = (number: number, name: string, roles: Role[], active = true): z.infer<typeof Person> => ({
  id: idOf(number),
  email: `${name.toLowerCase().replaceAll(' ', '.')}@larkmoor.example`,
  name,
  roles,
  active,
  version: 1,
  lastSignInAt: '2026-11-30T08:41:00.000Z',
});

/** The invented staff of Larkmoor House. */
export const staff = {
  recorder: person(1, 'Wren Aldous', ['recorder']),
  curator: person(2, 'Imogen Sallow', ['curator']),
  secondCurator: person(3, 'Teodor Marsh', ['curator']),
  desk: person(4, 'Pia Hollin', ['desk']),
  administrator: person(5, 'Ansel Dray', ['administrator']),
  mountMaker: person(6, 'Corin Vale', ['recorder'], false),
};

export const PASSWORD = 'tape ledger thimble';

export const invitation: z.infer<typeof Invitation> = {
  id: idOf(90),
  email: 'odette.farrow@larkmoor.example',
  name: 'Odette Farrow',
  roles: ['recorder'],
  invitedBy: 'Ansel Dray',
  createdAt: '2026-11-29T09:00:00.000Z',
  expiresAt: '2026-12-06T09:00:00.000Z',
  state: 'open',
};

export const INVITATION_TOKEN = 'w'.repeat(43);
