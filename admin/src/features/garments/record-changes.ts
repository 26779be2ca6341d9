import { hazardIds } from '@ellwand/shared/records/garment';
import { boxLabels, type RecordTyped } from './record-form.js';
import { hazardLabels } from '@ellwand/shared/records/hazard-words';

export interface BoxChange {
  readonly box: keyof RecordTyped;
  readonly label: string;
  /** What the other person's record says now, and what stands in this form. */
  readonly theirs: string;
  readonly mine: string;
}

/** A box's content as a person would say it. */
function said(box: keyof RecordTyped, typed: RecordTyped): string {
  const value = typed[box];
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return value.replaceAll('\n', ', ') || 'nothing';
  if (Array.isArray(value))
    return value.map(({ kind, number }) => `${kind} ${number}`).join(', ') || 'nothing';
  if ('where' in value) return [value.transcription, value.where].filter(Boolean).join(', ') || 'nothing';
  const hazards = hazardIds.filter((id) => value[id].standing !== '');
  return hazards.map((id) => `${hazardLabels[id]}: ${value[id].standing}`).join('; ') || 'none';
}

const same = (first: unknown, second: unknown) => JSON.stringify(first) === JSON.stringify(second);

/** Which boxes somebody else changed since this form was opened, in the order of the form. */
export function changesBehind(opened: RecordTyped, theirs: RecordTyped, mine: RecordTyped): BoxChange[] {
  return (Object.keys(boxLabels) as (keyof RecordTyped)[])
    .filter((box) => !same(opened[box], theirs[box]) && !same(theirs[box], mine[box]))
    .map((box) => ({ box, label: boxLabels[box], theirs: said(box, theirs), mine: said(box, mine) }));
}

/**
 * This form after somebody else saved: their text in the boxes that only they changed, one's own text wherever
 * one has typed. Nothing typed is lost; what both changed is for the person to decide.
 */
export function mergedUnder(opened: RecordTyped, theirs: RecordTyped, mine: RecordTyped): RecordTyped {
  const boxes = Object.keys(boxLabels) as (keyof RecordTyped)[];
  const entries = boxes.map((box) => [box, same(opened[box], mine[box]) ? theirs[box] : mine[box]]);
  return Object.fromEntries(entries) as RecordTyped;
}
