import { inTapeLengths } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { mm } from '../units/length.js';
import { longerThanTape } from './longer-than-tape.js';

const facts = { tapeLength: mm(1500) };

testCheck(longerThanTape, {
  quiet: [
    { name: 'a tape that nobody described', kind: 'skirt', readings: { hem: 3400 } },
    { name: 'as long as the tape', kind: 'skirt', readings: { hem: 1500 }, facts },
    { name: 'counted in tapes', kind: 'skirt', readings: [inTapeLengths('hem', 3, 742)], facts },
    { name: 'a half shorter than the tape', readings: { 'sleeve-widest': 1600 }, facts },
  ],
  raises: [
    {
      name: 'a hem in one go',
      kind: 'skirt',
      readings: { hem: 3400 },
      facts,
      says: 'Hem reads 3400 mm, longer than the tape of 1500 mm. How many whole tapes were counted?',
      severity: 'question',
      points: ['hem'],
    },
  ],
});
