import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const innerWaistBandOverWaist = check({
  id: 'inner-waist-band-over-waist',
  title: 'Inner waist band larger than the waist',
  about: 'A band inside that is larger than the waist it should hold.',
  severity: 'note',
  needs: { band: ['inner-waist-band'], waist: ['waist'] },
  messages: {
    larger: 'The inner waist band, {band}, is larger than the waist, {waist}. It usually is the smaller.',
  },
  run: ({ band, waist }, raise) => {
    if (isLonger(band.value, waist.value)) raise('larger', { band, waist });
  },
});
