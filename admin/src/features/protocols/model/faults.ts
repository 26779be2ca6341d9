import type { FormMistake } from '../../../components/ui/error-summary.js';
import { isProblem } from '../../../lib/problem-error.js';
import { rowId } from './row-id.js';
import type { Draft } from './draft.js';

export interface Fault {
  readonly pointer: string;
  readonly detail: string;
}

/** Each fault with the row or box where it is mended. */
export function mistakesAt(draft: Draft, faults: readonly Fault[]): FormMistake[] {
  return faults.map(({ pointer, detail }) => {
    const [, list, index] = /^\/(points|ownPoints|note)(?:\/(\d+))?/.exec(pointer) ?? [];
    if (list === 'note') return { fieldId: 'version-note', message: detail };
    const at = Number(index);
    const pointId = list === 'points' ? draft.points[at]?.pointId : draft.ownPoints[at]?.id;
    return index !== undefined && pointId
      ? { fieldId: rowId(pointId), message: detail }
      : { message: detail };
  });
}

/** What the API found, at its places; any other refusal as a mistake of the whole. */
export function mistakesIn(draft: Draft, error: unknown): FormMistake[] {
  const faults = isProblem(error) ? (error.problem.errors ?? []) : [];
  if (faults.length > 0) return mistakesAt(draft, faults);
  return [{ message: error instanceof Error ? error.message : 'Not made.' }];
}
