import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { toMm } from '../units/length.js';
import type { PartSheets, SheetOfPart, SheetValue } from './part-sheets.js';
import { sheetRows } from './sheet-differences.js';

const id = (number: number) => `0190a0a0-0000-7000-8000-${String(number).padStart(12, '0')}`;

function sheet(
  number: number,
  values: readonly Partial<SheetValue>[],
  more: Partial<SheetOfPart> = {},
): SheetOfPart {
  return {
    id: id(number),
    state: 'complete',
    purpose: 'record',
    measuredOn: `20${20 + number}-05-02`,
    protocolVersion: 1,
    people: [],
    note: '',
    remarks: [],
    values: values.map((value) => ({
      pointId: 'waist',
      worn: null,
      valueMm: '612',
      uncertaintyMm: '1.2',
      rounds: 1,
      tapeJoins: 0,
      method: null,
      ...value,
    })),
    notTaken: [],
    ...more,
  };
}

const points: PartSheets['points'] = [
  { pointId: 'waist', label: 'Waist', how: 'round' },
  { pointId: 'sleeve-outer', label: 'Sleeve, outer', how: 'curve' },
  { pointId: 'elbow', label: 'Elbow', how: 'flat-doubled' },
  { pointId: 'hem', label: 'Hem', how: 'curve' },
];

const changes = (sheets: readonly SheetOfPart[], pointId = 'waist') =>
  sheetRows({ points, sheets: [...sheets] })
    .filter((row) => row.pointId === pointId)
    .map(({ cells }) => cells.map(({ change }) => (change === null ? null : toMm(change))));

// House tolerances (docs/measuring/points.md): 3 mm, 5 mm above a metre, 2 mm more for each join of tapes; common
// practice without a published source.
describe('sheets over the years', () => {
  it('tell of a change beyond the point’s tolerance, not of what two careful readings differ by', () => {
    const of = (...valuesMm: string[]) =>
      changes(valuesMm.map((valueMm, index) => sheet(index, [{ valueMm }])));
    expect(of('612', '615', '607')).toEqual([[null, null, -8]]);
    expect(of('1012', '1017', '1023')).toEqual([[null, null, 6]]);
  });

  it('allow two millimetres more for each join of tapes, and twice as much where a half is doubled', () => {
    const hem = (valueMm: string, number: number) =>
      sheet(number, [{ pointId: 'hem', valueMm, tapeJoins: 3 }]);
    expect(changes([hem('5242', 0), hem('5253', 1), hem('5265', 2)], 'hem')).toEqual([[null, null, 12]]);
    const elbow = (valueMm: string, number: number) => sheet(number, [{ pointId: 'elbow', valueMm }]);
    expect(changes([elbow('302', 0), elbow('308', 1), elbow('315', 2)], 'elbow')).toEqual([[null, null, 7]]);
  });

  it('hold a value against the last sheet that has one, and each side against the same side', () => {
    const waist = [sheet(0, [{ valueMm: '612' }]), sheet(1, []), sheet(2, [{ valueMm: '600' }])];
    expect(changes(waist)).toEqual([[null, null, -12]]);
    const sleeves = (number: number, left: string, right: string) =>
      sheet(number, [
        { pointId: 'sleeve-outer', worn: 'right', valueMm: right },
        { pointId: 'sleeve-outer', worn: 'left', valueMm: left },
      ]);
    expect(changes([sleeves(0, '580', '592'), sleeves(1, '580', '584')], 'sleeve-outer')).toEqual([
      [null, -8],
      [null, null],
    ]);
  });

  it('keep a row for what could not be taken, and none for what no sheet speaks of', () => {
    const left = { pointId: 'elbow', worn: null, reason: 'too-fragile' } as const;
    const rows = sheetRows({ points, sheets: [sheet(0, [{}]), sheet(1, [], { notTaken: [left] })] });
    expect(rows.map(({ pointId, cells }) => [pointId, cells.map(({ notTaken }) => notTaken)])).toEqual([
      ['waist', [null, null]],
      ['elbow', [null, 'too-fragile']],
    ]);
  });

  it('find no change between sheets that read the same, however many', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 9000 }), fc.integer({ min: 1, max: 6 }), (value, count) => {
        const same = Array.from({ length: count }, (_, index) => sheet(index, [{ valueMm: String(value) }]));
        expect(changes(same)).toEqual([Array(count).fill(null)]);
      }),
    );
  });
});
