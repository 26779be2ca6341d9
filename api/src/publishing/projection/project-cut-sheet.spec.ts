import type { Image } from '@ellwand/shared/records/image';
import { cutSheet, piece } from '@ellwand/shared/testing/sample-cut-sheets';
import { mm } from '@ellwand/shared/units/length';
import { projectCutSheet } from './project-cut-sheet';

const drawing = '0190a0a0-0000-7000-8000-0000000000aa';

/** A scan of 4000 × 3000 pixels, whose largest form is 2000 wide. */
const scan: Image = {
  id: drawing,
  garmentId: '0190a0a0-0000-7000-8000-000000000001',
  version: 1,
  position: 0,
  view: 'pattern',
  alt: 'A bodice drawn in pencil.',
  caption: '',
  credit: '',
  hidden: false,
  fileName: 'pattern.jpg',
  state: 'ready',
  formsMade: 1,
  formsWanted: 1,
  refusal: null,
  widthPx: 4000,
  heightPx: 3000,
  widths: [320, 2000],
  pointId: null,
  takenOn: null,
  createdAt: '2026-11-20T09:00:00.000Z',
};

const at = (x: number, y: number) => ({ x, y });
const drawn = cutSheet({
  innerNote: 'PRIVATE',
  pattern: {
    imageId: drawing,
    marks: { from: at(0, 0), to: at(1600, 0) },
    distance: { typed: '400', unit: 'mm' },
    onPaper: { typed: '100', unit: 'mm' },
    pairs: [{ key: 'p1', name: 'Side seam', from: at(100, 100), to: at(100, 900) }],
  },
});

describe('the public copy of a cut sheet', () => {
  it('reads the pairs of marks by the scale, no finer than the form they were set on', () => {
    const pattern = projectCutSheet(drawn, [], [scan])?.pattern;
    expect(pattern).toMatchObject({ imageId: drawing, distanceMm: '400', drawnTo: '1:4' });
    // 800 px at 4 px a millimetre; two marks of two pixels each are 0.41 mm, and the distance's own millimetre halves.
    expect(pattern?.pairs).toEqual([{ name: 'Side seam', valueMm: '200', uncertaintyMm: '0.7' }]);
  });

  it('says nothing of a pattern whose picture is not public', () => {
    expect(projectCutSheet(drawn, [], [])).toBeNull();
    const withPieces = { ...drawn, pieces: cutSheet({ pieces: [piece('Front')] }).pieces };
    const shown = projectCutSheet(withPieces, [], []);
    expect(shown?.pattern).toBeNull();
    expect(JSON.stringify(shown)).not.toContain(drawing);
  });

  it('leaves out the inner note, and is nothing where that is all there is', () => {
    expect(JSON.stringify(projectCutSheet(drawn, [], [scan]))).not.toContain('PRIVATE');
    expect(projectCutSheet(cutSheet({ innerNote: 'PRIVATE' }), [], [])).toBeNull();
    expect(projectCutSheet(undefined, [], [])).toBeNull();
  });

  it('gives a sum with the round it was held against, and none while a panel is missing', () => {
    const sheet = cutSheet({
      pieces: [
        piece('Front', { count: 2, widths: { bust: '250', waist: '150' } }),
        piece('Back', { widths: { waist: '312' } }),
      ],
    });
    const rounds = [{ level: 'waist', label: 'Waist', value: mm(606) }] as const;
    expect(projectCutSheet(sheet, rounds, [])?.sums).toEqual([
      {
        level: 'waist',
        panels: 3,
        sumMm: '612',
        uncertaintyMm: '3.2',
        read: { label: 'Waist', valueMm: '606' },
      },
    ]);
  });
});
