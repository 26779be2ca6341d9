import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const treadOverSole = check({
  id: 'tread-over-sole',
  title: 'Tread not shorter than the sole',
  about: 'A shoe that is as wide as it is long.',
  severity: 'stop',
  needs: { tread: ['tread'], sole: ['sole'] },
  messages: { wider: 'The tread, {tread}, is not shorter than the sole, {sole}. Were the two exchanged?' },
  run: ({ tread, sole }, raise) => {
    if (!isLonger(sole.value, tread.value)) raise('wider', { tread, sole });
  },
});
