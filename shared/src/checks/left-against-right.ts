import { allowedSpreadAt } from '../points/tolerance.js';
import { absolute, isLonger, longestOf, subtract, times } from '../units/length.js';
import { sheetCheck } from './check.js';
import { type ReadPoint, readPoints } from './sheet-view.js';

/** A house setting: what hands cut and sewed may differ by five times what two readings may. */
const TIMES_THE_TOLERANCE = 5;

export const leftAgainstRight = sheetCheck({
  id: 'left-against-right',
  title: 'Left and right far apart',
  about: 'A point read on both sides whose left and right differ by more than cutting and wear usually make.',
  severity: 'question',
  messages: {
    apart: '{point} reads {left} at the left and {right} at the right, as worn, {apart} apart. Is it so?',
  },
  run: (sheet, raise) => {
    const points = readPoints(sheet);
    for (const left of points.filter(({ mention }) => mention.worn === 'left')) {
      const right = points.find(
        ({ point, mention }) => point.id === left.point.id && mention.worn === 'right',
      );
      if (!right) continue;
      const apart = absolute(subtract(left.accepted.value, right.accepted.value));
      if (!isLonger(apart, allowedBetween(left, right))) continue;
      const point = { mentioned: left.point.id };
      raise('apart', { point, left: left.accepted, right: right.accepted, apart });
    }
  },
});

function allowedBetween({ point, accepted }: ReadPoint, right: ReadPoint) {
  const longer = longestOf(accepted.value, right.accepted.value);
  return times(allowedSpreadAt(point, longer, accepted.tapeJoins), TIMES_THE_TOLERANCE);
}
