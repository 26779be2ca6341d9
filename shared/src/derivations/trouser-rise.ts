import { derivation, difference } from './derivation.js';

export const trouserRise = derivation({
  id: 'trouser-rise',
  label: 'Rise',
  formula: 'outside leg − inside leg',
  kinds: ['trousers', 'breeches'],
  needs: [['outside-leg'], ['inside-leg']],
  compute: difference,
});
