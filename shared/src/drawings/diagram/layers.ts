import type { PointId } from '../../points/measuring-points.js';
import type { Point } from '../geometry/point.js';
import type {
  ButtonLayer,
  LayerRole,
  MeasuringLine,
  MeasuringWay,
  ShapeLayer,
  Symmetry,
  ViewName,
  Within,
} from './model.js';

/* Short words for writing garments as data. */

type ShapeWord = (path: string, symmetry?: Symmetry, within?: Within) => ShapeLayer;

const shape =
  (role: LayerRole, usualSymmetry: Symmetry, usualWithin: Within): ShapeWord =>
  (path, symmetry = usualSymmetry, within = usualWithin) => ({ role, path, symmetry, within });

export const cloth = shape('cloth', 'joined', 'all');
export const lining = shape('lining', 'joined', 'all');
export const piece = shape('piece', 'joined', 'all');
export const pieceLining = shape('piece-lining', 'joined', 'all');
export const edge = shape('edge', 'both', 'all');
export const seam = shape('seam', 'both', 'cloth');
export const fold = shape('fold', 'both', 'cloth');
export const stitching = shape('stitching', 'both', 'cloth');

export const buttons = (
  at: readonly Point[],
  radius: number,
  symmetry: ButtonLayer['symmetry'] = 'once',
): ButtonLayer => ({ role: 'button', at, radius, symmetry });

/** `count` places evenly from one end to the other, both included. */
export const row = (count: number, from: Point, to: Point): Point[] =>
  Array.from({ length: count }, (_, index) => {
    const share = index / (count - 1);
    return [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share];
  });

type LineWord = (
  pointId: PointId,
  view: ViewName,
  path: string | readonly string[],
  more?: { readonly beside?: number; readonly sag?: number },
) => MeasuringLine;

const line =
  (way: MeasuringWay): LineWord =>
  (pointId, view, path, { beside = 0, sag = 0 } = {}) => ({
    pointId,
    view,
    way,
    stretches: typeof path === 'string' ? [path] : path,
    beside,
    sag,
  });

export const straightLine = line('straight');
export const alongCurve = line('curve');
export const allRound = line('round');
export const flatDoubled = line('doubled');
