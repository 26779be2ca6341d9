import { type Length, lengthOf } from '../units/length.js';
import { sheetCheck } from './check.js';

export const impossibleLength = sheetCheck({
  id: 'impossible-length',
  title: 'Not a length that dress can have',
  about: 'A reading that comes out below nothing, or beyond a hundred metres.',
  severity: 'stop',
  messages: {
    negative: '{point} comes out at {read}, less than nothing. Look at the zero of the tape and at the gap.',
    endless: '{point} reads {read}, longer than anything in dress. Read it again.',
  },
  run: ({ impossible }, raise) => {
    const seen = new Set<string>();
    for (const { pointId, length } of impossible) {
      if (seen.has(pointId)) continue;
      seen.add(pointId);
      raise(length < 0 ? 'negative' : 'endless', { point: { mentioned: pointId }, read: held(length) });
    }
  },
});

/** Whatever came, as a length that can be written out. */
function held(length: number): Length {
  return lengthOf(Number.isSafeInteger(length) ? length : Number.MAX_SAFE_INTEGER);
}
