import {
  derive,
  type DerivedFigure,
  type DerivedValue,
  type FormulaFacts,
} from '../derivations/derivation.js';
import { type AcceptedValue, acceptedValues } from '../readings/accepted-value.js';
import { mm } from '../units/length.js';
import { read } from './sample-readings.js';

/** The derived value of readings given in mm; throws where there is none. */
export function derivedOf(
  entry: FormulaFacts,
  readingsMm: Readonly<Record<string, number | string>>,
): DerivedValue {
  const readings = Object.entries(readingsMm).map(([pointId, valueMm]) => read(pointId, valueMm));
  const derived = derive(entry, acceptedValues(readings));
  if (!derived) throw new Error(`${entry.id} has no value`);
  return derived;
}

/** The same, from values whose standard uncertainty (mm) is given rather than worked out. */
export function derivedWithUncertainty(
  entry: FormulaFacts,
  given: readonly (readonly [pointId: string, valueMm: number, uncertaintyMm: number])[],
): DerivedFigure | undefined {
  const values = given.map(([pointId, valueMm, uncertaintyMm]): [string, AcceptedValue] => [
    pointId,
    { pointId, value: mm(valueMm), n: 1, spread: mm(0), uncertaintyMm, tapeJoins: 0 },
  ]);
  return derive(entry, new Map(values))?.figure;
}
