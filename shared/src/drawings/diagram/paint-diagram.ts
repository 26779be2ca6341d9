import type { WornSide } from '../../readings/worn-side.js';
import { boundsOf } from '../geometry/path.js';
import { stretchesOf } from './drawn-line.js';
import type { MeasuringLine, View } from './model.js';
import { measuringLineOf, type OwnLine } from './own-line.js';
import { linesOn, paintLines, type LetterOf, type Sheet } from './paint-lines.js';
import { paintView } from './paint-view.js';
import type { Scene } from './scene.js';
import { sheetOf, type SheetRequest } from './sheet-of.js';
import { mirroredLine, wornSideAt } from './worn-side.js';

export interface DiagramRequest extends SheetRequest {
  /** Only these measuring points are drawn; left out: those that have a letter. */
  readonly points?: readonly string[];
  /** The point being measured: its line is lit. */
  readonly current?: string;
  /** The wearer's side on which the current point is being read: its line is drawn there. */
  readonly wornSide?: WornSide;
  /** Lines that come with a museum's own points, painted like those of the diagram. */
  readonly ownLines?: readonly OwnLine[];
  /** Letter by point id, as in the rows of the table beside the diagram. */
  readonly letters: Readonly<Record<string, string>> | ReadonlyMap<string, string>;
  /** Before the ids of clips, where several diagrams share a page. */
  readonly idPrefix?: string;
}

/**
 * Paints a kind's measuring diagram: its views at one scale, each measuring line with its letter.
 * @returns undefined where there is no diagram, as for a set; a sheet then works by its table alone.
 */
export function paintDiagram(request: DiagramRequest): Scene | undefined {
  const sheet = sheetOf(request);
  if (!sheet) return undefined;
  const { diagram, views, drawings, layout } = sheet;
  const prefix = request.idPrefix ?? `diagram-${diagram.kind}`;
  const painted = views.map((view, index) =>
    paintView(view, drawings[index]!, layout.places[index]!, `${prefix}-${view.name}`),
  );
  const letterOf = letterFinder(request.letters);
  const lines = wantedLines(diagram.lines, request, letterOf).map((line) => onItsSide(line, request, sheet));
  const points = paintLines(linesOn(sheet, lines), sheet, letterOf, request.current);
  return {
    width: layout.width,
    height: layout.height,
    title: `${diagram.title}: ${views.map((view) => view.caption.toLowerCase()).join('; ')}`,
    clips: painted.flatMap((view) => view.clips),
    primitives: [...painted.flatMap((view) => view.marks), ...points],
  };
}

function wantedLines(
  lines: readonly MeasuringLine[],
  { points, ownLines = [] }: DiagramRequest,
  letterOf: LetterOf,
): MeasuringLine[] {
  const own = ownLines.flatMap((line) => measuringLineOf(line) ?? []);
  return [...lines, ...own].filter(({ pointId }) => points?.includes(pointId) ?? letterOf(pointId) !== '');
}

/** The current line on the side asked for; what lies across the centre is the same on both. */
function onItsSide(
  line: MeasuringLine,
  { current, wornSide }: DiagramRequest,
  { views }: Sheet,
): MeasuringLine {
  const view = views.find(({ name }) => name === line.view);
  if (!view || wornSide === undefined || line.pointId !== current) return line;
  const side = wornSideOf(line, view);
  return side === undefined || side === wornSide ? line : mirroredLine(line);
}

/** A line of one side may stray this far over the centre, as a share of its width: a curve that begins at the nape. */
const STRAY = 0.1;

/** The wearer's side on which a line is drawn; undefined for one that lies across the centre. */
export function wornSideOf(line: MeasuringLine, view: View): WornSide | undefined {
  const { left, right } = boundsOf(stretchesOf(line, view.anchors));
  const isAcross = Math.min(-left, right) > (right - left) * STRAY;
  return isAcross ? undefined : wornSideAt(view, left + right);
}

function letterFinder(letters: DiagramRequest['letters']): LetterOf {
  const byId = isMap(letters) ? letters : new Map(Object.entries(letters));
  return (pointId) => byId.get(pointId) ?? '';
}

const isMap = (letters: DiagramRequest['letters']): letters is ReadonlyMap<string, string> =>
  letters instanceof Map;
