/** A check is tested as two lists: sheets on which it is quiet, and sheets on which it raises, to the sentence. */
import { describe, expect, it } from 'vitest';
import type { Check } from '../checks/check.js';
import type { Severity } from '../checks/finding.js';
import { type CheckSheet, type OtherPart, viewSheet } from '../checks/sheet-view.js';
import type { GarmentKind } from '../points/kinds.js';
import type { Protocol } from '../protocols/protocol.js';
import { protocolFor } from '../protocols/standard-protocols.js';
import type { Reading } from '../readings/reading.js';
import { read } from './sample-readings.js';

interface QuietCase {
  readonly name: string;
  /** In mm by point, or readings in full. */
  readonly readings: Readonly<Record<string, number | string>> | readonly Reading[];
  /** A bodice unless said otherwise. */
  readonly kind?: GarmentKind;
  readonly protocol?: Protocol;
  readonly others?: readonly OtherPart[];
  /** What the sheet says beside its readings. */
  readonly facts?: Pick<CheckSheet, 'support' | 'tapeLength' | 'peers'>;
}

interface RaisesCase extends QuietCase {
  /** Every sentence, in order; a single one may stand by itself. */
  readonly says: string | readonly string[];
  readonly severity: Severity;
  readonly points: readonly string[];
}

export function sheetOf({
  readings,
  kind = 'bodice',
  protocol,
  others,
  facts,
}: Omit<QuietCase, 'name'>): CheckSheet {
  const sheet = { kind, protocol: protocol ?? protocolFor(kind), readings: readingsOf(readings), ...facts };
  return others ? { ...sheet, otherPartsOfGarment: others } : sheet;
}

function readingsOf(readings: QuietCase['readings']): readonly Reading[] {
  if (isList(readings)) return readings;
  return Object.entries(readings).map(([pointId, valueMm]) => read(pointId, valueMm));
}

function isList(readings: QuietCase['readings']): readings is readonly Reading[] {
  return Array.isArray(readings);
}

export function testCheck(
  check: Check,
  cases: { readonly quiet: readonly QuietCase[]; readonly raises: readonly RaisesCase[] },
): void {
  describe(`${check.id} is quiet`, () => {
    it.each(cases.quiet.map((entry) => [entry.name, entry] as const))('%s', (_name, entry) => {
      expect(check.run(viewSheet(sheetOf(entry)))).toEqual([]);
    });
  });

  describe(`${check.id} raises`, () => {
    it.each(cases.raises.map((entry) => [entry.name, entry] as const))('%s', (_name, entry) => {
      const findings = check.run(viewSheet(sheetOf(entry)));
      expect(findings.map(({ sentence }) => sentence)).toEqual([entry.says].flat());
      for (const finding of findings) expect(finding.severity).toBe(entry.severity);
      expect(findings.flatMap(({ pointIds }) => pointIds)).toEqual(entry.points);
    });
  });
}
