import { derivation, quotient } from './derivation.js';

/**
 * How much sleeve is drawn into its seam: the widest of the sleeve in armscyes. Not the upper arm, which is no measuring
 * point and lies wherever the fashion of the year puts the fullness; the armscye is a seam and can be found again.
 */
export const sleeveFullness = derivation({
  id: 'sleeve-fullness',
  label: 'Sleeve fullness',
  formula: 'sleeve at its widest ÷ armscye',
  kinds: ['bodice', 'dress', 'jacket'],
  needs: [['sleeve-widest'], ['armscye']],
  compute: quotient,
});
