import { existsSync, readFileSync, readdirSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kindIds } from '../points/kinds.js';
import { measuringPoints } from '../points/measuring-points.js';
import { protocolFor } from '../protocols/standard-protocols.js';
import { notTakenReasonIds, type Reading } from '../readings/reading.js';
import { wornSides } from '../readings/worn-side.js';
import { inTapeLengths, read } from '../testing/sample-readings.js';
import { supports } from '../records/sheet.js';
import { soundSheet } from '../testing/sound-sheets.js';
import { sheetOf } from '../testing/test-check.js';
import { lengthUnits } from '../units/format-length.js';
import { add, type Length, lengthOf, mm } from '../units/length.js';
import { severities, severityLabels } from './finding.js';
import { checks, runChecks } from './registry.js';

const pages = new URL('../../../docs/measuring/checks/', import.meta.url);
const pageOf = (id: string): URL => new URL(`${id}.md`, pages);

describe.each(checks.map((check) => [check.id, check] as const))('the check %s', (id, check) => {
  it('has a page that names it, says what it looks for and quotes its wording', () => {
    expect(existsSync(pageOf(id))).toBe(true);
    const page = readFileSync(pageOf(id), 'utf8');
    expect(page.startsWith(`# ${check.title}\n`)).toBe(true);
    expect(page).toContain(`\`${id}\``);
    expect(page).toContain(check.about);
    for (const [message, wording] of Object.entries(check.messages)) {
      expect(page).toContain(`- ${severityLabels[check.severityOf(message)]}: ${wording}\n`);
    }
  });

  it('has a spec of its own', () => {
    expect(existsSync(new URL(`${id}.spec.ts`, import.meta.url))).toBe(true);
  });
});

describe('the registry of checks', () => {
  it('has each id once, and no page without a check', () => {
    const ids = checks.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(readdirSync(pages).sort()).toEqual(ids.map((id) => `${id}.md`).sort());
  });

  it('puts stops before questions and questions before notes', () => {
    const readings = { waist: 642, bust: 600, 'inner-waist-band': 660 };
    const order = runChecks(sheetOf({ readings })).map(({ severity }) => severities.indexOf(severity));
    expect(new Set(order).size).toBe(3);
    expect(order).toEqual([...order].sort((first, second) => first - second));
  });

  it('keeps a finding’s key while its figures stay, and changes it with them', () => {
    const keys = (...readings: readonly Reading[]): string[] =>
      runChecks(sheetOf({ readings }))
        .filter(({ checkId }) => checkId === 'waist-over-bust')
        .map(({ key }) => key);
    const [first] = keys(read('waist', 860), read('bust', 850));
    expect(first).toBe('waist-over-bust:larger:waist:bust:860:850');
    expect(keys(read('neck', 400), read('bust', 850), read('waist', 860))).toEqual([first]);
    expect(keys(read('waist', 861), read('bust', 850))).not.toEqual([first]);
  });
});

describe('a sound sheet', () => {
  it.each(kindIds)('of a %s raises nothing', (kind) => {
    const facts = { support: 'flat', tapeLength: mm(5000) } as const;
    expect(runChecks(sheetOf({ kind, readings: soundSheet(kind), facts }))).toEqual([]);
  });

  it('of any kind, varied by a twentieth and read twice, has no stop and at most three questions', () => {
    const variation = fc.array(fc.double({ min: -0.05, max: 0.05, noNaN: true }), {
      minLength: 30,
      maxLength: 30,
    });
    fc.assert(
      fc.property(fc.constantFrom(...kindIds), variation, fc.nat(3), (kind, factors, apart) => {
        let at = 0;
        const first = soundSheet(kind, (valueMm) => Math.round(valueMm * (1 + (factors[at++] ?? 0))));
        const second = first.map((reading) => ({
          ...reading,
          ...{ id: `${reading.id} again`, round: 2, length: add(reading.length, mm(apart)) },
        }));
        const facts = { support: 'flat-tissue', tapeLength: mm(5000) } as const;
        const sheet = sheetOf({ kind, readings: [...first, ...second], facts });
        const severityOfAll = runChecks(sheet).map(({ severity }) => severity);
        expect(severityOfAll.filter((severity) => severity === 'stop')).toEqual([]);
        expect(severityOfAll.filter((severity) => severity === 'question').length).toBeLessThanOrEqual(3);
      }),
    );
  });

  it('with a hem in tape lengths raises nothing', () => {
    const readings = soundSheet('skirt').map((reading) =>
      reading.pointId === 'hem' ? inTapeLengths('hem', 3, 742) : reading,
    );
    const facts = { support: 'flat', tapeLength: mm(1500) } as const;
    expect(runChecks(sheetOf({ kind: 'skirt', readings, facts }))).toEqual([]);
  });
});

describe('any sheet at all', () => {
  const pointId = fc.oneof(
    fc.constantFrom(...measuringPoints.map(({ id }) => id)),
    fc.constantFrom('__proto__', 'constructor', ''),
    // An id that itself looks like a figure left out of a sentence would be taken for one below.
    fc.string().filter((text) => !/[{}]|undefined|NaN/.test(text)),
  );
  // What a fault elsewhere could hand in: no length at all.
  const broken = fc.constantFrom(...([Number.NaN, Infinity, -Infinity, 0.5] as Length[]));
  const sound = fc.oneof(fc.maxSafeInteger(), fc.integer({ min: -10, max: 40_000_000 })).map(lengthOf);
  const length = fc.oneof({ weight: 9, arbitrary: sound }, { weight: 1, arbitrary: broken });
  const facts = { id: fc.uuid(), pointId, round: fc.oneof(fc.integer(), fc.double()), stands: fc.boolean() };
  const takenFacts = {
    ...facts,
    state: fc.constant('taken' as const),
    length,
    typed: fc.string(),
    unit: fc.constantFrom(...lengthUnits),
    tapeLengths: fc.record({ count: fc.oneof(fc.integer(), fc.double()), tape: length, rest: length }),
    method: fc.constantFrom('round' as const, 'flat-doubled' as const),
    gap: length,
    depthBelowWaist: length,
    worn: fc.constantFrom(...wornSides),
    levelFoundBy: fc.constantFrom('band' as const, 'stated' as const),
    note: fc.string(),
  };
  const taken = fc.record(takenFacts, {
    requiredKeys: ['id', 'pointId', 'round', 'state', 'length'],
  });
  const notTaken = fc.record(
    {
      ...facts,
      state: fc.constant('not-taken' as const),
      notTakenReason: fc.constantFrom(...notTakenReasonIds),
    },
    { requiredKeys: ['id', 'pointId', 'round', 'state'] },
  );
  const readings = fc.array<Reading>(fc.oneof(taken, notTaken), { maxLength: 40 });
  const kind = fc.constantFrom(...kindIds);
  const peers = fc.array(fc.record({ pointId, valuesMm: fc.array(fc.double(), { maxLength: 20 }) }));
  const besides = fc.record(
    { support: fc.constantFrom(...supports), tapeLength: length, peers },
    { requiredKeys: [] },
  );

  it('says the same whatever the order in which its readings came', () => {
    const key = fc.infiniteStream(fc.nat());
    const ordered = fc.array(taken, { maxLength: 20 }).map((list) =>
      // One reading stands for a point, a round and a side, as the house keeps them.
      [...new Map(list.map((one, index) => [index, { ...one, round: index + 1 }])).values()],
    );
    fc.assert(
      fc.property(kind, ordered, key, (own, list, keys) => {
        const shuffled = list
          .map((one) => ({ one, key: keys.next().value ?? 0 }))
          .sort((first, second) => first.key - second.key)
          .map(({ one }) => one);
        const keysOf = (readings: readonly Reading[]) =>
          new Set(
            runChecks({ kind: own, protocol: protocolFor(own), readings }).map((finding) => finding.key),
          );
        expect(keysOf(shuffled)).toEqual(keysOf(list));
      }),
    );
  });

  it('is checked without a throw, into whole sentences with keys of their own', () => {
    fc.assert(
      fc.property(
        kind,
        readings,
        kind,
        readings,
        besides,
        (own, ownReadings, other, otherReadings, facts) => {
          const findings = runChecks({
            kind: own,
            protocol: protocolFor(own),
            readings: ownReadings,
            otherPartsOfGarment: [{ kind: other, readings: otherReadings }],
            ...facts,
          });
          for (const { sentence } of findings) expect(sentence).toMatch(/[.?]$/);
          for (const { sentence } of findings) expect(sentence).not.toMatch(/\{\w+\}|undefined|NaN/);
          expect(new Set(findings.map(({ key }) => key)).size).toBe(findings.length);
        },
      ),
      { numRuns: 300 },
    );
  });
});
