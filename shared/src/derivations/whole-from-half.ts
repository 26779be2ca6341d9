import { kindIds } from '../points/kinds.js';
import type { AcceptedValue } from '../readings/accepted-value.js';
import { wornSideLabels } from '../readings/worn-side.js';
import { readMm } from '../units/format-length.js';
import { lengthOf } from '../units/length.js';
import { divideHalfUp } from '../units/rounding.js';
import type { Derivation, DerivedValue } from './derivation.js';

const FORMULA = '2 × the half that was read';

/** Shows the doubling: the half keeps its own figure, and its uncertainty counts twice in the whole. */
export const wholeFromHalf: Derivation = {
  id: 'whole-from-half',
  label: 'Whole from half',
  formula: FORMULA,
  kinds: kindIds,
  needs: 'Any point that was read flat, from fold to fold',
  workOut: ({ values, doubled, labelOf }) =>
    [...values.values()]
      .filter(({ pointId }) => doubled.has(pointId))
      .map((accepted) => wholeOf(accepted, labelOf(accepted.pointId))),
};

function wholeOf({ pointId, value, uncertaintyMm, worn }: AcceptedValue, name: string): DerivedValue {
  const half = lengthOf(Number(divideHalfUp(BigInt(value), 2n)));
  const side = worn ? `, ${wornSideLabels[worn]}` : '';
  return {
    id: `whole-from-half:${pointId}`,
    label: `${name}, whole`,
    formula: FORMULA,
    figure: { type: 'length', length: value, uncertaintyMm },
    trace: [{ pointId, label: `${name}${side}, the half`, value: half, uncertaintyMm: uncertaintyMm / 2 }],
    worked: `2 × ${readMm(half)} = ${readMm(value)}`,
  };
}
