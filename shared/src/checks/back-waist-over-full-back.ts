import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const backWaistOverFullBack = check({
  id: 'back-waist-over-full-back',
  title: 'Back waist longer than the full back',
  about: 'A coat whose waist lies below its own hem.',
  severity: 'stop',
  needs: { waist: ['coat-back-waist'], full: ['coat-full-back'] },
  messages: {
    longer: 'The back waist, {waist}, is longer than the full back, {full}. Were the two exchanged?',
  },
  run: ({ waist, full }, raise) => {
    if (isLonger(waist.value, full.value)) raise('longer', { waist, full });
  },
});
