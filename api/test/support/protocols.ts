import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import {
  type NewProtocolInput,
  type OwnPointView,
  type ProtocolHistory,
  toProtocolView,
} from '@ellwand/shared/records/protocol';
import type { Agent } from '../harness/house';

/** A skirt's loops, as a house may wish to measure them: from the band to the train loop, inside. */
export const loopDepth: OwnPointView = {
  id: 'own-band-to-loop',
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
      [0, 20],
      [0, 600],
    ],
  },
};

/** The house's own skirt protocol with the loop asked for last among what is read inside. */
export function skirtWithLoop(more: Partial<NewProtocolInput> = {}): NewProtocolInput {
  const { points } = toProtocolView(protocolFor('skirt'));
  const at = points.findIndex(({ pointId }) => pointId === 'hem') + 1;
  const loop = { pointId: loopDepth.id, required: true, rounds: 1 };
  return {
    points: [...points.slice(0, at), loop, ...points.slice(at)],
    ownPoints: [loopDepth],
    note: 'The loops tell trained skirts that were worn for walking.',
    ...more,
  };
}

export function makeProtocol(
  administrator: Agent,
  kind: GarmentKind,
  seen: number,
  protocol: NewProtocolInput,
) {
  return administrator.post(`/api/v1/workroom/protocols/${kind}`).set('If-Match', `"${seen}"`).send(protocol);
}

export async function historyOf(agent: Agent, kind: GarmentKind): Promise<ProtocolHistory> {
  return (await agent.get(`/api/v1/workroom/protocols/${kind}`)).body as ProtocolHistory;
}
