import { howTaken } from '../readings/accepted-value.js';
import type { TakenReading } from '../readings/reading.js';
import { medianOf } from '../repeatability/robust.js';
import { lengthOf, toMm, UNITS_PER_MM } from '../units/length.js';
import { sheetCheck } from './check.js';
import { readPoints, type SheetView } from './sheet-view.js';

/** House settings: as many points, this far off each time the tape is laid, and as alike as whole millimetres allow. */
const FEWEST = 3;
const LEAST_MM = 3;
const ALIKE_MM = 1;
const MOST_OF_THEM = 0.75;

export const tapeOffsetForgotten = sheetCheck({
  id: 'tape-offset-forgotten',
  title: 'Zero of the tape forgotten',
  about: 'A second round that differs from the first by the same amount at three points or more.',
  severity: 'question',
  messages: {
    longer:
      'At {count} of the {all} points read twice the second round is {offset} longer each time the tape was laid. Was the zero of one tape forgotten?',
    shorter:
      'At {count} of the {all} points read twice the second round is {offset} shorter each time the tape was laid. Was the zero of one tape forgotten?',
  },
  run: (sheet, raise) => {
    const offsets = offsetsOf(sheet);
    const middle = medianOf(offsets);
    if (middle === null || Math.abs(middle) < LEAST_MM) return;
    const alike = offsets.filter((offset) => Math.abs(offset - middle) <= ALIKE_MM);
    if (alike.length < FEWEST || alike.length < MOST_OF_THEM * offsets.length) return;
    raise(middle > 0 ? 'longer' : 'shorter', {
      count: { text: String(alike.length) },
      all: { text: String(offsets.length) },
      offset: lengthOf(Math.round(Math.abs(middle) * UNITS_PER_MM)),
    });
  },
});

/** How much longer the second round is than the first, for each time that the tape was laid down. */
function offsetsOf(sheet: SheetView): readonly number[] {
  const perLaying = (reading: TakenReading): number => {
    const doubled = howTaken(reading, sheet.protocol.ownPoints) === 'flat-doubled' ? 2 : 1;
    const { count = 0, rest = 1 } = reading.tapeLengths ?? {};
    const laid = count > 0 ? count + (rest > 0 ? 1 : 0) : 1;
    return Number.isFinite(laid) ? doubled * laid : 1;
  };
  return readPoints(sheet).flatMap(({ readings: [first, second] }) =>
    first && second ? [(toMm(second.length) - toMm(first.length)) / perLaying(second)] : [],
  );
}
