import { joinedWithMirror, mirrored, boundsOf, type CubicPath } from '../geometry/path.js';
import { pathFrom } from '../geometry/path-language.js';
import type { Box, Point } from '../geometry/point.js';
import type { ButtonLayer, LayerRole, ShapeLayer, View, Within } from './model.js';

/** One shape of a view as it stands on the garment, in millimetres. */
export interface ViewShape {
  readonly kind: 'shape';
  readonly role: LayerRole;
  readonly path: CubicPath;
  readonly closed: boolean;
  /** How many of the view's filled shapes bound it: its clip is the union of those. Undefined: not cut off. */
  readonly clip?: { readonly from: number; readonly to: number };
}

export interface ViewButton {
  readonly kind: 'button';
  readonly at: Point;
  readonly radius: number;
}

export interface ViewDrawing {
  readonly shapes: readonly (ViewShape | ViewButton)[];
  /** Outlines of the filled shapes in order of painting; clips count in them. */
  readonly silhouettes: readonly CubicPath[];
  readonly bounds: Box;
}

const FILLED: ReadonlySet<LayerRole> = new Set(['cloth', 'lining', 'piece', 'piece-lining']);

export const isFilled = (role: LayerRole): boolean => FILLED.has(role);

/** Resolves a view's layers: halves joined or mirrored, each line told which outlines cut it off. */
export function drawView(view: View): ViewDrawing {
  const shapes: (ViewShape | ViewButton)[] = [];
  const silhouettes: CubicPath[] = [];
  let lastFrom = 0;
  for (const layer of view.layers) {
    if (layer.role === 'button') {
      shapes.push(...buttonsOf(layer));
      continue;
    }
    const paths = pathsOf(layer, view);
    const clip = clipOf(layer.within, lastFrom, silhouettes.length);
    const closed = isFilled(layer.role);
    if (closed) {
      lastFrom = silhouettes.length;
      silhouettes.push(...paths);
    }
    shapes.push(
      ...paths.map((path) => ({ kind: 'shape' as const, role: layer.role, path, closed, ...clip })),
    );
  }
  return { shapes, silhouettes, bounds: boundsOf(shapes.flatMap((shape) => reachOf(shape))) };
}

/** What may show: filled shapes and lines that nothing cuts off (ties, hooks). */
const reachOf = (shape: ViewShape | ViewButton): CubicPath[] =>
  shape.kind === 'shape' && !shape.clip ? [shape.path] : [];

function pathsOf(layer: ShapeLayer, view: View): CubicPath[] {
  const path = pathFrom(layer.path, view.anchors);
  if (layer.symmetry === 'joined') return [joinedWithMirror(path)];
  return layer.symmetry === 'both' ? [path, mirrored(path)] : [path];
}

function buttonsOf({ at, radius, symmetry }: ButtonLayer): ViewButton[] {
  const places: readonly Point[] = symmetry === 'both' ? [...at, ...at.map(([x, y]): Point => [-x, y])] : at;
  return places.map((place) => ({ kind: 'button', at: place, radius }));
}

function clipOf(within: Within, lastFrom: number, count: number): Pick<ViewShape, 'clip'> {
  if (within === 'all' || count === 0) return {};
  return { clip: { from: within === 'last' ? lastFrom : 0, to: count } };
}
