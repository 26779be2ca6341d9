import { distance, type Point } from '../geometry/point.js';
import type { MeasuringLine, MeasuringWay, ViewName } from './model.js';

/** A measuring line that the kind's diagram does not have: it comes with a point a museum made for itself. */
export interface OwnLine {
  readonly pointId: string;
  readonly view: ViewName;
  readonly way: MeasuringWay;
  /** Two to `MOST_PLACES` places in the view's millimetres, x then y: two are joined straight, more by one curve. */
  readonly along: readonly (readonly [x: number, y: number])[];
}

/** More places than these, and a hand has drawn a picture rather than laid a tape. */
export const MOST_PLACES = 12;

/** Of a round's length, how far it bows before and behind the garment; in millimetres at least and at most. */
const SAG = { share: 0.05, least: 4, most: 18 } as const;

/** As the diagram's own lines are written; undefined where it is a point rather than a line. */
export function measuringLineOf({ pointId, view, way, along }: OwnLine): MeasuringLine | undefined {
  // A place tapped twice has no direction for a curve to take.
  const places = along
    .map(([x, y]): Point => [hundredth(x), hundredth(y)])
    .filter((place, index, all) => index === 0 || distance(place, all[index - 1]!) > 0);
  const [from, to] = [places[0], places.at(-1)];
  if (!from || !to || places.length < 2) return undefined;
  const stretch = places.map(([x, y]) => `${x},${y}`).join('..');
  const isArc = way === 'round' && places.length === 2;
  const sag = isArc ? Math.min(SAG.most, Math.max(SAG.least, distance(from, to) * SAG.share)) : 0;
  return { pointId, view, way, stretches: [stretch], beside: 0, sag };
}

/** The path language knows no exponents. */
const hundredth = (value: number): number => Math.round(value * 100) / 100 + 0;
