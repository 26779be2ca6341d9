import { testCheck } from '../testing/test-check.js';
import { read } from '../testing/sample-readings.js';
import { elbowOverSleeveWidest } from './elbow-over-sleeve-widest.js';

testCheck(elbowOverSleeveWidest, {
  quiet: [
    { name: 'a full sleeve', readings: { elbow: 320, 'sleeve-widest': 620 } },
    { name: 'a straight sleeve, widest all along', readings: { elbow: 420, 'sleeve-widest': 420 } },
  ],
  raises: [
    {
      name: 'the left sleeve, while the right is sound',
      readings: [
        read('elbow', 320, { worn: 'right' }),
        read('sleeve-widest', 620, { worn: 'right' }),
        read('elbow', 640, { worn: 'left' }),
        read('sleeve-widest', 420, { worn: 'left' }),
      ],
      says: 'Left, as worn: the elbow, 640 mm, is larger than the sleeve at its widest, 420 mm. Were both doubled?',
      severity: 'question',
      points: ['elbow', 'sleeve-widest'],
    },
    {
      name: 'an elbow that was doubled twice',

      readings: { elbow: 640, 'sleeve-widest': 420 },
      says: 'The elbow, 640 mm, is larger than the sleeve at its widest, 420 mm. Were both doubled?',
      severity: 'question',
      points: ['elbow', 'sleeve-widest'],
    },
  ],
});
