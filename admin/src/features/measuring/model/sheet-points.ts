import { howLabels, type MeasuringPoint, sideLabels, type HandlingStep } from '@ellwand/shared/points/point';
import { lettersFor, pointIn } from '@ellwand/shared/protocols/protocol';
import { type ProtocolView, toProtocol } from '@ellwand/shared/records/protocol';

/** A measuring point as it stands on a sheet: with its letter, and whether the sheet waits for it. */
export interface SheetPoint {
  readonly id: string;
  readonly letter: string;
  readonly required: boolean;
  /** How many rounds the sheet asks for; the second and later ones are read blind. */
  readonly rounds: number;
  readonly point: MeasuringPoint;
  readonly step: HandlingStep;
}

/** The points of a sheet, in handling order. */
export function sheetPoints(view: ProtocolView, repeatPoints: readonly string[] = []): readonly SheetPoint[] {
  const protocol = toProtocol(view);
  const letters = lettersFor(protocol);
  return protocol.points.flatMap(({ pointId, required, rounds: asked }) => {
    const point = pointIn(protocol, pointId);
    if (!point) return [];
    const rounds = repeatPoints.includes(pointId) ? Math.max(2, asked) : asked;
    return [
      { id: pointId, letter: letters.get(pointId) ?? '', required, rounds, point, step: point.handlingStep },
    ];
  });
}

/** "Inside, round, from fastening to fastening." */
export function mannerOf({ point }: SheetPoint): string {
  return `${sideLabels[point.side]}, ${howLabels[point.how]}.`;
}

/** What is said when the work comes to a handling step: the garment is handled once for each. */
export const stepWords: Readonly<Record<HandlingStep, { readonly title: string; readonly words: string }>> = {
  'opened-inside': {
    title: 'Opened, inside: two people',
    words:
      'Undo only what opens without strain and lay the garment open. One reads, the other holds the end of the tape and steadies the cloth.',
  },
  'front-up': {
    title: 'Front up: two people',
    words: 'Close it as it closes and lay it front up, together. Let the table carry the weight.',
  },
  'back-up': {
    title: 'Turn over: two people',
    words: 'Turn it once, together, with a board or both hands beneath. Do not lift it by the shoulders.',
  },
};
