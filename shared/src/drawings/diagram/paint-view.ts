import { pathData, transformed } from '../geometry/path.js';
import type { View } from './model.js';
import { projected, type Projection, type SheetPlace } from './projection.js';
import type { SceneClip, SceneMark } from './scene.js';
import type { ViewButton, ViewDrawing, ViewShape } from './view-shapes.js';

/** Pixels: outline and seam as the look asks, folds finer, and one that follows the size of the button. */
const STROKE = {
  cloth: 2.2,
  lining: 2.2,
  edge: 2.2,
  piece: 1.4,
  'piece-lining': 1.4,
  seam: 1.4,
  fold: 0.9,
  stitching: 0.9,
} as const;
const STITCH_DASH = '3 2.4';
const BUTTON = { stroke: 1.2, least: 1.6 } as const;
export const CAPTION_SIZE = 13;

export interface PaintedView {
  readonly clips: readonly SceneClip[];
  readonly marks: readonly SceneMark[];
}

/** A view's garment and caption on its place of the sheet, without measuring lines. */
export function paintView(view: View, drawing: ViewDrawing, place: SheetPlace, prefix: string): PaintedView {
  const clips = new ClipsOfView(drawing, place.projection, prefix);
  const marks = drawing.shapes.map((shape): SceneMark => {
    if (shape.kind === 'button') return paintButton(shape, place.projection);
    return paintShape(shape, place.projection, shape.clip && clips.idFor(shape.clip));
  });
  const [x, y] = place.captionAt;
  marks.push({ type: 'text', role: 'caption', x, y, size: CAPTION_SIZE, text: view.caption });
  return { clips: clips.all(), marks };
}

function paintShape(shape: ViewShape, projection: Projection, clip: string | undefined): SceneMark {
  return {
    type: 'path',
    role: shape.role,
    d: pathData(transformed(shape.path, projected(projection)), shape.closed),
    strokeWidth: STROKE[shape.role],
    ...(shape.role === 'stitching' ? { dash: STITCH_DASH } : {}),
    ...(clip === undefined ? {} : { clip }),
  };
}

function paintButton({ at, radius }: ViewButton, projection: Projection): SceneMark {
  const [cx, cy] = projected(projection)(at);
  const r = Math.max(BUTTON.least, radius * projection.scale);
  return {
    type: 'circle',
    role: 'button',
    cx: tenth(cx),
    cy: tenth(cy),
    r: tenth(r),
    strokeWidth: BUTTON.stroke,
  };
}

const tenth = (value: number): number => Math.round(value * 10) / 10;

/** Each union of outlines that something is cut off by, once. */
export class ClipsOfView {
  private readonly made = new Map<string, SceneClip>();

  constructor(
    private readonly drawing: ViewDrawing,
    private readonly projection: Projection,
    private readonly prefix: string,
  ) {}

  idFor({ from, to }: NonNullable<ViewShape['clip']>): string {
    const id = `${this.prefix}-${from}-${to}`;
    if (!this.made.has(id)) {
      const outlines = this.drawing.silhouettes.slice(from, to);
      const toSheet = projected(this.projection);
      this.made.set(id, { id, paths: outlines.map((path) => pathData(transformed(path, toSheet), true)) });
    }
    return id;
  }

  all(): SceneClip[] {
    return [...this.made.values()];
  }
}
