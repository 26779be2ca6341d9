import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { doubledOverTissue } from './doubled-over-tissue.js';

const sleeve = { 'sleeve-widest': 620, elbow: 320, waist: 612 };

testCheck(doubledOverTissue, {
  quiet: [
    { name: 'no tissue inside', readings: sleeve, facts: { support: 'flat' } },
    { name: 'nothing said about tissue', readings: sleeve },
    { name: 'nothing doubled', readings: { waist: 612 }, facts: { support: 'flat-tissue' } },
    {
      name: 'a note that says what was done',
      readings: [read('elbow', 320, { note: 'Tissue out of the sleeve.' })],
      facts: { support: 'flat-tissue' },
    },
  ],
  raises: [
    {
      name: 'a sleeve with its tissue, once for the sheet',
      readings: sleeve,
      facts: { support: 'flat-tissue' },
      says: 'Tissue lay inside, and a reading doubled over it comes out wrong: sleeve at its widest (620 mm) and elbow (320 mm). Was it taken out first?',
      severity: 'question',
      points: ['sleeve-widest', 'elbow'],
    },
    {
      name: 'a waist that was laid flat',
      readings: [read('waist', 612, { method: 'flat-doubled' })],
      facts: { support: 'flat-tissue' },
      says: 'Tissue lay inside, and a reading doubled over it comes out wrong: waist (612 mm). Was it taken out first?',
      severity: 'question',
      points: ['waist'],
    },
  ],
});
