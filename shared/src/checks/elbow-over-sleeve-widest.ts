import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const elbowOverSleeveWidest = check({
  id: 'elbow-over-sleeve-widest',
  title: 'Elbow larger than the sleeve at its widest',
  about: 'A sleeve that is larger at the elbow than where it is said to be widest.',
  severity: 'question',
  needs: { elbow: ['elbow'], widest: ['sleeve-widest'] },
  messages: {
    larger: 'The elbow, {elbow}, is larger than the sleeve at its widest, {widest}. Were both doubled?',
  },
  run: ({ elbow, widest }, raise) => {
    if (isLonger(elbow.value, widest.value)) raise('larger', { elbow, widest });
  },
});
