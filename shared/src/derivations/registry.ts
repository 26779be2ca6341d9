import { type GarmentKind } from '../points/kinds.js';
import { acceptedValues, type AcceptedValue } from '../readings/accepted-value.js';
import { type Reading } from '../readings/reading.js';
import { backOverFrontExcess } from './back-over-front-excess.js';
import { bustMinusWaist } from './bust-minus-waist.js';
import { derive, type Derivation, type DerivedValue } from './derivation.js';
import { hemToWaistRatio } from './hem-to-waist-ratio.js';
import { neckToWaistBack } from './neck-to-waist-back.js';
import { neckToWaistFront } from './neck-to-waist-front.js';
import { trouserRise } from './trouser-rise.js';

export const derivations: readonly Derivation[] = [
  neckToWaistFront,
  neckToWaistBack,
  bustMinusWaist,
  backOverFrontExcess,
  hemToWaistRatio,
  trouserRise,
];

/** Every derived value that the accepted values of a part allow, in the registry's order. */
export function deriveFromValues(
  kind: GarmentKind,
  values: ReadonlyMap<string, AcceptedValue>,
): readonly DerivedValue[] {
  return derivations
    .filter(({ kinds }) => kinds.includes(kind))
    .flatMap((entry) => derive(entry, values) ?? []);
}

export function deriveFromReadings(kind: GarmentKind, readings: readonly Reading[]): readonly DerivedValue[] {
  return deriveFromValues(kind, acceptedValues(readings));
}
