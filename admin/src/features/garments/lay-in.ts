import type { NotedAtTable } from '@ellwand/shared/records/noted';

/** The record's box that a note belongs in. A remark has none of its own: the handling notes are never public. */
export const boxOf = {
  label: 'label.transcription',
  fastenings: 'fastenings',
  condition: 'condition',
  remark: 'handling',
} as const satisfies Readonly<Record<NotedAtTable['thing'], string>>;

/** What stands in the box, and the note after it on a line of its own; once, however often it is laid in. */
export function laidIn(before: string, text: string): string {
  if (before.includes(text)) return before;
  return before.trim() === '' ? text : `${before.trimEnd()}\n${text}`;
}
