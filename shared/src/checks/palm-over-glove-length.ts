import { isLonger, lengthOf } from '../units/length.js';
import { check } from './check.js';

export const palmOverGloveLength = check({
  id: 'palm-over-glove-length',
  title: 'Palm wider than the glove is long',
  about: 'A glove that is wider across the palm, laid flat, than it is long.',
  severity: 'question',
  needs: { palm: ['palm'], glove: ['glove-length'] },
  messages: {
    wider:
      'Laid flat, the palm is {half} wide ({palm} round), and the glove is {glove} long. Were the two exchanged?',
  },
  run: ({ palm, glove }, raise) => {
    const half = lengthOf(Math.round(palm.value / 2));
    if (!isLonger(glove.value, half)) raise('wider', { palm, glove, half });
  },
});
