import { type Box, type Point } from '../geometry/point.js';

/** From the garment's millimetres to the sheet's pixels. */
export interface Projection {
  readonly scale: number;
  readonly originX: number;
  readonly originY: number;
}

export const projected =
  ({ scale, originX, originY }: Projection) =>
  ([x, y]: Point): Point => [originX + x * scale, originY + y * scale];

export interface SheetView {
  /** The drawing's bounds in millimetres. */
  readonly bounds: Box;
}

export interface SheetPlace {
  readonly projection: Projection;
  readonly captionAt: Point;
}

export interface SheetLayout {
  readonly width: number;
  readonly height: number;
  readonly places: readonly SheetPlace[];
}

/** Room round the views, in pixels: letters and lines beside edges stand in it. */
const MARGIN = { side: 34, narrowSide: 26, top: 34, between: 46, narrowBetween: 36, caption: 44 } as const;
const NARROW_SHEET = 520;

/** On a phone letters are a little smaller and margins thinner. */
export const isNarrow = (sheetWidth: number): boolean => sheetWidth < NARROW_SHEET;

/** Beyond this a view only grows, and says no more. */
const LARGEST_SCALE = 0.95;

const widthOf = ({ bounds }: SheetView): number => bounds.right - bounds.left;

/**
 * Sets the views out in rows, in their order, at one scale: as few rows as keep `leastScale`, else one view to
 * a row. Views of one row share their top in millimetres, so that waist stands beside waist.
 */
export function layOut(views: readonly SheetView[], sheetWidth: number, leastScale: number): SheetLayout {
  const narrow = isNarrow(sheetWidth);
  const side = narrow ? MARGIN.narrowSide : MARGIN.side;
  const gap = narrow ? MARGIN.narrowBetween : MARGIN.between;
  const scaleOf = (rows: readonly (readonly SheetView[])[]): number =>
    Math.min(LARGEST_SCALE, ...rows.map((row) => scaleOfRow(row, sheetWidth - 2 * side, gap)));
  const arrangements = inRows(views);
  const fits = arrangements.find((rows) => scaleOf(rows) >= leastScale);
  const rows = fits ?? arrangements.at(-1) ?? [];
  return placeRows(rows, sheetWidth, scaleOf(rows), gap);
}

const scaleOfRow = (row: readonly SheetView[], room: number, gap: number): number =>
  (room - gap * (row.length - 1)) / row.reduce((sum, view) => sum + widthOf(view), 0);

/** All ways of breaking the views into rows, fewest rows first, the fuller row on top. */
function inRows(views: readonly SheetView[]): SheetView[][][] {
  if (views.length === 0) return [];
  const ways: SheetView[][][] = [];
  for (let first = views.length; first >= 1; first--) {
    const rest = inRows(views.slice(first));
    const top = views.slice(0, first);
    ways.push(...(rest.length === 0 ? [[top]] : rest.map((rows) => [top, ...rows])));
  }
  return ways.sort((a, b) => a.length - b.length);
}

function placeRows(
  rows: readonly (readonly SheetView[])[],
  width: number,
  scale: number,
  gap: number,
): SheetLayout {
  const places: SheetPlace[] = [];
  let top = 0;
  for (const row of rows) {
    const highest = Math.min(...row.map((view) => view.bounds.top));
    const lowest = Math.max(...row.map((view) => view.bounds.bottom));
    const used = row.reduce((sum, view) => sum + widthOf(view) * scale, 0) + gap * (row.length - 1);
    let left = (width - used) / 2;
    const bottom = top + MARGIN.top + (lowest - highest) * scale + MARGIN.caption;
    for (const view of row) {
      const originX = left - view.bounds.left * scale;
      const projection = { scale, originX, originY: top + MARGIN.top - highest * scale };
      places.push({ projection, captionAt: [left + (widthOf(view) * scale) / 2, bottom - 8] });
      left += widthOf(view) * scale + gap;
    }
    top = bottom;
  }
  return { width, height: Math.ceil(top), places };
}
