import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import type { SheetRow } from '../model/rows.js';

/** What a row is called: its point, its side as worn, and which reading it is after the first. */
export function rowLabel({ point, worn, round }: SheetRow): string {
  const side = worn ? `, ${wornSideLabels[worn]}` : '';
  return `${point.point.name}${side}${round === 1 ? '' : `, reading ${round}`}`;
}
