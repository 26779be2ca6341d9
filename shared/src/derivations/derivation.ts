/** Derived values: worked out from readings by a formula that is shown, never typed. */
import type { GarmentKind } from '../points/kinds.js';
import { measuringPoint, type PointId } from '../points/measuring-points.js';
import type { AcceptedValue } from '../readings/accepted-value.js';
import { rootOfSquares } from '../readings/uncertainty.js';
import { wornSideLabels } from '../readings/worn-side.js';
import { readMm } from '../units/format-length.js';
import { type Length, subtract, toMm } from '../units/length.js';
import { divideHalfUp } from '../units/rounding.js';
import type { PartFigures } from './part-figures.js';

/** A figure that a derivation needs: the first of these points that has a value. */
export type Need = readonly [PointId, ...PointId[]];

export interface DerivedLength {
  readonly type: 'length';
  /** May be negative: a front can be longer than a back. */
  readonly length: Length;
  /** Standard uncertainty in mm. */
  readonly uncertaintyMm: number;
}

export interface DerivedRatio {
  readonly type: 'ratio';
  readonly ratio: number;
  /** To two places, half-up: "4.75". */
  readonly text: string;
  /** Standard uncertainty of the ratio itself. */
  readonly uncertainty: number;
}

export type DerivedFigure = DerivedLength | DerivedRatio;

/** A figure that was put in. */
export interface TraceEntry {
  /** A measuring point, or `panel` for a width of the cut sheet. */
  readonly pointId: string;
  readonly label: string;
  readonly value: Length;
  readonly uncertaintyMm: number;
  /** Read on the sheet of another part, or on a cut sheet. */
  readonly elsewhere?: boolean;
}

export interface DerivedValue {
  /** The derivation's, and after a colon which of several it is: `whole-from-half:elbow`. */
  readonly id: string;
  readonly label: string;
  readonly formula: string;
  readonly figure: DerivedFigure;
  readonly trace: readonly TraceEntry[];
  /** The formula with its figures: "1400 mm − 1020 mm = 380 mm". */
  readonly worked: string;
}

export interface Derivation {
  readonly id: string;
  readonly label: string;
  readonly formula: string;
  readonly kinds: readonly GarmentKind[];
  /** Points, each with what may stand in for it; or a sentence where it is not a matter of certain points. */
  readonly needs: readonly [Need, Need] | string;
  /** One value or several; none where a figure is missing or the formula has no answer. */
  readonly workOut: (part: PartFigures) => readonly DerivedValue[];
}

export interface FormulaFacts extends Omit<Derivation, 'needs' | 'workOut'> {
  readonly needs: readonly [Need, Need];
  /** Nothing where the formula has no answer, such as a division by zero. */
  readonly compute: (first: TraceEntry, second: TraceEntry) => DerivedFigure | undefined;
}

/** A formula over two figures of one part, and of one side of it: a left sleeve is not taken with a right armscye. */
export interface FormulaDerivation extends FormulaFacts {
  readonly workOut: Derivation['workOut'];
}

export function derivation(entry: FormulaFacts): FormulaDerivation {
  return {
    ...entry,
    workOut: ({ values, valuesOn }) => {
      const sources = [values, valuesOn.right, valuesOn.left];
      return sources.flatMap((source) => derive(entry, source) ?? []).slice(0, 1);
    },
  };
}

/** u = √(u₁² + u₂²), as for any difference of two independent readings. */
export function difference(from: TraceEntry, taken: TraceEntry): DerivedLength {
  return {
    type: 'length',
    length: subtract(from.value, taken.value),
    uncertaintyMm: rootOfSquares([from.uncertaintyMm, taken.uncertaintyMm]),
  };
}

/** For q = a ÷ b, u² = (u_a ÷ b)² + (q · u_b ÷ b)²: the first-order law of propagation. */
export function quotient(whole: TraceEntry, part: TraceEntry): DerivedRatio | undefined {
  if (part.value <= 0) return undefined;
  const ratio = whole.value / part.value;
  const partMm = toMm(part.value);
  return {
    type: 'ratio',
    ratio,
    text: hundredths(whole.value, part.value),
    uncertainty: rootOfSquares([whole.uncertaintyMm / partMm, (ratio * part.uncertaintyMm) / partMm]),
  };
}

function hundredths(whole: Length, part: Length): string {
  const steps = divideHalfUp(BigInt(whole) * 100n, BigInt(part));
  const digits = (steps < 0n ? -steps : steps).toString().padStart(3, '0');
  return `${steps < 0n ? '\u2212' : ''}${digits.slice(0, -2)}.${digits.slice(-2)}`;
}

/** The derived value, or nothing where a figure is missing or the formula has no answer. */
export function derive(
  { id, label, formula, needs, compute }: FormulaFacts,
  values: ReadonlyMap<string, AcceptedValue>,
): DerivedValue | undefined {
  const first = firstOf(needs[0], values);
  const second = firstOf(needs[1], values);
  if (!first || !second) return undefined;
  if (first.worn && second.worn && first.worn !== second.worn) return undefined;
  const trace = [catalogued(first), catalogued(second)] as const;
  const figure = compute(...trace);
  if (!figure) return undefined;
  const sign = figure.type === 'length' ? '\u2212' : '÷';
  const worked = `${readMm(first.value)} ${sign} ${readMm(second.value)} = ${figureText(figure)}`;
  return { id, label, formula, figure, trace, worked };
}

function firstOf(need: Need, values: ReadonlyMap<string, AcceptedValue>): AcceptedValue | undefined {
  return need.map((pointId) => values.get(pointId)).find((accepted) => accepted !== undefined);
}

function catalogued(accepted: AcceptedValue): TraceEntry {
  return traceEntry(accepted, measuringPoint(accepted.pointId as PointId).name);
}

/** As it is shown: with the side where one was said. */
export function traceEntry({ pointId, value, uncertaintyMm, worn }: AcceptedValue, name: string): TraceEntry {
  return { pointId, label: worn ? `${name}, ${wornSideLabels[worn]}` : name, value, uncertaintyMm };
}

function figureText(figure: DerivedFigure): string {
  return figure.type === 'length' ? readMm(figure.length) : figure.text;
}
