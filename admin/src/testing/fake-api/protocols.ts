import { kindIds } from '@ellwand/shared/points/kinds';
import { protocolFor, wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import { type OwnPointView, type ProtocolVersion, toProtocolView } from '@ellwand/shared/records/protocol';

/** An own point of Larkmoor House: it tells skirts that were looped up for walking. */
export const trainLoop: OwnPointView = {
  id: 'own-band-to-train-loop',
  group: 'skirt-length',
  name: 'Band to train loop',
  definition: 'Inside, down the centre back from the band to the loop that lifts the train.',
  from: 'the lower edge of the waistband at centre back',
  to: 'the upper end of the loop’s stitching',
  side: 'inside',
  how: 'straight',
  handlingStep: 'opened-inside',
  range: { fromMm: '500', toMm: '1100' },
  watchFor: 'Loops are often re-sewn: note new thread.',
  takesTapeLengths: false,
  levelRecorded: false,
  paired: false,
  line: {
    view: 'inside',
    along: [
      [-30, 40],
      [-30, 640],
    ],
  },
};

/** The house's first protocols; skirts have had a second one since. */
export function sampleProtocols(): ProtocolVersion[] {
  const first = [...kindIds.map(protocolFor), wornTogetherProtocol].map((protocol) => ({
    ...toProtocolView(protocol),
    note: '',
    madeBy: null,
    madeAt: null,
  }));
  const skirt = toProtocolView(protocolFor('skirt'));
  const at = skirt.points.findIndex(({ pointId }) => pointId === 'hem') + 1;
  const loop = { pointId: trainLoop.id, required: false, rounds: 1 };
  const second: ProtocolVersion = {
    ...skirt,
    version: 2,
    points: [...skirt.points.slice(0, at), loop, ...skirt.points.slice(at)],
    ownPoints: [trainLoop],
    note: 'Train loops tell skirts that were worn for walking.',
    madeBy: 'Ansel Dray',
    madeAt: '2026-11-12T10:15:00.000Z',
  };
  return [...first, second];
}
