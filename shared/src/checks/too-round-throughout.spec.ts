import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { tooRoundThroughout } from './too-round-throughout.js';

const points = [
  ...['bust', 'waist', 'neck', 'side-seam', 'armscye', 'cuff', 'across-back', 'across-front'],
  ...['shoulder-seam', 'sleeve-outer', 'sleeve-under', 'elbow'],
];
const readAs = (figureOf: (index: number) => string, unit: 'mm' | 'cm' | 'in', count = 10) =>
  points.slice(0, count).map((pointId, index) => {
    const typed = figureOf(index);
    const inMm = { mm: 1, cm: 10, in: 25.4 }[unit] * Number(typed);
    return read(pointId, inMm.toFixed(4), { typed, unit });
  });

testCheck(tooRoundThroughout, {
  quiet: [
    { name: 'nine round figures', readings: readAs((index) => `${300 + 10 * index}`, 'mm', 9) },
    {
      name: 'ten, one of them not round',
      readings: [...readAs((index) => `${300 + 10 * index}`, 'mm', 9), read('elbow', 302)],
    },
    {
      name: 'whole centimetres from an old record, which say how coarse they are',
      readings: readAs((index) => `${30 + index}`, 'cm'),
    },
    { name: 'eighths of an inch', readings: readAs((index) => `${20 + index / 8}`, 'in') },
  ],
  raises: [
    {
      name: 'whole centimetres keyed as millimetres',
      readings: readAs((index) => `${300 + 10 * index}`, 'mm'),
      says: 'All 10 readings are whole centimetres. Were they read to the millimetre?',
      severity: 'question',
      points: [],
    },
    {
      name: 'nothing but fives and noughts',
      readings: readAs((index) => `${300 + 5 * index}`, 'mm', 12),
      says: 'All 12 readings end in 0 or 5 mm. Were they read to the millimetre?',
      severity: 'question',
      points: [],
    },
    {
      name: 'whole inches',
      readings: readAs((index) => `${20 + index}`, 'in'),
      says: 'All 10 readings are whole inches. Were they read to the fraction?',
      severity: 'question',
      points: [],
    },
  ],
});
