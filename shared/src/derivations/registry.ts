import type { GarmentKind } from '../points/kinds.js';
import type { Reading } from '../readings/reading.js';
import { backOverFrontExcess } from './back-over-front-excess.js';
import { bustMinusWaist } from './bust-minus-waist.js';
import type { Derivation, DerivedValue } from './derivation.js';
import { easeBetweenLayers } from './ease-between-layers.js';
import { hemToWaistRatio } from './hem-to-waist-ratio.js';
import { neckToWaistBack } from './neck-to-waist-back.js';
import { neckToWaistFront } from './neck-to-waist-front.js';
import { type DeriveContext, partFigures } from './part-figures.js';
import { sleeveFullness } from './sleeve-fullness.js';
import { smallestGirth } from './smallest-girth.js';
import { sumOfPanels } from './sum-of-panels.js';
import { trouserRise } from './trouser-rise.js';
import { wholeFromHalf } from './whole-from-half.js';

export const derivations: readonly Derivation[] = [
  neckToWaistFront,
  neckToWaistBack,
  bustMinusWaist,
  backOverFrontExcess,
  hemToWaistRatio,
  sleeveFullness,
  trouserRise,
  smallestGirth,
  easeBetweenLayers,
  wholeFromHalf,
  sumOfPanels,
];

/** Every derived value that the readings of a part, and what is known beside them, allow; in the registry's order. */
export function deriveFromReadings(
  kind: GarmentKind,
  readings: readonly Reading[],
  context: DeriveContext = {},
): readonly DerivedValue[] {
  const part = partFigures(kind, readings, context);
  return derivations.filter(({ kinds }) => kinds.includes(kind)).flatMap(({ workOut }) => workOut(part));
}
