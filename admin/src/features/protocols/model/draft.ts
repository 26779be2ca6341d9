import { handlingSteps, type HandlingStep, type MeasuringPoint } from '@ellwand/shared/points/point';
import { askablePoints, lettersFor, pointIn, type Protocol } from '@ellwand/shared/protocols/protocol';
import {
  type OwnPointView,
  type ProtocolPointView,
  type ProtocolView,
  toProtocol,
} from '@ellwand/shared/records/protocol';
import type { z } from 'zod';

export type AskedPoint = z.infer<typeof ProtocolPointView>;

/** A protocol in the making. Own points that are dropped stay known here, so that they can come back. */
export type Draft = Pick<ProtocolView, 'kind' | 'wornTogether' | 'version' | 'points' | 'ownPoints'>;

/** A point as a row of the editor. */
export interface DraftRow {
  readonly asked: AskedPoint;
  readonly point: MeasuringPoint;
  readonly letter: string;
  readonly isOwn: boolean;
}

export interface Band {
  readonly step: HandlingStep;
  readonly rows: readonly DraftRow[];
}

/** The draft as it would be made: without own points that nothing asks for. */
export function ready(draft: Draft): Draft {
  const asked = new Set(draft.points.map(({ pointId }) => pointId));
  return { ...draft, ownPoints: draft.ownPoints.filter(({ id }) => asked.has(id)) };
}

/** The domain's protocol, own points that wait included. */
export const protocolOf = (draft: Draft): Protocol => toProtocol(draft);

/** The rows in the three handling bands, in order. */
export function bandsOf(draft: Draft): readonly Band[] {
  const protocol = protocolOf(draft);
  const letters = lettersFor(protocol);
  const rows = draft.points.flatMap((asked): DraftRow[] => {
    const point = pointIn(protocol, asked.pointId);
    if (!point) return [];
    const isOwn = draft.ownPoints.some(({ id }) => id === asked.pointId);
    return [{ asked, point, letter: letters.get(asked.pointId) ?? '', isOwn }];
  });
  return handlingSteps.map((step) => ({
    step,
    rows: rows.filter(({ point }) => point.handlingStep === step),
  }));
}

/** What could be asked for and is not: the catalogue's points of the kind, and own points made before. */
export function notAsked(draft: Draft): readonly MeasuringPoint[] {
  const asked = new Set(draft.points.map(({ pointId }) => pointId));
  const protocol = protocolOf(draft);
  return [...protocol.ownPoints, ...askablePoints(draft)].filter(({ id }) => !asked.has(id));
}

/** Those whose name or definition holds every word, whatever its case. */
export function searched(points: readonly MeasuringPoint[], words: string): readonly MeasuringPoint[] {
  const wanted = words.toLowerCase().split(/\s+/).filter(Boolean);
  return points.filter(({ name, definition }) => {
    const text = `${name} ${definition}`.toLowerCase();
    return wanted.every((word) => text.includes(word));
  });
}

/** At the end of its handling step, so that the garment is still turned once. */
export function withPoint(draft: Draft, pointId: string): Draft {
  const point = pointIn(protocolOf(draft), pointId);
  if (!point || draft.points.some((asked) => asked.pointId === pointId)) return draft;
  const added: AskedPoint = { pointId, required: false, rounds: 1 };
  const points = bandsOf(draft).flatMap(({ step, rows }) => [
    ...rows.map(({ asked }) => asked),
    ...(step === point.handlingStep ? [added] : []),
  ]);
  return { ...draft, points };
}

export function withoutPoint(draft: Draft, pointId: string): Draft {
  return { ...draft, points: draft.points.filter((asked) => asked.pointId !== pointId) };
}

/** One place up (-1) or down (1) within its handling step; unmoved at the step's end. */
export function moved(draft: Draft, pointId: string, by: -1 | 1): Draft {
  const points = bandsOf(draft).flatMap(({ rows }) => {
    const asked = rows.map((row) => row.asked);
    const from = asked.findIndex((each) => each.pointId === pointId);
    const [here, there] = [asked[from], asked[from + by]];
    if (here && there) {
      asked[from] = there;
      asked[from + by] = here;
    }
    return asked;
  });
  return { ...draft, points };
}

export function withAsking(
  draft: Draft,
  pointId: string,
  asking: Partial<Omit<AskedPoint, 'pointId'>>,
): Draft {
  const points = draft.points.map((asked) => (asked.pointId === pointId ? { ...asked, ...asking } : asked));
  return { ...draft, points };
}

/** Puts an own point in, or its better definition in the place of the one before; asked for in its handling step. */
export function withOwnPoint(draft: Draft, own: OwnPointView): Draft {
  const others = draft.ownPoints.filter(({ id }) => id !== own.id);
  const before = draft.points.find(({ pointId }) => pointId === own.id);
  const sameStep = draft.ownPoints.some(
    ({ id, handlingStep }) => id === own.id && handlingStep === own.handlingStep,
  );
  const defined = { ...draft, ownPoints: [...others, own] };
  if (before && sameStep) return defined;
  const placed = withPoint(withoutPoint(defined, own.id), own.id);
  return before ? withAsking(placed, own.id, before) : placed;
}
