/** What a new version of a protocol must be before it is made. Pure: the editor and the API ask the same. */
import { lowerKind } from '../points/kinds.js';
import { handlingStepLabels, handlingSteps, type MeasuringPoint } from '../points/point.js';
import { ownPointFaults } from './own-point-rules.js';
import { askablePoints, pointIn, type Protocol } from './protocol.js';
import type { ProtocolFault } from './protocol-fault.js';

/** More would not be read in one sitting. */
export const MOST_POINTS = 40;

/**
 * Everything that keeps a draft from becoming a version; empty where nothing does.
 * @param made every version of every protocol that has own points: an own point's id keeps its meaning in all of them
 */
export function protocolFaults(draft: Protocol, made: readonly Protocol[]): readonly ProtocolFault[] {
  return [
    ...countFaults(draft),
    ...draft.points.flatMap((_, index) => askedFaults(draft, index)),
    ...orderFaults(draft),
    ...draft.ownPoints.flatMap((_, index) => ownPointFaults(draft, index, made)),
  ];
}

function countFaults({ points }: Protocol): ProtocolFault[] {
  if (points.length > MOST_POINTS) {
    return [{ pointer: '/points', detail: `At most ${MOST_POINTS} points: there are ${points.length}.` }];
  }
  if (points.some(({ required }) => required)) return [];
  const detail = points.length === 0 ? 'there is no point at all.' : 'every one may be left out.';
  return [{ pointer: '/points', detail: `Require at least one point: ${detail}` }];
}

function askedFaults(draft: Protocol, index: number): ProtocolFault[] {
  const pointId = draft.points[index]?.pointId ?? '';
  const pointer = `/points/${index}/pointId`;
  const point = pointIn(draft, pointId);
  const what = `a ${lowerKind(draft.kind)}${draft.wornTogether ? ' laid together as worn' : ''}`;
  if (!point) {
    return [{ pointer, detail: `Expected a measuring point of ${what} or one made here, got “${pointId}”.` }];
  }
  const first = draft.points.findIndex((asked) => asked.pointId === pointId);
  if (first < index) {
    return [{ pointer, detail: `“${point.name}” is asked for twice, at ${first + 1} and at ${index + 1}.` }];
  }
  const isOwn = draft.ownPoints.some(({ id }) => id === pointId);
  if (isOwn || askablePoints(draft).some(({ id }) => id === pointId)) return [];
  return [{ pointer, detail: `“${point.name}” is not a point of ${what}.` }];
}

/** Opened and inside, front up, back up: a point that would have the garment turned back again stands wrong. */
function orderFaults(draft: Protocol): ProtocolFault[] {
  const asked = draft.points.flatMap(({ pointId }, index) => {
    const point = pointIn(draft, pointId);
    return point ? [{ point, index, step: handlingSteps.indexOf(point.handlingStep) }] : [];
  });
  return asked.flatMap(({ point, index, step }, place) => {
    const before = asked.slice(0, place).find((earlier) => earlier.step > step);
    if (!before) return [];
    const detail =
      `“${point.name}” (${stepWord(point)}) stands after “${before.point.name}” (${stepWord(before.point)}): ` +
      'the garment would be turned back. Put it before.';
    return [{ pointer: `/points/${index}/pointId`, detail }];
  });
}

const stepWord = ({ handlingStep }: MeasuringPoint): string => handlingStepLabels[handlingStep].toLowerCase();
