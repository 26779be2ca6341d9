import { GarmentRecord } from '@ellwand/shared/records/garment';
import type { StoredReading } from '@ellwand/shared/records/sheet';
import type { Snapshot } from '../snapshot';
import { projectGarment } from './project-garment';
import { facetRows, measurementRows, searchText } from './search-rows';

const imprint = {
  number: 'lh-1949-11',
  version: 2,
  publishedAt: '2026-11-20T09:00:00.000Z',
  museum: 'Larkmoor House',
};
const reader = '0190a0a0-0000-7000-8000-000000000001';

function stored(pointId: string, valueMm: string, more: Partial<StoredReading> = {}): StoredReading {
  return {
    id: `0190a0a0-0000-7000-8000-${String(Math.abs(hash(pointId + valueMm)))
      .padStart(12, '0')
      .slice(-12)}`,
    pointId,
    round: 1,
    state: 'taken',
    valueMm,
    typed: valueMm,
    unit: 'mm',
    tapeCount: 0,
    tapeLengthMm: null,
    worn: null,
    gapTyped: null,
    gapMm: null,
    method: null,
    depthTyped: null,
    depthMm: null,
    heldBy: null,
    levelFoundBy: null,
    reason: null,
    replaces: null,
    stands: true,
    note: 'PRIVATE',
    readBy: reader,
    recordedBy: reader,
    device: 'tablet 1',
    keyedAt: imprint.publishedAt,
    receivedAt: imprint.publishedAt,
    ...more,
  };
}

const hash = (text: string) => [...text].reduce((sum, sign) => (sum * 31 + sign.charCodeAt(0)) | 0, 7);

function snapshotWith(readings: StoredReading[], record: Partial<GarmentRecord> = {}): Snapshot {
  return {
    garmentId: reader,
    record: GarmentRecord.parse({
      ownNumber: 'LH.1949.11',
      title: 'Skirt of violet faille',
      kind: 'skirt',
      date: '1858/1861',
      creditLine: 'Larkmoor House Museum of Dress',
      colours: ['violet', 'Violet'],
      ...record,
    }),
    parts: [
      {
        id: reader,
        suffix: '.2',
        kind: 'skirt',
        name: 'Skirt',
        sheet: {
          id: reader,
          protocolVersion: 1,
          measuredOn: '2026-11-20',
          support: 'Flat on the table',
          tape: 'Tape 3',
          tapeLengthMm: '1500',
          fasteningPair: 'upper hook and eye',
          people: [{ userId: reader, name: 'Odile Marsh', duty: 'read' }],
          readings,
        },
      },
    ],
    images: [],
    editedBy: [reader],
  };
}

describe('the public copy of a garment', () => {
  it('gives the mean of the rounds that stand, with their number and spread', () => {
    const readings = [
      stored('waistband', '612'),
      stored('waistband', '615', { round: 2 }),
      stored('waistband', '1612', { round: 3, stands: false }),
    ];
    const [waist] = projectGarment(snapshotWith(readings), imprint).parts[0]?.measurements ?? [];
    expect(waist).toMatchObject({ pointId: 'waistband', valueMm: '613.5', rounds: 2, spreadMm: '3' });
  });

  it('tells how a hem was read in tape lengths', () => {
    const hem = stored('hem', '5242', { tapeCount: 3, tapeLengthMm: '1500', typed: '742' });
    const [shown] = projectGarment(snapshotWith([hem]), imprint).parts[0]?.measurements ?? [];
    expect(shown).toMatchObject({
      valueMm: '5242',
      tapeLengths: { count: 3, tapeMm: '1500', restMm: '742' },
    });
  });

  it('gives the reason where a point was not taken, and no reason where a later round was', () => {
    const left = {
      state: 'not-taken',
      valueMm: null,
      typed: null,
      unit: null,
      reason: 'too-fragile',
    } as const;
    const readings = [
      stored('hip', '0', left),
      stored('waistband', '0', left),
      stored('waistband', '612', { round: 2 }),
    ];
    const part = projectGarment(snapshotWith(readings), imprint).parts[0];
    expect(part?.notTaken).toEqual([{ pointId: 'hip', label: 'Hip', worn: null, reason: 'too-fragile' }]);
    expect(part?.measurements.map((each) => each.pointId)).toEqual(['waistband']);
  });

  it('gives each side its own measurement, the one that speaks first, and is searched by that one alone', () => {
    const readings = [
      stored('waist-to-hem-side', '1041', { worn: 'left' }),
      stored('waist-to-hem-side', '1044', { worn: 'left', round: 2 }),
      stored('waist-to-hem-side', '1030', { worn: 'right' }),
    ];
    const copy = projectGarment(snapshotWith(readings), imprint);
    const shown = copy.parts[0]?.measurements.map(({ worn, valueMm, rounds }) => [worn, valueMm, rounds]);
    // Never 1038.3 mm, the mean of a left and a right that nobody has: each side's rounds by themselves.
    expect(shown).toEqual([
      ['right', '1030', 1],
      ['left', '1042.5', 2],
    ]);
    expect(measurementRows(copy).map(({ pointId, valueMm }) => [pointId, valueMm])).toEqual([
      ['waist-to-hem-side', '1030'],
    ]);
  });

  it('says of which side a point could not be taken, and why, beside the other side’s figure', () => {
    const left = { state: 'not-taken', valueMm: null, typed: null, unit: null } as const;
    const readings = [
      stored('waist-to-hem-side', '0', { ...left, worn: 'left', reason: 'too-fragile' }),
      stored('waist-to-hem-side', '1030', { worn: 'right' }),
    ];
    const part = projectGarment(snapshotWith(readings), imprint).parts[0];
    expect(part?.measurements.map(({ worn }) => worn)).toEqual(['right']);
    expect(part?.notTaken.map(({ worn, reason }) => [worn, reason])).toEqual([['left', 'too-fragile']]);
  });

  it('tells a gap, another method with its half, and the depth at which a level lay', () => {
    const readings = [
      stored('waistband', '592', { gapMm: '28', gapTyped: '28' }),
      stored('hip', '984', { method: 'flat-doubled', typed: '492', depthMm: '200', depthTyped: '200' }),
    ];
    const part = projectGarment(snapshotWith(readings), imprint).parts[0];
    const told = part?.measurements.map(({ pointId, method, halfMm, gapMm, depthMm }) => ({
      pointId,
      method,
      halfMm,
      gapMm,
      depthMm,
    }));
    expect(told).toEqual([
      { pointId: 'waistband', method: null, halfMm: null, gapMm: '28', depthMm: null },
      { pointId: 'hip', method: 'flat-doubled', halfMm: '492', gapMm: null, depthMm: '200' },
    ]);
  });

  it('names the people only where the record says so, and counts them always', () => {
    const quiet = projectGarment(snapshotWith([stored('waistband', '612')]), imprint).parts[0];
    expect(quiet).toMatchObject({ measuredBy: [], peopleCount: 1 });
    const open = projectGarment(snapshotWith([stored('waistband', '612')], { showPeople: true }), imprint)
      .parts[0];
    expect(open?.measuredBy).toEqual(['Odile Marsh']);
  });

  it('works out what lies between two parts, and does not tell a half twice', () => {
    const snapshot = snapshotWith([stored('waistband', '640')]);
    const [skirt] = snapshot.parts;
    if (!skirt?.sheet) throw new Error('the skirt has no sheet');
    const sheet = { ...skirt.sheet, readings: [stored('waist', '630'), stored('elbow', '320')] };
    const bodice = { ...skirt, id: sheet.id + '-bodice', kind: 'bodice', name: 'Bodice', sheet } as const;
    const { parts } = projectGarment({ ...snapshot, parts: [bodice, skirt] }, imprint);
    const derived = parts.map((part) => part.derived.map(({ id, worked }) => [id, worked]));
    const ease = ['ease-between-layers', '630 mm − 640 mm = −10 mm'];
    expect(derived).toEqual([
      [['smallest-girth', 'smallest of 630 mm, 640 mm = 630 mm: Waist'], ease],
      [['smallest-girth', 'smallest of 640 mm, 630 mm = 630 mm: Waist, bodice'], ease],
    ]);
  });

  it('carries no private word', () => {
    const secrets = { storeLocation: 'PRIVATE', provenance: 'PRIVATE', handling: 'PRIVATE' };
    const copy = JSON.stringify(projectGarment(snapshotWith([stored('waistband', '612')], secrets), imprint));
    expect(copy).not.toContain('PRIVATE');
    expect(copy).not.toContain(reader);
  });

  it('is found in every decade that its date touches, and once in each colour', () => {
    const rows = facetRows(projectGarment(snapshotWith([]), imprint));
    expect(rows.filter((row) => row.facet === 'decade').map((row) => row.label)).toEqual(['1850s', '1860s']);
    expect(rows.filter((row) => row.facet === 'colour')).toHaveLength(1);
    expect(searchText(projectGarment(snapshotWith([]), imprint))).toContain('violet faille');
  });
});
