import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { isKind } from '../../lib/words';

/** The kind that an address asks for; the bodice, which has the most to show, where it names none. */
export function kindOf(params: URLSearchParams): GarmentKind {
  const kind = params.get('kind') ?? '';
  return isKind(kind) ? kind : FIRST_KIND;
}

export const FIRST_KIND: GarmentKind = 'bodice';
