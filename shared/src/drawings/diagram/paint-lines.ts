import { sampled, transformed } from '../geometry/path.js';
import type { Point } from '../geometry/point.js';
import { drawLine, type DrawnLine } from './drawn-line.js';
import { LetterSheet } from './letter-sheet.js';
import type { MeasuringLine, View } from './model.js';
import { CAPTION_SIZE } from './paint-view.js';
import { crowdedPlace, placeLetters } from './place-letters.js';
import { pointMarks, type LetterStyle } from './point-marks.js';
import { isNarrow, projected, type SheetLayout } from './projection.js';
import type { ScenePoint } from './scene.js';
import type { ViewDrawing } from './view-shapes.js';

/** Half the width of a character of the caption, on average, as a share of its size. */
const CAPTION_HALF_CHARACTER = 0.27;
const INK_STEP = 4;

/** Empty for a point that has none. */
export type LetterOf = (pointId: string) => string;

/** The views and where they stand. */
export interface Sheet {
  readonly views: readonly View[];
  readonly drawings: readonly ViewDrawing[];
  readonly layout: SheetLayout;
}

/** The measuring lines that belong to one of the sheet's views, in pixels. */
export function linesOn({ views, layout }: Sheet, lines: readonly MeasuringLine[]): DrawnLine[] {
  return lines.flatMap((line): DrawnLine[] => {
    const index = views.findIndex((view) => view.name === line.view);
    const [view, place] = [views[index], layout.places[index]];
    return view && place ? [drawLine(line, view.anchors, place.projection)] : [];
  });
}

/** Lines with their letters, each where it is clear of everything else. */
export function paintLines(
  lines: readonly DrawnLine[],
  sheet: Sheet,
  letterOf: LetterOf,
  current: string | undefined,
): ScenePoint[] {
  const style: LetterStyle = isNarrow(sheet.layout.width)
    ? { radius: 9, size: 11.5 }
    : { radius: 10, size: 12 };
  const letterSheet = new LetterSheet(sheet.layout, style.radius, lines, inkOf(sheet), captionsOf(sheet));
  const places = placeLetters(lines, letterSheet, style.radius);
  lines.forEach((drawn, index) => {
    places[index] ??= crowdedPlace(drawn, places, style.radius);
  });
  return lines.map((drawn, index) => {
    const letter = { text: letterOf(drawn.line.pointId), place: places[index] };
    return pointMarks(drawn, letter, style, drawn.line.pointId === current);
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
