import { type GarmentKind } from '../../points/kinds.js';
import { pathData, sampled, transformed } from '../geometry/path.js';
import { type Point } from '../geometry/point.js';
import { diagramFor } from '../kinds/diagram-for.js';
import { drawLine, type DrawnLine } from './drawn-line.js';
import { LetterSheet } from './letter-sheet.js';
import { lettersInOrder } from './letters-in-order.js';
import { type View, type ViewName } from './model.js';
import { placeLetters } from './place-letters.js';
import { pointMarks, type LetterStyle } from './point-marks.js';
import { layOut, projected, type SheetLayout } from './projection.js';
import { type Scene, type SceneClip, type SceneMark, type ScenePrimitive } from './scene.js';
import { drawView, type ViewDrawing } from './view-shapes.js';

export interface DiagramRequest {
  readonly kind: GarmentKind;
  /** In this order; left out: all that the kind has. */
  readonly views?: readonly ViewName[];
  /** Width of the sheet in CSS pixels, from about 320. */
  readonly widthPx: number;
  /** Only these measuring points are drawn; left out: all. */
  readonly points?: readonly string[];
  /** The point being measured: its line is lit. */
  readonly current?: string;
  /** Letter by point id, as in the table beside the diagram; left out: A, B, C… in the diagram's order. */
  readonly letters?: Readonly<Record<string, string>> | ReadonlyMap<string, string>;
  /** Before the ids of clips, where several diagrams share a page. */
  readonly idPrefix?: string;
}

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
const CAPTION_SIZE = 13;
/** Half the width of a character of the caption, on average, as a share of its size. */
const CAPTION_HALF_CHARACTER = 0.27;
const INK_STEP = 4;
const NARROW_SHEET = 520;

/**
 * Paints a kind's measuring diagram: its views at one scale, each measuring line with its letter.
 * @returns undefined for a kind that is not drawn yet; a sheet then works by its table alone.
 */
export function paintDiagram(request: DiagramRequest): Scene | undefined {
  const diagram = diagramFor(request.kind);
  if (!diagram) return undefined;
  const names = request.views ?? diagram.views.map((view) => view.name);
  const views = names.flatMap((name) => diagram.views.filter((view) => view.name === name));
  const drawings = views.map(drawView);
  const layout = layOut(drawings, request.widthPx, diagram.leastScale);
  const prefix = request.idPrefix ?? `diagram-${diagram.kind}`;

  const clips: SceneClip[] = [];
  const primitives: ScenePrimitive[] = [];
  views.forEach((view, index) => {
    const painted = paintView(view, drawings[index]!, layout.places[index]!, `${prefix}-${view.name}`);
    clips.push(...painted.clips);
    primitives.push(...painted.marks);
  });
  const wanted = diagram.lines.filter(({ pointId }) => request.points?.includes(pointId) ?? true);
  const lines = wanted.flatMap((line): DrawnLine[] => {
    const index = views.findIndex((view) => view.name === line.view);
    const [view, place] = [views[index], layout.places[index]];
    return view && place ? [drawLine(line, view.anchors, place.projection)] : [];
  });
  const order = diagram.lines.map((line) => line.pointId);
  primitives.push(...paintLines(lines, request, order, { views, drawings, layout }));
  const title = `${diagram.title}: ${views.map((view) => view.caption.toLowerCase()).join('; ')}`;
  return { width: layout.width, height: layout.height, title, clips, primitives };
}

type Place = SheetLayout['places'][number];

interface Sheet {
  readonly views: readonly View[];
  readonly drawings: readonly ViewDrawing[];
  readonly layout: SheetLayout;
}

function paintView(view: View, drawing: ViewDrawing, place: Place, prefix: string) {
  const toSheet = projected(place.projection);
  const clips = new Map<string, SceneClip>();
  const clipId = (clip: { from: number; to: number }): string => {
    const id = `${prefix}-${clip.from}-${clip.to}`;
    if (!clips.has(id)) {
      const outlines = drawing.silhouettes.slice(clip.from, clip.to);
      clips.set(id, { id, paths: outlines.map((path) => pathData(transformed(path, toSheet), true)) });
    }
    return id;
  };
  const marks = drawing.shapes.map((shape): SceneMark => {
    if (shape.kind === 'button') {
      const [cx, cy] = toSheet(shape.at).map((value) => Math.round(value * 10) / 10) as [number, number];
      const r = Math.round(Math.max(BUTTON.least, shape.radius * place.projection.scale) * 10) / 10;
      return { type: 'circle', role: 'button', cx, cy, r, strokeWidth: BUTTON.stroke };
    }
    return {
      type: 'path',
      role: shape.role,
      d: pathData(transformed(shape.path, toSheet), shape.closed),
      strokeWidth: STROKE[shape.role],
      ...(shape.role === 'stitching' ? { dash: STITCH_DASH } : {}),
      ...(shape.clip ? { clip: clipId(shape.clip) } : {}),
    };
  });
  const [x, y] = place.captionAt;
  marks.push({ type: 'text', role: 'caption', x, y, size: CAPTION_SIZE, text: view.caption });
  return { clips: [...clips.values()], marks };
}

function paintLines(
  lines: readonly DrawnLine[],
  request: DiagramRequest,
  order: readonly string[],
  sheet: Sheet,
): ScenePrimitive[] {
  const style: LetterStyle =
    request.widthPx < NARROW_SHEET ? { radius: 9, size: 11.5 } : { radius: 10, size: 12 };
  const given = request.letters ?? lettersInOrder(order);
  const letterOf = (pointId: string): string =>
    (given instanceof Map
      ? (given as ReadonlyMap<string, string>).get(pointId)
      : (given as Readonly<Record<string, string>>)[pointId]) ?? '';
  const letterSheet = new LetterSheet(sheet.layout, style.radius, lines, inkOf(sheet), captionsOf(sheet));
  const places = placeLetters(lines, letterSheet, style.radius);
  return lines.map((drawn, index) => {
    const letter = { text: letterOf(drawn.line.pointId), place: places[index] };
    return pointMarks(drawn, letter, style, drawn.line.pointId === request.current);
  });
}

/** Where outlines and seams run: letters rather stand on white. Folds and stitches do not count. */
function inkOf({ drawings, layout }: Sheet): Point[] {
  return drawings.flatMap((drawing, index) => {
    const toSheet = projected(layout.places[index]!.projection);
    return drawing.shapes.flatMap((shape): Point[] => {
      if (shape.kind === 'button') return [toSheet(shape.at)];
      if (shape.role === 'fold' || shape.role === 'stitching') return [];
      return sampled(transformed(shape.path, toSheet), INK_STEP);
    });
  });
}

function captionsOf({ views, layout }: Sheet): Point[][] {
  return views.map(({ caption }, index): Point[] => {
    const [x, y] = layout.places[index]!.captionAt;
    const half = caption.length * CAPTION_SIZE * CAPTION_HALF_CHARACTER;
    return [
      [x - half, y - CAPTION_SIZE / 3],
      [x + half, y - CAPTION_SIZE / 3],
    ];
  });
}
