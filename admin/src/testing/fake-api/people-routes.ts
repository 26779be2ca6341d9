import { DamageReports } from '@ellwand/shared/records/noted';
import {
  AcceptInvitation,
  FirstAdministrator,
  InvitationToken,
  NewInvitation,
  type Person,
  PersonChange,
  SignIn,
} from '@ellwand/shared/records/session';
import type { z } from 'zod';
import type { House } from './house.js';
import { INVITATION_TOKEN, PASSWORD, staff } from './people.js';
import { Refusal, read } from './refuse.js';
import { json, matched, nothing, type Routes } from './router.js';

function sessionOf({ id, name, email, roles }: z.infer<typeof Person>) {
  return { user: { id, name, email, roles }, accessEndsAt: new Date(Date.now() + 600_000).toISOString() };
}

function enter(house: House, person: z.infer<typeof Person>): Response {
  house.signedIn = person;
  return json(sessionOf(person));
}

export const peopleRoutes: Routes = {
  'GET /workroom/settings/damage-reports': ({ house }) => json({ userIds: house.damageReportedTo }),
  'PUT /workroom/settings/damage-reports': ({ house, body }) => {
    house.damageReportedTo = read(DamageReports, body).userIds;
    return json({ userIds: house.damageReportedTo });
  },
  'POST /session': ({ house, body }) => {
    const { email, password } = read(SignIn, body);
    const person = house.people.find((one) => one.email === email && one.active);
    if (!person || password !== PASSWORD) throw new Refusal(401, 'sign-in.refused', {}, 'Not signed in.');
    return enter(house, person);
  },
  'GET /session': ({ house }) => json(sessionOf(house.signedIn!)),
  'POST /session/refresh': ({ house }) => {
    if (!house.refreshes) throw new Refusal(401, 'session.ended');
    return enter(house, house.signedIn ?? staff.recorder);
  },
  'DELETE /session': ({ house }) => {
    house.signedIn = null;
    house.refreshes = false;
    return nothing();
  },
  'POST /invitations/look-up': ({ house, body }) => {
    const { token } = read(InvitationToken, body);
    const [invited] = house.invitations;
    if (token !== INVITATION_TOKEN || !invited) throw new Refusal(404, 'invitation.unknown');
    return json({ email: invited.email, name: invited.name, roles: invited.roles, museum: 'Larkmoor House' });
  },
  'POST /invitations/accept': ({ house, body }) => {
    const { name, password } = read(AcceptInvitation, body);
    if (password === 'password1234') {
      throw new Refusal(422, 'password.common', {
        errors: [{ pointer: '/password', detail: 'Many people use this password. Choose another' }],
      });
    }
    const person = { ...staff.recorder, id: house.newId(), name, email: 'odette.farrow@larkmoor.example' };
    house.people.push(person);
    return enter(house, person);
  },
  'POST /first-administrator': ({ house, body }) => {
    const { name, email } = read(FirstAdministrator, body);
    return enter(house, { ...staff.administrator, name, email });
  },
  'GET /workroom/invitations': ({ house }) => json({ items: house.invitations }),
  'POST /workroom/invitations': ({ house, body }) => {
    const { email, name, roles } = read(NewInvitation, body);
    const now = Date.now();
    const invitation = {
      id: house.newId(),
      email,
      name,
      roles,
      invitedBy: house.signedIn!.name,
      createdAt: new Date(now).toISOString(),
      expiresAt: new Date(now + 7 * 86_400_000).toISOString(),
      state: 'open' as const,
    };
    house.invitations.push(invitation);
    return json(invitation, 201);
  },
  'DELETE /workroom/invitations/:id': ({ house, params }) => {
    const place = house.invitations.findIndex(({ id }) => id === params.id);
    if (place >= 0) house.invitations.splice(place, 1);
    return nothing();
  },
  'GET /workroom/users': ({ house }) =>
    json({ total: house.people.length, page: 1, size: 50, items: house.people }),
  'PATCH /workroom/users/:id': ({ house, params, body, version }) => {
    const person = house.people.find(({ id }) => id === params.id);
    if (!person) throw new Refusal(404, 'user.unknown');
    matched(person.version, version);
    Object.assign(person, read(PersonChange, body), { version: person.version + 1 });
    return json(person);
  },
  'GET /workroom/colleagues': ({ house }) =>
    json({ items: house.people.filter(({ active }) => active).map(({ id, name }) => ({ id, name })) }),
  'GET /workroom/audit': ({ house, query }) => {
    const items = house.audit.map((summary, index) => ({
      id: house.newId(),
      at: '2026-12-01T09:10:00.000Z',
      actor: summary.split(' ').slice(0, 2).join(' '),
      verb: 'done',
      subjectKind: 'garment',
      subjectId: house.garments[index]?.id ?? null,
      summary,
    }));
    return json({ total: items.length, page: Number(query.get('page') ?? 1), size: 50, items });
  },
};
