import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { mm } from '../units/length.js';
import { hipWithoutDepth } from './hip-without-depth.js';

testCheck(hipWithoutDepth, {
  quiet: [
    { name: 'a depth', kind: 'skirt', readings: [read('hip', 980, { depthBelowWaist: mm(200) })] },
    {
      name: 'a high hip, which lies 80 mm below by its definition',
      kind: 'skirt',
      readings: { 'high-hip': 900 },
    },
    { name: 'no hip', kind: 'skirt', readings: { waistband: 640 } },
  ],
  raises: [
    {
      name: 'a hip anywhere',
      kind: 'skirt',
      readings: { hip: 980 },
      says: 'The hip, 980 mm, does not say how far below the waist it was read.',
      severity: 'question',
      points: ['hip'],
    },
  ],
});
