import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const waistOverHip = check({
  id: 'waist-over-hip',
  title: 'Waist larger than the hip',
  about: 'A skirt or trousers whose waist is larger than the hip or seat.',
  severity: 'question',
  needs: { waist: ['waistband', 'trouser-waistband'], hip: ['hip', 'high-hip', 'seat'] },
  messages: {
    larger: 'The waistband, {waist}, is larger than the hip or seat, {hip}. Was the half doubled?',
  },
  run: ({ waist, hip }, raise) => {
    if (isLonger(waist.value, hip.value)) raise('larger', { waist, hip });
  },
});
