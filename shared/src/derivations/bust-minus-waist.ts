import { derivation, difference } from './derivation.js';

export const bustMinusWaist = derivation({
  id: 'bust-minus-waist',
  label: 'Bust more than waist by',
  formula: 'bust or chest − waist',
  kinds: ['bodice', 'dress', 'jacket', 'coat', 'waistcoat'],
  needs: [
    ['bust', 'coat-chest', 'waistcoat-chest'],
    ['waist', 'coat-waist'],
  ],
  compute: difference,
});
