import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const sleeveUnderOverOuter = check({
  id: 'sleeve-under-over-outer',
  title: 'Sleeve longer beneath than outside',
  about: 'A sleeve whose under length is more than its outer length.',
  severity: 'question',
  needs: { under: ['sleeve-under'], outer: ['sleeve-outer'] },
  messages: {
    longer: 'The sleeve reads {under} beneath and {outer} outside. Were the two exchanged?',
  },
  run: ({ under, outer }, raise) => {
    if (isLonger(under.value, outer.value)) raise('longer', { under, outer });
  },
});
