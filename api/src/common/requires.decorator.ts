import { SetMetadata } from '@nestjs/common';
import type { Permission } from '@ellwand/shared/records/roles';

export const REQUIRED_PERMISSION = 'ellwand:requires';
export const SIGNED_IN = 'signed-in';
export type Requirement = Permission | typeof SIGNED_IN;

/** Names who may enter: the permission a route asks for, or merely being signed in. */
export const Requires = (requirement: Requirement) => SetMetadata(REQUIRED_PERMISSION, requirement);
