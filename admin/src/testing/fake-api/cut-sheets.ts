import { keptCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import { type CutSheet, NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { idOf } from './people.js';

const mm = (typed: string) => ({ typed, unit: 'mm' as const });

/** The bodice of the first garment: panels that agree with its waist and do not reach its bust. */
const body = NewCutSheet.parse({
  pieces: [
    {
      key: 'front',
      name: 'Front',
      count: 2,
      grain: 'straight',
      layer: 'outside-and-lining',
      widths: { bust: mm('172'), waist: mm('116') },
      note: 'To the fastening line; 22 mm of button stand beyond it.',
    },
    {
      key: 'side-front',
      name: 'Side front',
      count: 2,
      grain: 'straight',
      layer: 'outside-and-lining',
      widths: { bust: mm('82'), waist: mm('64') },
    },
    {
      key: 'side-back',
      name: 'Side back',
      count: 2,
      grain: 'bias',
      layer: 'outside-and-lining',
      widths: { bust: mm('96'), waist: mm('72') },
    },
    {
      key: 'back',
      name: 'Back',
      count: 2,
      grain: 'straight',
      layer: 'outside-and-lining',
      widths: { bust: mm('82'), waist: mm('54') },
    },
    { key: 'collar', name: 'Collar', count: 1, onFold: true, grain: 'cross', widths: {} },
  ],
  darts: [
    {
      key: 'dart',
      piece: 'front',
      where: 'nearer the front edge',
      count: 2,
      fromCentre: mm('58'),
      tip: mm('128'),
      length: mm('196'),
      intake: { typed: '1 1/4', unit: 'in' },
    },
  ],
  neck: { frontWidth: mm('134'), frontDepth: mm('72'), backDepth: mm('18') },
  underarm: { belowNeckPoint: mm('212'), aboveWaist: mm('192') },
  fullness: [
    {
      key: 'postilion',
      where: 'Postilion at centre back',
      kind: 'box',
      count: 2,
      depth: mm('24'),
      direction: 'to-centre-back',
    },
  ],
  bones: [
    {
      key: 'darts',
      where: 'Each dart',
      count: 4,
      length: mm('162'),
      material: 'baleen, at a worn end',
      position: 'from the point to 20 mm below the tip',
    },
  ],
  seams: [
    {
      key: 'side',
      where: 'Side seams',
      allowance: mm('24'),
      stitching: 'machine-lock',
      stitchesPer10Mm: '5',
      edge: 'overcast',
    },
  ],
  note: 'The lining is cut with the outside and pinked below the waist.',
  innerNote: 'Ask whether the side seams were let out.',
  pattern: {
    imageId: idOf(500),
    marks: { from: { x: 300, y: 2500 }, to: { x: 1900, y: 2500 } },
    distance: mm('400'),
    onPaper: mm('100'),
    pairs: [{ key: 'p1', name: 'Front edge', from: { x: 800, y: 700 }, to: { x: 940, y: 2310 } }],
  },
});

export const bodiceCutSheet: CutSheet = {
  partId: idOf(1000),
  version: 4,
  body: keptCutSheet(body),
  rounds: [],
  updatedAt: '2026-12-01T11:20:00.000Z',
  updatedBy: 'Corin Vale',
};
