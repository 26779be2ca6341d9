import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const cuffOverSleeveWidest = check({
  id: 'cuff-over-sleeve-widest',
  title: 'Cuff larger than the sleeve at its widest',
  about: 'A cuff that is larger round than the sleeve where it is said to be widest.',
  severity: 'question',
  needs: { cuff: ['cuff'], widest: ['sleeve-widest'] },
  messages: {
    larger: 'The cuff, {cuff}, is larger than the sleeve at its widest, {widest}. Was the sleeve doubled?',
  },
  run: ({ cuff, widest }, raise) => {
    if (isLonger(cuff.value, widest.value)) raise('larger', { cuff, widest });
  },
});
