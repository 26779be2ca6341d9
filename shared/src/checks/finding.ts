import type { Length } from '../units/length.js';

/**
 * How much a finding weighs. An open stop keeps a sheet from being completed, an open question keeps a
 * record from being approved, a note keeps nothing. Stops and questions are answered by reading again or by a reason.
 */
export type Severity = 'stop' | 'question' | 'note';

export const severities: readonly Severity[] = ['stop', 'question', 'note'];

export const severityLabels: Readonly<Record<Severity, string>> = {
  stop: 'Stop',
  question: 'Question',
  note: 'Note',
};

/** What a check has to say about a sheet. */
export interface Finding {
  /** The same while the same check says the same of the same figures: an answer holds to it. */
  readonly key: string;
  readonly checkId: string;
  readonly severity: Severity;
  /** A whole sentence with the figures in it. */
  readonly sentence: string;
  readonly pointIds: readonly string[];
  /** The figures by the names they have in the check's wording. */
  readonly figures: Readonly<Record<string, Length>>;
}
