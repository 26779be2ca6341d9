/** Points of a two-part dress, its bodice and skirt laid together as worn. */
import { backCurve, between, frontCurve, point } from './point.js';

const together = {
  kinds: ['dress'],
  watchFor:
    'The parts overlap at the waist: lay them as the fastenings hold them, and say which was worn over which.',
  wornTogether: true,
  takesTapeLengths: true,
} as const;

export const wornPoints = [
  point({
    ...together,
    id: 'worn-neck-to-hem-front',
    group: 'front-length',
    name: 'Neck to hem, front, worn together',
    definition:
      'Bodice and skirt laid as worn: from the base of the collar at centre front to the hem of the skirt.',
    from: 'the base of the bodice’s collar at centre front',
    to: 'the skirt’s lower edge at centre front',
    ...frontCurve,
    softRange: between(850, 1600),
  }),
  point({
    ...together,
    id: 'worn-neck-to-hem-back',
    group: 'back-length',
    name: 'Neck to hem, back, worn together',
    definition: 'Bodice and skirt laid as worn: from the neck edge at centre back to the hem of the skirt.',
    from: 'the bodice’s neck edge at centre back',
    to: 'the skirt’s lower edge at centre back',
    ...backCurve,
    softRange: between(850, 3500),
  }),
] as const;
