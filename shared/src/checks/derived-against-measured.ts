import { derive, type FormulaDerivation } from '../derivations/derivation.js';
import { neckToWaistBack } from '../derivations/neck-to-waist-back.js';
import { neckToWaistFront } from '../derivations/neck-to-waist-front.js';
import { rootOfSquares } from '../readings/uncertainty.js';
import { absolute, isLonger, mm, subtract } from '../units/length.js';
import { sheetCheck } from './check.js';

const derivedPoints: readonly FormulaDerivation[] = [neckToWaistFront, neckToWaistBack];

export const derivedAgainstMeasured = sheetCheck({
  id: 'derived-against-measured',
  title: 'Measured and worked out do not agree',
  about:
    'A point that was measured although it can be worked out, where the two differ by more than they may.',
  severity: 'question',
  messages: {
    differ: '{point} was read as {read}, but works out at {derived}, {apart} apart; {allowed} is allowed.',
  },
  run: ({ values }, raise) => {
    for (const derivation of derivedPoints) {
      const read = values.get(derivation.id);
      const figure = derive(derivation, values)?.figure;
      if (!read || figure?.type !== 'length') continue;
      const apart = absolute(subtract(read.value, figure.length));
      // Twice the standard uncertainty of the difference: some 95 in 100 sound pairs lie within it.
      const allowed = mm(Math.ceil(2 * rootOfSquares([read.uncertaintyMm, figure.uncertaintyMm])));
      if (!isLonger(apart, allowed)) continue;
      raise('differ', { point: { mentioned: derivation.id }, read, derived: figure.length, apart, allowed });
    }
  },
});
