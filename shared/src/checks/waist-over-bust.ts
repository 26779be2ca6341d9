import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const waistOverBust = check({
  id: 'waist-over-bust',
  title: 'Waist larger than bust or chest',
  about: 'A waist that is larger than the bust or chest of the same part, both fastened.',
  severity: 'question',
  needs: {
    waist: ['waist', 'coat-waist', 'corset-waist-closed'],
    bust: ['bust', 'coat-chest', 'waistcoat-chest', 'corset-top'],
  },
  messages: {
    larger: 'With everything fastened the waist, {waist}, is larger than the bust or chest, {bust}.',
  },
  run: ({ waist, bust }, raise) => {
    if (isLonger(waist.value, bust.value)) raise('larger', { waist, bust });
  },
});
