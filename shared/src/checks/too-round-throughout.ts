import { keyedFigure } from '../readings/keyed-figure.js';
import type { TakenReading } from '../readings/reading.js';
import { readingStep } from '../readings/reading-step.js';
import { type Length, mm, UNITS_PER_INCH } from '../units/length.js';
import { sheetCheck } from './check.js';

/** Ten readings in whole millimetres end in 0 or 5 by chance once in ten million sheets: (1 ÷ 5)¹⁰. */
const FEWEST = 10;

export const tooRoundThroughout = sheetCheck({
  id: 'too-round-throughout',
  title: 'Round figures throughout',
  about:
    'Ten readings or more, every one of them a round figure, although they claim to be read more finely.',
  severity: 'question',
  messages: {
    tens: 'All {count} readings are whole centimetres. Were they read to the millimetre?',
    fives: 'All {count} readings end in 0 or 5 mm. Were they read to the millimetre?',
    inches: 'All {count} readings are whole inches. Were they read to the fraction?',
  },
  run: ({ taken }, raise) => {
    const figures = taken.filter(claimsMore).map((reading) => keyedFigure(reading) ?? reading.length);
    if (figures.length < FEWEST) return;
    const allAre = (step: number): boolean => figures.every((figure) => figure % step === 0);
    const count = { text: String(figures.length) };
    if (allAre(mm(10))) raise('tens', { count });
    else if (allAre(mm(5))) raise('fives', { count });
    else if (allAre(UNITS_PER_INCH)) raise('inches', { count });
  },
});

const COARSE: Length = mm(5);

/** A figure keyed in whole centimetres says of itself how coarse it is; nothing of nothing is always round. */
function claimsMore(reading: TakenReading): boolean {
  return readingStep(reading) < COARSE && reading.length !== 0;
}
