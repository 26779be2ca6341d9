import { absolute, isLonger, mm, subtract } from '../units/length.js';
import { check } from './check.js';

/** Full fronts and narrow backs were the fashion more than once: a house setting. */
const ALLOWED = mm(80);

export const acrossFrontAgainstBack = check({
  id: 'across-front-against-back',
  title: 'Across front and across back far apart',
  about: 'A body whose front and back differ in width by more than fashion usually makes.',
  severity: 'note',
  needs: { front: ['across-front'], back: ['across-back'] },
  messages: {
    apart: 'Across the front reads {front} and across the back {back}, {apart} apart.',
  },
  run: ({ front, back }, raise) => {
    const apart = absolute(subtract(front.value, back.value));
    if (isLonger(apart, ALLOWED)) raise('apart', { front, back, apart });
  },
});
