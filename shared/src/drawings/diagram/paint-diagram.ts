import { type GarmentKind } from '../../points/kinds.js';
import { sampled, transformed } from '../geometry/path.js';
import { type Point } from '../geometry/point.js';
import { diagramFor } from '../kinds/diagram-for.js';
import { drawLine, type DrawnLine } from './drawn-line.js';
import { LetterSheet } from './letter-sheet.js';
import { type View, type ViewName } from './model.js';
import { CAPTION_SIZE, paintView } from './paint-view.js';
import { placeLetters } from './place-letters.js';
import { pointMarks, type LetterStyle } from './point-marks.js';
import { layOut, projected, type SheetLayout } from './projection.js';
import { type Scene, type SceneClip, type ScenePrimitive } from './scene.js';
import { drawView, type ViewDrawing } from './view-shapes.js';

export interface DiagramRequest {
  readonly kind: GarmentKind;
  /** In this order; left out: all that the kind has. */
  readonly views?: readonly ViewName[];
  /** Width of the sheet in CSS pixels, from about 320. */
  readonly widthPx: number;
  /** Only these measuring points are drawn; left out: those that have a letter. */
  readonly points?: readonly string[];
  /** The point being measured: its line is lit. */
  readonly current?: string;
  /** Letter by point id, as in the rows of the table beside the diagram. */
  readonly letters: Readonly<Record<string, string>> | ReadonlyMap<string, string>;
  /** Before the ids of clips, where several diagrams share a page. */
  readonly idPrefix?: string;
}

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
  const letterOf = letterFinder(request.letters);
  const wanted = diagram.lines.filter(
    ({ pointId }) => request.points?.includes(pointId) ?? letterOf(pointId) !== '',
  );
  const lines = wanted.flatMap((line): DrawnLine[] => {
    const index = views.findIndex((view) => view.name === line.view);
    const [view, place] = [views[index], layout.places[index]];
    return view && place ? [drawLine(line, view.anchors, place.projection)] : [];
  });
  primitives.push(...paintLines(lines, request, letterOf, { views, drawings, layout }));
  const title = `${diagram.title}: ${views.map((view) => view.caption.toLowerCase()).join('; ')}`;
  return { width: layout.width, height: layout.height, title, clips, primitives };
}

type LetterOf = (pointId: string) => string;

function letterFinder(letters: DiagramRequest['letters']): LetterOf {
  const byId = isMap(letters) ? letters : new Map(Object.entries(letters));
  return (pointId) => byId.get(pointId) ?? '';
}

const isMap = (letters: DiagramRequest['letters']): letters is ReadonlyMap<string, string> =>
  letters instanceof Map;

interface Sheet {
  readonly views: readonly View[];
  readonly drawings: readonly ViewDrawing[];
  readonly layout: SheetLayout;
}

function paintLines(
  lines: readonly DrawnLine[],
  request: DiagramRequest,
  letterOf: LetterOf,
  sheet: Sheet,
): ScenePrimitive[] {
  const style: LetterStyle =
    request.widthPx < NARROW_SHEET ? { radius: 9, size: 11.5 } : { radius: 10, size: 12 };
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
