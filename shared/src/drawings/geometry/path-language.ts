import { straight, type Cubic } from './cubic.js';
import type { CubicPath } from './path.js';
import type { Point } from './point.js';
import { smoothThrough } from './spline.js';

/** Named places of a view that its outlines, seams and measuring lines share. */
export type Anchors = Readonly<Record<string, Point>>;

interface Knot {
  readonly at: Point;
  arriving?: number;
  leaving?: number;
  corner: boolean;
}

interface Figure {
  readonly knots: Knot[];
  readonly joins: ('..' | '--')[];
}

const TOKEN = /\s*(?:(\.\.|--)|\{(-?[\d.]+)\}|(!)|(~?[A-Za-z]\w*)|(-?\d+(?:\.\d+)?),(-?\d+(?:\.\d+)?))/y;

/**
 * Reads a path written as knots and joins: `tip{105}..143,-292..{55}underarm!--waist`.
 *
 * `..` curves smoothly to the next knot, `--` runs straight. A knot is `x,y` in millimetres or an anchor's
 * name; `~name` is the anchor on the other half. `{degrees}` before a knot is the direction of arriving, after
 * it of leaving (0 right, 90 down); one of them serves for both unless the knot is a corner, marked `!`.
 * @throws SyntaxError for an unknown anchor or a stray sign, naming the path.
 */
export function pathFrom(text: string, anchors: Anchors = {}): CubicPath {
  const figure = read(text, anchors);
  const { knots, joins } = figure;
  const pieces: Cubic[] = [];
  let from = 0;
  while (from < joins.length) {
    if (joins[from] === '--') {
      pieces.push(straight(knots[from]!.at, knots[from + 1]!.at));
      from += 1;
      continue;
    }
    const to = endOfRun(figure, from);
    pieces.push(
      ...smoothThrough(
        knots.slice(from, to + 1).map((knot) => knot.at),
        {
          leaving: leavingAt(figure, from),
          arriving: arrivingAt(figure, to),
        },
      ),
    );
    from = to;
  }
  return pieces;
}

/** A smooth run goes on until a straight piece, a corner, or a knot whose direction is given. */
function endOfRun({ knots, joins }: Figure, from: number): number {
  let to = from + 1;
  while (to < joins.length && joins[to] === '..' && isPlain(knots[to]!)) to++;
  return to;
}

const isPlain = (knot: Knot): boolean =>
  !knot.corner && knot.arriving === undefined && knot.leaving === undefined;

function leavingAt({ knots, joins }: Figure, index: number): number | undefined {
  const knot = knots[index]!;
  const smooth = !knot.corner && joins[index - 1] === '..';
  return knot.leaving ?? (smooth ? knot.arriving : undefined);
}

function arrivingAt({ knots, joins }: Figure, index: number): number | undefined {
  const knot = knots[index]!;
  const smooth = !knot.corner && joins[index] === '..';
  return knot.arriving ?? (smooth ? knot.leaving : undefined);
}

function read(text: string, anchors: Anchors): Figure {
  const figure: Figure = { knots: [], joins: [] };
  let arriving: number | undefined;
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.trimEnd().length) {
    const found = TOKEN.exec(text);
    if (!found) throw new SyntaxError(`Stray sign in the path "${text}".`);
    const [, join, degrees, corner, name, x, y] = found;
    const open = figure.knots.length > figure.joins.length ? figure.knots.at(-1) : undefined;
    if (join === '..' || join === '--') figure.joins.push(join);
    else if (degrees !== undefined && open) open.leaving = Number(degrees);
    else if (degrees !== undefined) arriving = Number(degrees);
    else if (corner !== undefined && open) open.corner = true;
    else {
      const at: Point = name === undefined ? [Number(x), Number(y)] : anchorNamed(name, anchors, text);
      figure.knots.push({ at, corner: false, ...(arriving === undefined ? {} : { arriving }) });
      arriving = undefined;
    }
  }
  if (figure.knots.length !== figure.joins.length + 1 || figure.joins.length === 0) {
    throw new SyntaxError(`Knots and joins do not alternate in the path "${text}".`);
  }
  return figure;
}

function anchorNamed(name: string, anchors: Anchors, text: string): Point {
  const other = name.startsWith('~');
  const anchor = anchors[other ? name.slice(1) : name];
  if (!anchor) throw new SyntaxError(`No anchor "${name}" for the path "${text}".`);
  return other ? [-anchor[0], anchor[1]] : anchor;
}
