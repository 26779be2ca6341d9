import { runChecks } from '@ellwand/shared/checks/registry';
import { derivedViews, toReading } from '@ellwand/shared/records/measured';
import { toProtocol } from '@ellwand/shared/records/protocol';
import type { FindingView, NewReading, Sheet, SheetFindings } from '@ellwand/shared/records/sheet';
import { mm } from '@ellwand/shared/units/length';
import { readingsSoFar } from './pending-reading.js';

/** What was answered at this table and may not have been sent yet. */
export interface SaidAnswer {
  readonly key: string;
  readonly reason: string;
  readonly by: string;
  readonly at: string;
}

/**
 * What the checks say of all that was read so far, worked out on this device by the same rules as at the museum, for
 * where there is no network. What needs other garments or the other part is left out and asked again later.
 */
export function localFindings(
  sheet: Sheet,
  pending: readonly NewReading[],
  {
    by,
    answers,
    known,
  }: {
    readonly by: string;
    readonly answers: readonly SaidAnswer[];
    /** What the API said last: its answers hold while the figures are the same. */
    readonly known: readonly FindingView[];
  },
): SheetFindings {
  const readings = readingsSoFar(sheet, pending, by);
  const protocol = toProtocol(sheet.protocol);
  const found = runChecks({
    kind: sheet.kind,
    protocol,
    readings: readings.map(toReading),
    support: sheet.facts.support,
    tapeLength: mm(sheet.facts.tapeLengthMm),
  });
  const answered = new Map(known.flatMap(({ key, answer }) => (answer ? [[key, answer] as const] : [])));
  for (const { key, reason, by: name, at } of answers) answered.set(key, { reason, by: name, at });
  return {
    findings: found.map(({ key, checkId, severity, sentence, pointIds }) => ({
      ...{ key, checkId, severity, sentence },
      pointIds: [...pointIds],
      answer: answered.get(key) ?? null,
    })),
    derived: derivedViews(sheet.kind, readings, { ownPoints: protocol.ownPoints }),
  };
}
