import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { pointRepeatability, type Repeated } from '@ellwand/shared/repeatability/point-repeatability';
import { RepeatabilityQuery } from '@ellwand/shared/records/repeatability';
import { read } from './refuse.js';
import { json, type Routes } from './router.js';

const readBy = (readers: string, ...valuesMm: readonly number[]): Repeated =>
  valuesMm.map((valueMm, index) => ({ valueMm, reader: readers.charAt(index % readers.length) }));

/** What was read again at Larkmoor House: waists of ten study pieces, a few hems, one cuff. */
export const sampleRepeated: ReadonlyMap<string, readonly Repeated[]> = new Map([
  [
    'waist',
    [
      [612, 610],
      [588, 590],
      [655, 655],
      [701, 698],
      [634, 636],
      [597, 597],
      [622, 620],
      [680, 682],
      [645, 645],
      [610, 613],
    ].map((valuesMm) => readBy('ab', ...valuesMm)),
  ],
  ['hem', [readBy('ab', 5242, 5251, 5238), readBy('aa', 3318, 3314), readBy('ab', 2908, 2912)]],
  ['cuff', [readBy('aa', 228, 229)]],
]);

export const repeatabilityRoutes: Routes = {
  'GET /workroom/repeatability': ({ house, query }) => {
    const { from } = read(RepeatabilityQuery, Object.fromEntries(query));
    const points = [...house.repeated].map(([pointId, measured]) => ({
      pointId,
      label: findMeasuringPoint(pointId)?.name ?? pointId,
      ...pointRepeatability(measured),
    }));
    return json({ from, points: from === 'record' ? points.slice(1) : points, more: false });
  },
};
