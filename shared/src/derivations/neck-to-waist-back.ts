import { derivation, difference } from './derivation.js';

/** Not measured where it follows: each reading spared is handling spared. */
export const neckToWaistBack = derivation({
  id: 'neck-to-waist-back',
  label: 'Neck to waist, back',
  formula: 'neck to hem, back − waist to hem, back',
  kinds: ['bodice', 'dress'],
  needs: [['neck-to-hem-back'], ['waist-to-hem-back']],
  compute: difference,
});
