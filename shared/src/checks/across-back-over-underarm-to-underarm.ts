import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const acrossBackOverUnderarmToUnderarm = check({
  id: 'across-back-over-underarm-to-underarm',
  title: 'Across the back more than underarm to underarm',
  about: 'A back that is wider between the sleeve seams than between the underarms.',
  severity: 'question',
  needs: { back: ['across-back'], underarm: ['underarm-to-underarm-back'] },
  messages: {
    wider:
      'Across the back, {back}, is more than underarm to underarm, {underarm}. Dropped shoulders or side seams set to the back would explain it.',
  },
  run: ({ back, underarm }, raise) => {
    if (isLonger(back.value, underarm.value)) raise('wider', { back, underarm });
  },
});
