import { howLabels, type MeasuringPoint, sideLabels } from '@ellwand/shared/points/point';

/** Where the tape goes, in one line: from where to where, on which face, and how. */
export function pointWords({ from, to, side, how }: MeasuringPoint): string {
  return `${from} to ${to}; ${sideLabels[side].toLowerCase()}, ${howLabels[how]}.`;
}
