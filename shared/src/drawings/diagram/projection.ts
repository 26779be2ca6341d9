import type { Box, Point } from '../geometry/point.js';

/** From the garment's millimetres to the sheet's pixels. */
export interface Projection {
  readonly scale: number;
  readonly originX: number;
  readonly originY: number;
}

export const projected =
  ({ scale, originX, originY }: Projection) =>
  ([x, y]: Point): Point => [originX + x * scale, originY + y * scale];

/** Back again: the garment's millimetres beneath a place of the sheet. */
export const unprojected =
  ({ scale, originX, originY }: Projection) =>
  ([x, y]: Point): Point => [(x - originX) / scale, (y - originY) / scale];

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
const LARGEST_SCALE = 1.4;

const widthOf = ({ bounds }: SheetView): number => bounds.right - bounds.left;

export interface SheetSize {
  readonly width: number;
  /** What the sheet must not grow beyond; left out: it is as high as its width asks. */
  readonly mostHeight?: number;
}

/**
 * Sets the views out in rows, in their order, at one scale: as few rows as keep `leastScale`, else one view to
 * a row. Views of one row share their top in millimetres, so that waist stands beside waist.
 */
export function layOut(views: readonly SheetView[], size: SheetSize, leastScale: number): SheetLayout {
  const narrow = isNarrow(size.width);
  const side = narrow ? MARGIN.narrowSide : MARGIN.side;
  const gap = narrow ? MARGIN.narrowBetween : MARGIN.between;
  const scaleOf = (rows: SheetRows): number =>
    Math.min(
      LARGEST_SCALE,
      scaleOfHeight(rows, size.mostHeight),
      ...rows.map((row) => scaleOfRow(row, size.width - 2 * side, gap)),
    );
  const arrangements = inRows(views);
  const fits = arrangements.find((rows) => scaleOf(rows) >= leastScale);
  const rows =
    fits ??
    arrangements.reduce(
      (best, rows) => (scaleOf(rows) > scaleOf(best) ? rows : best),
      views.length === 0 ? [] : [views],
    );
  return placeRows(rows, size.width, scaleOf(rows), gap);
}

type SheetRows = readonly (readonly SheetView[])[];

function heightOfRow(row: readonly SheetView[]): number {
  const highest = Math.min(...row.map((view) => view.bounds.top));
  return Math.max(...row.map((view) => view.bounds.bottom)) - highest;
}

function scaleOfHeight(rows: SheetRows, mostHeight = Infinity): number {
  const room = mostHeight - rows.length * (MARGIN.top + MARGIN.caption) - 1;
  return room / rows.reduce((sum, row) => sum + heightOfRow(row), 0);
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

function placeRows(rows: SheetRows, width: number, scale: number, gap: number): SheetLayout {
  const places: SheetPlace[] = [];
  let top = 0;
  for (const row of rows) {
    const highest = Math.min(...row.map((view) => view.bounds.top));
    const used = row.reduce((sum, view) => sum + widthOf(view) * scale, 0) + gap * (row.length - 1);
    let left = (width - used) / 2;
    const bottom = top + MARGIN.top + heightOfRow(row) * scale + MARGIN.caption;
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
