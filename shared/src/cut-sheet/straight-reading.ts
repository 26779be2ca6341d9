import { readingStep } from '../readings/reading-step.js';
import { layingUncertaintyMm, rootOfSquares, stepUncertaintyMm } from '../readings/uncertainty.js';
import type { LengthUnit } from '../units/format-length.js';

/** A length of a cut sheet as it is kept: as typed, with its exact millimetres. */
export interface LengthKept {
  readonly typed: string;
  readonly unit: LengthUnit;
  readonly mm: string;
}

/** Standard uncertainty in mm of one straight reading: the step it was read to, and how well a tape can be laid. */
export function straightUncertaintyMm(read: LengthKept): number {
  return rootOfSquares([
    stepUncertaintyMm(readingStep(read), 'straight'),
    layingUncertaintyMm('straight', 0),
  ]);
}
