import { absolute, isLonger, mm, subtract } from '../units/length.js';
import { check } from './check.js';

/** Brims were rolled and cut by hand: a house setting. */
const ALLOWED = mm(10);

export const brimSidesDiffer = check({
  id: 'brim-sides-differ',
  title: 'Brim wider on one side',
  about: 'A brim whose left and right differ.',
  severity: 'note',
  needs: { left: ['brim-left'], right: ['brim-right'] },
  messages: {
    differ:
      'The brim reads {left} at the left and {right} at the right, {apart} apart. Is it rolled, or cut so?',
  },
  run: ({ left, right }, raise) => {
    const apart = absolute(subtract(left.value, right.value));
    if (isLonger(apart, ALLOWED)) raise('differ', { left, right, apart });
  },
});
