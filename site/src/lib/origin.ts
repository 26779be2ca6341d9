/** Stands for the host where a request came without one. */
export const UNKNOWN_ORIGIN = 'http://catalogue.invalid';

/** Scheme and host of an address, or nothing where it came without them. */
export function knownOrigin({ origin }: URL): string {
  return origin === UNKNOWN_ORIGIN ? '' : origin;
}
