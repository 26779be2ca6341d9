import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { emptyCutSheet, isEmptyCutSheet, keptCutSheet, keptLength } from '../cut-sheet/keep-lengths.js';
import { cutSheet, piece, typedCutSheet } from '../testing/sample-cut-sheets.js';
import { CutSheetBody, NewCutSheet } from './cut-sheet.js';

const problems = (sheet: unknown) =>
  NewCutSheet.safeParse(sheet).error?.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);

describe('a cut sheet', () => {
  it('keeps what was typed, the unit that was meant, and the exact millimetres', () => {
    expect(keptLength({ typed: '24 3/8', unit: 'in' })).toEqual({
      typed: '24 3/8',
      unit: 'in',
      mm: '619.125',
    });
    expect(keptLength({ typed: '7 1/16 in', unit: 'mm' })).toEqual({
      typed: '7 1/16 in',
      unit: 'in',
      mm: '179.3875',
    });
    expect(keptLength({ typed: '61,5', unit: 'cm' })).toEqual({ typed: '61,5', unit: 'cm', mm: '615' });
  });

  it('tells a blank from nothing: a gore of no width at the waist is 0, one not measured there is null', () => {
    const [gore] = cutSheet({ pieces: [piece('Gore', { widths: { waist: '0', hem: '220' } })] }).pieces;
    expect(gore?.widths.waist).toEqual({ typed: '0', unit: 'mm', mm: '0' });
    expect(gore?.widths.hip).toBeNull();
  });

  it('says at the box itself what cannot be kept there', () => {
    const sheet = typedCutSheet({
      pieces: [{ ...piece('Front'), widths: { waist: { typed: '7 5/3', unit: 'in' } }, count: 0 }],
      neck: { frontDepth: { typed: '-4', unit: 'mm' } },
    });
    expect(problems(sheet)).toEqual([
      'pieces.0.count: At least 1',
      'pieces.0.widths.waist: “7 5/3” cannot be kept: a fraction smaller than one, such as 3/8 is wanted.',
      'neck.frontDepth: “-4” cannot be kept: a length of 0 or more is wanted.',
    ]);
  });

  it('lets a dart lie in no piece but its own', () => {
    const darts = [{ key: 'd1', piece: 'front', count: 1 }];
    expect(problems(typedCutSheet({ pieces: [piece('Front')], darts }))).toBeUndefined();
    expect(problems(typedCutSheet({ pieces: [piece('Back')], darts }))).toEqual([
      'darts.0.piece: Choose one of the pieces above',
    ]);
  });

  it('holds no two rows of one key', () => {
    expect(problems(typedCutSheet({ pieces: [piece('Front'), piece('Front')] }))).toEqual([
      'pieces.1.key: Another row has this key already',
    ]);
  });

  it('takes no field that it does not know', () => {
    expect(problems({ ...typedCutSheet(), grain: 'straight' })).toHaveLength(1);
    expect(problems(typedCutSheet({ pieces: [{ ...piece('Front'), worth: 3 } as never] }))).toHaveLength(1);
  });

  it('is empty until somebody says something, whatever the unit of its boxes', () => {
    expect(isEmptyCutSheet(emptyCutSheet)).toBe(true);
    expect(isEmptyCutSheet(cutSheet({ unit: 'in' }))).toBe(true);
    expect(isEmptyCutSheet(cutSheet({ innerNote: 'Ask about the hem.' }))).toBe(false);
    expect(isEmptyCutSheet(cutSheet({ neck: { backWidth: { typed: '0', unit: 'mm' } } }))).toBe(false);
  });

  it('comes back from being kept as it went', () => {
    const typed = fc.oneof(
      fc.integer({ min: 0, max: 9000 }).map((whole) => ({ typed: String(whole), unit: 'mm' as const })),
      fc.integer({ min: 0, max: 300 }).map((whole) => ({ typed: `${whole} 3/16`, unit: 'in' as const })),
      fc.integer({ min: 0, max: 900 }).map((whole) => ({ typed: `${whole},5`, unit: 'cm' as const })),
    );
    const lengths = fc.option(typed, { nil: null });
    fc.assert(
      fc.property(fc.record({ bust: lengths, waist: lengths, hip: lengths, hem: lengths }), (widths) => {
        const sheet = NewCutSheet.parse(typedCutSheet({ pieces: [{ ...piece('Front'), widths }] }));
        const kept = CutSheetBody.parse(JSON.parse(JSON.stringify(keptCutSheet(sheet))));
        expect(kept.pieces[0]?.widths).toMatchObject(widths);
        expect({ ...kept, pieces: [] }).toEqual({ ...keptCutSheet(sheet), pieces: [] });
      }),
    );
  });
});
