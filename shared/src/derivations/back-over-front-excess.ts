import { derivation, difference } from './derivation.js';

/** Shows a train or the room for a bustle. It can help to date a skirt, and never dates one by itself. */
export const backOverFrontExcess = derivation({
  id: 'back-over-front-excess',
  label: 'Back longer than front by',
  formula: 'waist to hem, back − waist to hem, front',
  kinds: ['skirt', 'dress', 'petticoat'],
  needs: [['waist-to-hem-back'], ['waist-to-hem-front']],
  compute: difference,
});
