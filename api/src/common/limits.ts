import { SetMetadata } from '@nestjs/common';

/** Injects how often one address may ask. */
export const LIMITS = Symbol('limits');

/** Kinds of routes that are limited apart from each other. */
export type LimitKind = 'public' | 'workroom' | 'sign-in' | 'upload';

/** So many requests in one minute from one address (of IPv6: from one /64). */
export type Limits = Readonly<Record<LimitKind, number>>;

/**
 * A page with its pictures is thirty requests or so, and a school class behind one address opens a hundred pages a
 * minute; a measuring table with three tablets stays below a hundred requests. A password is tried by hand a few
 * times a minute.
 */
export const defaultLimits: Limits = { public: 6_000, workroom: 900, 'sign-in': 20, upload: 120 };

export const LIMITED_AS = 'ellwand:limited-as';

/** Puts a route, or all of a controller, under another limit than its permission would. */
export const LimitedAs = (kind: LimitKind) => SetMetadata(LIMITED_AS, kind);
