import { FLAGGED_ABOVE, medianOf, modifiedZ } from '../repeatability/robust.js';
import { readMm } from '../units/format-length.js';
import { lengthOf, toMm, UNITS_PER_MM } from '../units/length.js';
import { sheetCheck } from './check.js';

/** With fewer garments their own chance would speak. A house setting. */
const FEWEST = 8;

export const outsideOwnGarments = sheetCheck({
  id: 'outside-own-garments',
  title: 'Far from the museum’s own garments',
  about:
    'A value far from those of the museum’s other garments of the same kind and decade, where there are eight or more.',
  severity: 'question',
  messages: {
    far: '{point} comes to {value}, while the museum’s {count} others of this kind and decade lie close about {median}. Is it so?',
  },
  run: ({ values, peers }, raise) => {
    for (const { pointId, valuesMm } of peers) {
      const value = values.get(pointId);
      const others = valuesMm.filter(Number.isFinite);
      const median = medianOf(others);
      if (!value || median === null || others.length < FEWEST) continue;
      const z = modifiedZ(toMm(value.value), others);
      if (z === null || Math.abs(z) <= FLAGGED_ABOVE) continue;
      raise('far', {
        point: { mentioned: pointId },
        value,
        // The house goes on measuring: an answer about this garment holds when the others become more.
        count: { text: String(others.length), inPassing: true },
        median: { text: readMm(lengthOf(Math.round(median * UNITS_PER_MM))), inPassing: true },
      });
    }
  },
});
