import type { MeasuringWay } from '../drawings/diagram/model.js';
import type { OwnLine } from '../drawings/diagram/own-line.js';
import type { MeasuringHow } from '../points/point.js';
import type { OwnPoint } from './protocol.js';

const wayOf: Readonly<Record<MeasuringHow, MeasuringWay>> = {
  round: 'round',
  straight: 'straight',
  curve: 'curve',
  'flat-doubled': 'doubled',
};

/** Own points' lines as the painter of diagrams takes them. */
export function extraLinesOf(
  ownPoints: readonly Pick<OwnPoint, 'id' | 'how' | 'line'>[],
): readonly OwnLine[] {
  return ownPoints.map(({ id, how, line }) => ({ pointId: id, way: wayOf[how], ...line }));
}
