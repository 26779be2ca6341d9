import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiExtension, ApiSecurity } from '@nestjs/swagger';
import type { Permission } from '@ellwand/shared/records/roles';

export const REQUIRED_PERMISSION = 'ellwand:requires';
export const SIGNED_IN = 'signed-in';
export type Requirement = Permission | typeof SIGNED_IN;

/** Names who may enter: the permission a route asks for, or merely being signed in. */
export const Requires = (requirement: Requirement) =>
  applyDecorators(
    SetMetadata(REQUIRED_PERMISSION, requirement),
    ApiSecurity('session'),
    ApiExtension('x-entry', requirement),
  );
