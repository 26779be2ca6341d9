import { derivation, quotient } from './derivation.js';

/** How full the skirt is: the hem in waists. */
export const hemToWaistRatio = derivation({
  id: 'hem-to-waist-ratio',
  label: 'Hem to waist',
  formula: 'hem ÷ waist',
  kinds: ['skirt', 'dress', 'petticoat', 'child-dress'],
  needs: [['hem'], ['waistband', 'waist', 'child-waist']],
  compute: quotient,
});
