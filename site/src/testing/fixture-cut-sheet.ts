import { PublishedCutSheet } from '@ellwand/shared/records/cut-sheet';

/** How the bodice of the fixtures is cut. */
export const bodiceCutSheet = PublishedCutSheet.parse({
  pieces: [
    {
      key: 'front',
      name: 'Front',
      count: 2,
      grain: 'straight',
      widths: { bust: '218', waist: '148' },
    },
    {
      key: 'back',
      name: 'Back',
      count: 1,
      onFold: true,
      grain: 'straight',
      widths: { bust: '436', waist: '316' },
    },
  ],
  darts: [
    {
      key: 'd1',
      piece: 'front',
      count: 2,
      where: 'under the bust',
      fromCentre: '58',
      tip: '142',
      length: '150',
      intake: '36',
    },
  ],
  neck: { frontWidth: '62', frontDepth: '78', backWidth: '60', backDepth: '18' },
  underarm: { belowNeckPoint: null, aboveWaist: '192' },
  fullness: [],
  bones: [{ key: 'b1', where: 'side seam', count: 2, length: '164', material: 'whalebone, as seen' }],
  seams: [{ key: 's1', where: 'side seam', allowance: '22', stitching: 'hand-back', stitchesPer10Mm: '5' }],
  note: 'The stripes meet in points down the centre back.',
  sums: [
    {
      level: 'bust',
      panels: 3,
      sumMm: '872',
      uncertaintyMm: '3.2',
      read: { label: 'Bust or chest', valueMm: '870' },
    },
    {
      level: 'waist',
      panels: 3,
      sumMm: '612',
      uncertaintyMm: '3.2',
      read: { label: 'Waist', valueMm: '612' },
    },
  ],
  pattern: null,
});
