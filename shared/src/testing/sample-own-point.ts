import { houseTolerance } from '../points/tolerance.js';
import type { OwnPoint } from '../protocols/protocol.js';
import { mm } from '../units/length.js';

/** A skirt's train loop, measured by a house that cares for trains: down the centre back, inside. */
export function sampleOwnPoint(more: Partial<OwnPoint> = {}): OwnPoint {
  return {
    id: 'own-band-to-loop',
    group: 'skirt-length',
    name: 'Band to train loop',
    definition: 'Inside, down the centre back from the band to the loop that lifts the train.',
    from: 'the lower edge of the waistband at centre back',
    to: 'the upper end of the loop’s stitching',
    side: 'inside',
    how: 'straight',
    handlingStep: 'opened-inside',
    kinds: ['skirt'],
    softRange: { from: mm(500), to: mm(1100), basis: 'the house' },
    softRangeByKind: {},
    tolerance: houseTolerance,
    watchFor: 'Loops are often re-sewn: note new thread.',
    takesTapeLengths: false,
    levelRecorded: false,
    wornTogether: false,
    paired: false,
    line: {
      view: 'inside',
      along: [
        [0, 20],
        [0, 600],
      ],
    },
    ...more,
  };
}
