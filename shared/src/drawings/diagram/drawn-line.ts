import {
  endOf,
  mirrored,
  parallel,
  pathLength,
  sampled,
  startOf,
  transformed,
  type CubicPath,
} from '../geometry/path.js';
import { pathFrom, type Anchors } from '../geometry/path-language.js';
import type { Point } from '../geometry/point.js';
import { smoothThrough } from '../geometry/spline.js';
import type { MeasuringLine } from './model.js';
import { projected, type Projection } from './projection.js';

/** A measuring line on the sheet, in pixels. */
export interface DrawnLine {
  readonly line: MeasuringLine;
  /** Solid, in front; more than one where the tape steps over to the next piece. */
  readonly stretches: readonly CubicPath[];
  /** The thin return of a round behind the garment. */
  readonly behind?: CubicPath;
  /** Where the tape steps from one stretch to the next. */
  readonly steps: readonly (readonly [Point, Point])[];
  /** Everything a foreign letter must keep clear of. */
  readonly trace: readonly Point[][];
  readonly length: number;
}

const TRACE_STEP = 2;
/** Behind, the tape bows less than in front: we look down on it a little. */
const BEHIND_SHARE = 0.8;

export function drawLine(line: MeasuringLine, anchors: Anchors, projection: Projection): DrawnLine {
  const toSheet = projected(projection);
  const stretches = stretchesOf(line, anchors).map((stretch) => {
    const path = transformed(stretch, toSheet);
    return parallel(line.sag > 0 ? bowed(path, line.sag * projection.scale) : path, line.beside);
  });
  const behind = line.sag > 0 ? bowed(stretches[0]!, -line.sag * projection.scale * BEHIND_SHARE) : undefined;
  const steps = stretches.slice(1).map((next, index) => [endOf(stretches[index]!), startOf(next)] as const);
  const trace = [...stretches, ...(behind ? [behind] : [])].map((path) => sampled(path, TRACE_STEP));
  return {
    line,
    stretches,
    ...(behind ? { behind } : {}),
    steps,
    trace: [...trace, ...steps.map((step) => [...step])],
    length: stretches.reduce((sum, path) => sum + pathLength(path), 0),
  };
}

/** A line's solid paths in the view's millimetres. */
export const stretchesOf = ({ stretches, onOtherHalf }: MeasuringLine, anchors: Anchors): CubicPath[] =>
  stretches.map((text) => (onOtherHalf ? mirrored(pathFrom(text, anchors)) : pathFrom(text, anchors)));

/** The tape between the path's two ends, hanging `sag` pixels below them (above, when negative). */
function bowed(path: CubicPath, sag: number): CubicPath {
  const [from, to] = [startOf(path), endOf(path)];
  return smoothThrough([from, [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2 + sag], to]);
}
