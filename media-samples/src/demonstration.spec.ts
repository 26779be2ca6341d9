import { runChecks } from '@ellwand/shared/checks/registry';
import { viewSheet } from '@ellwand/shared/checks/sheet-view';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { protocolPointIds } from '@ellwand/shared/protocols/protocol';
import { protocolFaults } from '@ellwand/shared/protocols/protocol-rules';
import { readDate } from '@ellwand/shared/records/edtf-date';
import { GarmentRecord } from '@ellwand/shared/records/garment';
import { toProtocol } from '@ellwand/shared/records/protocol';
import { roles } from '@ellwand/shared/records/roles';
import { mm } from '@ellwand/shared/units/length';
import { describe, expect, it } from 'vitest';
import {
  checkSheetOf,
  garments,
  house,
  protocolOf,
  protocols,
  sheetsOf,
} from './testing/demonstration-records';

const parts = garments.flatMap((garment) =>
  sheetsOf(garment).map((part) => ({ name: `${garment.record.ownNumber}${part.suffix}`, garment, part })),
);
const findings = parts.flatMap(({ name, garment, part }) =>
  part.sheet.complete === false
    ? []
    : runChecks(checkSheetOf(garment, part)).map((finding) => ({ ...finding, name, part })),
);
const wordsOf = (text: string) => text.split(/\s+/).filter(Boolean);

describe('the house', () => {
  it('has somebody in every role, all at Larkmoor', () => {
    expect(house.museum).toBe('Larkmoor House Museum of Dress');
    expect(new Set(house.people.flatMap((person) => person.roles))).toEqual(new Set(roles));
    for (const { email } of house.people) expect(email).toMatch(/@larkmoor\.example$/);
  });
});

describe('the protocols', () => {
  it('have one later version, with a point of the house’s own, that may be made as it is', () => {
    expect(protocols.map(({ kind, version }) => `${kind} ${version}`)).toEqual(['skirt 2']);
    for (const protocol of protocols.map(toProtocol)) {
      expect(protocolFaults(protocol, [])).toEqual([]);
      expect(protocol.ownPoints).toHaveLength(1);
    }
  });

  it('are kept by their sheets: one was taken by the later version, the others by the first', () => {
    const later = parts.filter(({ part }) => protocolOf(part).version > 1);
    expect(later.map(({ name }) => name)).toEqual(['LH.1966.30.2']);
    expect(parts.filter(({ part }) => part.kind === 'skirt').length).toBeGreaterThan(3);
  });
});

describe('the garments together', () => {
  it('are twenty-four of many kinds, numbers their own', () => {
    expect(garments).toHaveLength(24);
    expect(new Set(garments.map(({ record }) => record.ownNumber)).size).toBe(24);
    expect(new Set(garments.map(({ record }) => record.kind)).size).toBeGreaterThanOrEqual(8);
  });

  it('show every stage, an open sheet, a return, a withdrawal and a draft beside a public version', () => {
    const stages = garments.map(({ stage }) => stage);
    expect(new Set(stages)).toEqual(new Set(['draft', 'in-review', 'approved', 'published', 'withdrawn']));
    expect(stages.filter((stage) => stage === 'published').length).toBeGreaterThan(12);
    expect(parts.filter(({ part }) => part.sheet.complete === false).map(({ name }) => name)).toEqual([
      'LH.1958.7',
    ]);
    const having = (key: 'returnReason' | 'withdrawal' | 'draftBeside') =>
      garments.filter((garment) => garment[key]).map(({ record }) => record.ownNumber);
    expect(having('returnReason')).toEqual(['LH.1995.8']);
    expect(having('withdrawal')).toEqual(['LH.1969.12']);
    expect(having('draftBeside')).toEqual(['LH.1971.3']);
  });

  it('show one skirt measured twice over the years, a dress laid together as worn, and a left beside its right', () => {
    const twice = garments.flatMap(({ parts: own }) =>
      own.filter(({ earlierSheets }) => earlierSheets?.length),
    );
    expect(twice.map(({ kind }) => kind)).toEqual(['skirt']);
    expect(parts.filter(({ part }) => part.wornTogether).map(({ name }) => name)).toEqual(['LH.1971.3 worn']);
    const sides = parts.filter(({ garment, part }) =>
      checkSheetOf(garment, part).readings.some(({ worn }) => worn === 'left'),
    );
    expect(sides.map(({ name }) => name)).toEqual(['LH.1966.30.2']);
  });

  it('let a search by waist find several, and leave more', () => {
    const waists = parts.flatMap(({ garment, part }) =>
      [...viewSheet(checkSheetOf(garment, part)).values.values()].filter(
        ({ pointId }) => findMeasuringPoint(pointId)?.group === 'waist',
      ),
    );
    const found = waists.filter(({ value }) => value >= mm(560) && value <= mm(620));
    expect(found.length).toBeGreaterThanOrEqual(6);
    expect(found.length).toBeLessThan(waists.length * 0.7);
  });

  it('raise two questions and one note, no more, and each question has its answer', () => {
    const seen = findings.map(({ name, severity, checkId }) => `${name} ${severity} ${checkId}`);
    expect(seen.sort()).toEqual([
      'LH.1962.8 question across-back-over-underarm-to-underarm',
      'LH.1983.5.1 note outside-soft-range',
      'LH.2004.9 question waist-over-bust',
    ]);
    for (const { severity, checkId, part } of findings.filter((finding) => finding.severity !== 'note')) {
      const answer = part.sheet.answers?.find((entry) => entry.checkId === checkId);
      expect(wordsOf(answer?.reason ?? '').length, severity).toBeGreaterThan(6);
    }
    const answers = parts.flatMap(({ part }) => part.sheet.answers ?? []);
    expect(answers).toHaveLength(2);
  });

  it('have descriptions that begin each in its own way', () => {
    const beginnings = garments.map(({ record }) =>
      wordsOf(record.description ?? '')
        .slice(0, 6)
        .join(' '),
    );
    expect(new Set(beginnings).size).toBe(garments.length);
  });
});

describe.each(garments.map((garment) => [garment.record.ownNumber, garment] as const))(
  '%s',
  (_number, garment) => {
    const { record, madeBy, approvedBy } = garment;

    it('is a record that the catalogue takes, with a date that can be read', () => {
      expect(GarmentRecord.safeParse(record).error).toBeUndefined();
      expect(readDate(record.date)).toBeDefined();
    });

    it('is described at a catalogue’s length, without dashes for breath', () => {
      const words = wordsOf(record.description ?? '').length;
      expect(words).toBeGreaterThanOrEqual(60);
      expect(words).toBeLessThanOrEqual(160);
      expect(JSON.stringify(record)).not.toMatch(/[—]/);
    });

    it('is approved by a curator who neither made nor measured it', () => {
      const hands = sheetsOf(garment).flatMap(({ sheet }) => [sheet.read, sheet.held, sheet.wrote]);
      const curator = house.people.find((person) => person.key === approvedBy);
      expect(curator?.roles).toContain('curator');
      expect([madeBy, ...hands]).not.toContain(approvedBy);
    });
  },
);

describe.each(parts.map((entry) => [entry.name, entry.part] as const))('the sheet of %s', (_name, part) => {
  const { sheet } = part;
  const asked: readonly string[] = protocolPointIds(protocolOf(part));

  it('follows its protocol, every point read or given a reason', () => {
    const taken = Object.keys(sheet.readings);
    const isOpen = sheet.complete === false;
    expect(taken).toEqual(isOpen ? asked.slice(0, taken.length) : asked);
    if (isOpen) expect(taken.length / asked.length).toBeCloseTo(0.5, 1);
  });

  it('was read by one of the house and held by another, or says why not', () => {
    const keys = house.people.map(({ key }) => key);
    for (const key of [sheet.read, sheet.wrote, sheet.held ?? sheet.read]) expect(keys).toContain(key);
    expect(sheet.held).not.toBe(sheet.read);
    if (sheet.held === null) expect(sheet.aloneBecause).toMatch(/\w+ \w+/);
  });

  it('says how the level of every bust, waist and hip was found', () => {
    const levelless = Object.entries(sheet.readings).filter(([pointId, entry]) => {
      const isTaken = typeof entry === 'string' || 'typed' in entry;
      const isSaid = typeof entry === 'object' && 'levelFoundBy' in entry;
      return isTaken && findMeasuringPoint(pointId)?.levelRecorded && !isSaid;
    });
    expect(levelless).toEqual([]);
  });

  it('keeps to whole millimetres, with tapes counted beyond one tape', () => {
    for (const [pointId, entry] of Object.entries(sheet.readings)) {
      if (typeof entry === 'object' && 'notTaken' in entry) continue;
      const { typed, tapeCount = 0, rounds = [] } = typeof entry === 'string' ? { typed: entry } : entry;
      for (const keyed of [typed, ...rounds]) {
        expect(keyed, pointId).toMatch(/^\d{1,4}$/);
        expect(Number(keyed), pointId).toBeLessThan(1500);
      }
      if (tapeCount > 0) expect(findMeasuringPoint(pointId)?.takesTapeLengths, pointId).toBe(true);
    }
  });
});
