import { isGarmentKind, kindLabels } from '@ellwand/shared/points/kinds';

/** "Dress", "Child’s dress", "Set": a garment may also be a set, which no part is. */
export const kindWord = (kind: string): string =>
  isGarmentKind(kind) ? kindLabels[kind].singular : kind.charAt(0).toUpperCase() + kind.slice(1);
