import { derivation, difference } from './derivation.js';

export const neckToWaistFront = derivation({
  id: 'neck-to-waist-front',
  label: 'Neck to waist, front',
  formula: 'neck to hem, front − waist to hem, front',
  kinds: ['bodice', 'dress'],
  needs: [['neck-to-hem-front'], ['waist-to-hem-front']],
  compute: difference,
});
