import { diagramFor } from '../kinds/diagram-for.js';
import { type ViewName } from './model.js';
import { linesOn, paintLines, type LetterOf, type Sheet } from './paint-lines.js';
import { paintView } from './paint-view.js';
import { layOut } from './projection.js';
import { type Scene } from './scene.js';
import { drawView } from './view-shapes.js';

export interface DiagramRequest {
  readonly kind: string;
  /** In this order; left out: all that the kind has. */
  readonly views?: readonly ViewName[];
  /** Width of the sheet in CSS pixels, from about 320. */
  readonly widthPx: number;
  /** The sheet then stays within it, the garment smaller where it must be. */
  readonly mostHeightPx?: number;
  /** Only these measuring points are drawn; left out: those that have a letter. */
  readonly points?: readonly string[];
  /** The point being measured: its line is lit. */
  readonly current?: string;
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
  const diagram = diagramFor(request.kind);
  if (!diagram) return undefined;
  const names = request.views ?? diagram.views.map((view) => view.name);
  const views = names.flatMap((name) => diagram.views.filter((view) => view.name === name));
  const drawings = views.map(drawView);
  const layout = layOut(
    drawings,
    {
      width: request.widthPx,
      ...(request.mostHeightPx === undefined ? {} : { mostHeight: request.mostHeightPx }),
    },
    diagram.leastScale,
  );
  const prefix = request.idPrefix ?? `diagram-${diagram.kind}`;

  const painted = views.map((view, index) =>
    paintView(view, drawings[index]!, layout.places[index]!, `${prefix}-${view.name}`),
  );
  const sheet: Sheet = { views, drawings, layout };
  const letterOf = letterFinder(request.letters);
  const wanted = diagram.lines.filter(
    ({ pointId }) => request.points?.includes(pointId) ?? letterOf(pointId) !== '',
  );
  const points = paintLines(linesOn(sheet, wanted), sheet, letterOf, request.current);
  return {
    width: layout.width,
    height: layout.height,
    title: `${diagram.title}: ${views.map((view) => view.caption.toLowerCase()).join('; ')}`,
    clips: painted.flatMap((view) => view.clips),
    primitives: [...painted.flatMap((view) => view.marks), ...points],
  };
}

function letterFinder(letters: DiagramRequest['letters']): LetterOf {
  const byId = isMap(letters) ? letters : new Map(Object.entries(letters));
  return (pointId) => byId.get(pointId) ?? '';
}

const isMap = (letters: DiagramRequest['letters']): letters is ReadonlyMap<string, string> =>
  letters instanceof Map;
