/** Derived values: worked out from readings by a formula that is shown, never typed. */
import { type GarmentKind } from '../points/kinds.js';
import { measuringPoint, type PointId } from '../points/measuring-points.js';
import { type AcceptedValue } from '../readings/accepted-value.js';
import { rootOfSquares } from '../readings/uncertainty.js';
import { decimalText } from '../units/format-length.js';
import { type Length, subtract, toMm } from '../units/length.js';
import { divideHalfUp } from '../units/rounding.js';

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
  readonly pointId: PointId;
  readonly label: string;
  readonly value: Length;
  readonly uncertaintyMm: number;
}

export interface DerivedValue {
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
  readonly needs: readonly [Need, Need];
  /** Nothing where the formula has no answer, such as a division by zero. */
  readonly compute: (first: TraceEntry, second: TraceEntry) => DerivedFigure | undefined;
}

export function derivation(entry: Derivation): Derivation {
  return entry;
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
  { id, label, formula, needs, compute }: Derivation,
  values: ReadonlyMap<string, AcceptedValue>,
): DerivedValue | undefined {
  const first = traceEntry(needs[0], values);
  const second = traceEntry(needs[1], values);
  if (!first || !second) return undefined;
  const figure = compute(first, second);
  if (!figure) return undefined;
  const sign = figure.type === 'length' ? '\u2212' : '÷';
  const worked = `${inMm(first.value)} ${sign} ${inMm(second.value)} = ${figureText(figure)}`;
  return { id, label, formula, figure, trace: [first, second], worked };
}

function traceEntry(need: Need, values: ReadonlyMap<string, AcceptedValue>): TraceEntry | undefined {
  for (const pointId of need) {
    const accepted = values.get(pointId);
    if (accepted) {
      const { value, uncertaintyMm } = accepted;
      return { pointId, label: measuringPoint(pointId).name, value, uncertaintyMm };
    }
  }
  return undefined;
}

/** Whole millimetres, with tenths where the reading has any. */
function inMm(length: Length): string {
  return `${decimalText(length, 'mm', length % 10_000 === 0 ? 0 : 1)} mm`;
}

function figureText(figure: DerivedFigure): string {
  return figure.type === 'length' ? inMm(figure.length) : figure.text;
}
