import { viewBounds } from '@ellwand/shared/protocols/view-bounds';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { OwnPointView } from '@ellwand/shared/records/protocol';

export type Line = OwnPointView['line'];
export type Place = Line['along'][number];

/** As many places as a line may go through. */
export const MOST_PLACES = 12;

/** Onto the drawing, in whole millimetres: a line off the garment would show nothing. */
export function onDrawing(kind: GarmentKind, view: Line['view'], [x, y]: readonly [number, number]): Place {
  const bounds = viewBounds(kind, view);
  if (!bounds) return [Math.round(x), Math.round(y)];
  const within = (value: number, least: number, most: number) =>
    Math.min(most, Math.max(least, Math.round(value)));
  return [within(x, bounds.left, bounds.right), within(y, bounds.top, bounds.bottom)];
}

export function withPlace(line: Line, place: Place): Line {
  return line.along.length >= MOST_PLACES ? line : { ...line, along: [...line.along, place] };
}

export function withPlaceAt(line: Line, index: number, place: Place): Line {
  return { ...line, along: line.along.map((each, at) => (at === index ? place : each)) };
}

export function withoutPlace(line: Line, index: number): Line {
  return { ...line, along: line.along.filter((_, at) => at !== index) };
}

/** Where a place is put that nobody has tapped: a little way on from the last, else the middle of the drawing. */
export function nextPlace(kind: GarmentKind, { view, along }: Line): Place {
  const bounds = viewBounds(kind, view);
  const last = along.at(-1);
  if (!bounds) return last ?? [0, 0];
  const middle: Place = [(bounds.left + bounds.right) / 2, (bounds.top + bounds.bottom) / 2];
  if (!last) return onDrawing(kind, view, middle);
  const step = (bounds.bottom - bounds.top) / 8;
  const down = onDrawing(kind, view, [last[0], last[1] + step]);
  return down[1] === last[1] ? onDrawing(kind, view, [last[0], last[1] - step]) : down;
}
