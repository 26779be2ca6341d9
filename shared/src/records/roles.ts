import { z } from 'zod';

export const roles = ['recorder', 'curator', 'desk', 'administrator'] as const;
export const Role = z.enum(roles);
export type Role = z.infer<typeof Role>;

export const roleLabels: Readonly<Record<Role, string>> = {
  recorder: 'Recorder',
  curator: 'Curator',
  desk: 'Picture desk',
  administrator: 'Administrator',
};

/** What a signed-in person may ask for. Routes name one of these; nobody asks for a role. */
export const permissions = [
  'garment:read',
  'garment:write',
  'sheet:write',
  'image:write',
  'record:submit',
  'record:review',
  'record:publish',
  'record:withdraw',
  'protocol:write',
  'user:manage',
  'audit:read',
] as const;
export type Permission = (typeof permissions)[number];

/** Role by role, what it may do. The routes' guard, the screens and the tests all read this table. */
export const permissionsOf: Readonly<Record<Role, readonly Permission[]>> = {
  recorder: ['garment:read', 'garment:write', 'sheet:write', 'image:write', 'record:submit'],
  curator: [
    'garment:read',
    'garment:write',
    'sheet:write',
    'image:write',
    'record:submit',
    'record:review',
    'record:publish',
    'record:withdraw',
    'audit:read',
  ],
  desk: ['garment:read'],
  administrator: ['garment:read', 'protocol:write', 'user:manage', 'audit:read'],
};

/** Whether any of a person's roles carries the permission. */
export function may(held: readonly Role[], permission: Permission): boolean {
  return held.some((role) => permissionsOf[role].includes(permission));
}
