import { isLonger } from '../units/length.js';
import { sheetCheck } from './check.js';

export const waistToHemOverNeckToHem = sheetCheck({
  id: 'waist-to-hem-over-neck-to-hem',
  title: 'Waist to hem not shorter than neck to hem',
  about: 'A length from waist to hem that leaves nothing between neck and waist.',
  severity: 'stop',
  messages: {
    front: 'In front, waist to hem, {waistToHem}, is not shorter than neck to hem, {neckToHem}.',
    back: 'At the back, waist to hem, {waistToHem}, is not shorter than neck to hem, {neckToHem}.',
  },
  run: ({ values }, raise) => {
    for (const side of ['front', 'back'] as const) {
      const waistToHem = values.get(`waist-to-hem-${side}`);
      const neckToHem = values.get(`neck-to-hem-${side}`);
      if (!waistToHem || !neckToHem || isLonger(neckToHem.value, waistToHem.value)) continue;
      raise(side, { waistToHem, neckToHem });
    }
  },
});
