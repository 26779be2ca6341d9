import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const hemShorterThanWaist = check({
  id: 'hem-shorter-than-waist',
  title: 'Hem shorter than the waist',
  about: 'A skirt whose hem is shorter round than its waist; even the narrowest hobble skirt is wider.',
  severity: 'stop',
  needs: { hem: ['hem'], waist: ['waistband', 'waist', 'child-waist'] },
  messages: {
    shorter: 'The hem, {hem}, is shorter round than the waist, {waist}. Were the tape lengths counted?',
  },
  run: ({ hem, waist }, raise) => {
    if (isLonger(waist.value, hem.value)) raise('shorter', { hem, waist });
  },
});
