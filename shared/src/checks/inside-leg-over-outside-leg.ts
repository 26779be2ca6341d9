import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const insideLegOverOutsideLeg = check({
  id: 'inside-leg-over-outside-leg',
  title: 'Inside leg not shorter than outside leg',
  about: 'An inside leg that leaves nothing for the rise.',
  severity: 'stop',
  needs: { inside: ['inside-leg'], outside: ['outside-leg'] },
  messages: {
    longer:
      'The inside leg, {inside}, is not shorter than the outside leg, {outside}. Were the two exchanged?',
  },
  run: ({ inside, outside }, raise) => {
    if (!isLonger(outside.value, inside.value)) raise('longer', { inside, outside });
  },
});
