import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const corsetWaistOverBottom = check({
  id: 'corset-waist-over-bottom',
  title: 'Corset waist larger than its bottom edge',
  about: 'A corset whose closed waist is larger round than its bottom edge.',
  severity: 'question',
  needs: { waist: ['corset-waist-closed'], bottom: ['corset-bottom'] },
  messages: {
    larger:
      'The closed waist of the corset, {waist}, is larger than its bottom edge, {bottom}. Were the two exchanged?',
  },
  run: ({ waist, bottom }, raise) => {
    if (isLonger(waist.value, bottom.value)) raise('larger', { waist, bottom });
  },
});
