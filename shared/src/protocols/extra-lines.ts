import { type MeasuringWay, type ViewName } from '../drawings/diagram/model.js';
import { type MeasuringHow } from '../points/point.js';
import { type OwnPoint } from './protocol.js';

/** A line that the kind's diagram does not have: through these places of a view, in its millimetres. */
export interface ExtraLine {
  readonly pointId: string;
  readonly view: ViewName;
  readonly way: MeasuringWay;
  readonly along: readonly (readonly [number, number])[];
}

const wayOf: Readonly<Record<MeasuringHow, MeasuringWay>> = {
  round: 'round',
  straight: 'straight',
  curve: 'curve',
  'flat-doubled': 'doubled',
};

export function extraLinesOf(
  ownPoints: readonly Pick<OwnPoint, 'id' | 'how' | 'line'>[],
): readonly ExtraLine[] {
  return ownPoints.map(({ id, how, line }) => ({ pointId: id, way: wayOf[how], ...line }));
}
