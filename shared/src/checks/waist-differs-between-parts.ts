import type { GarmentKind } from '../points/kinds.js';
import type { PointId } from '../points/measuring-points.js';
import type { AcceptedValue } from '../readings/accepted-value.js';
import { absolute, isLonger, mm, subtract } from '../units/length.js';
import { sheetCheck } from './check.js';
import type { SheetView } from './sheet-view.js';

/** A bodice worn over the band is some centimetres larger, and one worn under it smaller. A house setting. */
const ALLOWED = mm(60);

const partners: Partial<Readonly<Record<GarmentKind, GarmentKind>>> = { bodice: 'skirt', skirt: 'bodice' };

const waists: readonly PointId[] = ['inner-waist-band', 'waist', 'waistband'];

function waistOf(values: SheetView['values']): AcceptedValue | undefined {
  return waists.map((pointId) => values.get(pointId)).find((accepted) => accepted !== undefined);
}

export const waistDiffersBetweenParts = sheetCheck({
  id: 'waist-differs-between-parts',
  title: 'Waists of the parts differ',
  about: 'A bodice and a skirt of one dress whose waists lie far apart.',
  severity: 'note',
  messages: {
    differ:
      'The {point} reads {waist}, the {other} of the other part {otherWaist}, {apart} apart. Do the parts belong together, and which was worn over which?',
  },
  run: ({ kind, values, otherParts }, raise) => {
    const partner = partners[kind];
    const waist = waistOf(values);
    if (!partner || !waist) return;
    for (const part of otherParts) {
      const otherWaist = part.kind === partner ? waistOf(part.values) : undefined;
      if (!otherWaist) continue;
      const apart = absolute(subtract(waist.value, otherWaist.value));
      if (!isLonger(apart, ALLOWED)) continue;
      const names = { point: { mentioned: waist.pointId }, other: { mentioned: otherWaist.pointId } };
      raise('differ', { ...names, waist, otherWaist, apart });
    }
  },
});
