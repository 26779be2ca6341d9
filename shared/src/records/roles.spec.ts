import { describe, expect, it } from 'vitest';
import { may, permissions, permissionsOf, roles } from './roles.js';

const holders = (permission: (typeof permissions)[number]) => roles.filter((role) => may([role], permission));

describe('who may do what', () => {
  it('lets curators alone review, publish and withdraw', () => {
    for (const permission of ['record:review', 'record:publish', 'record:withdraw'] as const)
      expect(holders(permission)).toEqual(['curator']);
  });

  it('lets the administrator alone change people, and not what they measure', () => {
    expect(holders('user:manage')).toEqual(['administrator']);
    expect(may(['administrator'], 'sheet:write')).toBe(false);
  });

  it('lets the administrator alone say what is measured, and everybody read it', () => {
    expect(holders('protocol:write')).toEqual(['administrator']);
    expect(holders('garment:read')).toEqual([...roles]);
  });

  it('lets the picture desk read and nothing else', () => {
    expect(permissionsOf.desk).toEqual(['garment:read']);
  });

  it('adds up over several roles, and is nothing for none', () => {
    expect(may(['desk', 'administrator'], 'audit:read')).toBe(true);
    for (const permission of permissions) expect(may([], permission)).toBe(false);
  });

  it('gives every permission to somebody', () => {
    for (const permission of permissions) expect(holders(permission)).not.toEqual([]);
  });
});
