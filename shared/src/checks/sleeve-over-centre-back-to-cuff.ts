import { isLonger } from '../units/length.js';
import { check } from './check.js';

export const sleeveOverCentreBackToCuff = check({
  id: 'sleeve-over-centre-back-to-cuff',
  title: 'Sleeve longer than centre back to cuff',
  about: 'A sleeve that is longer from the shoulder than from the centre back.',
  severity: 'question',
  needs: { sleeve: ['sleeve-outer'], whole: ['centre-back-to-cuff'] },
  messages: {
    longer: 'The sleeve, {sleeve}, is not shorter than centre back to cuff, {whole}, which it is a part of.',
  },
  run: ({ sleeve, whole }, raise) => {
    if (!isLonger(whole.value, sleeve.value)) raise('longer', { sleeve, whole });
  },
});
