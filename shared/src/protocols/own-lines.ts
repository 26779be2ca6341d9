/** The lines of a museum's own points on its diagram, and where a tap on the drawing lies on the garment. */
import { drawLine, type DrawnLine } from '../drawings/diagram/drawn-line.js';
import { type ViewName } from '../drawings/diagram/model.js';
import { paintDiagram, type DiagramRequest } from '../drawings/diagram/paint-diagram.js';
import { pointMarks } from '../drawings/diagram/point-marks.js';
import { isNarrow, layOut, type Projection } from '../drawings/diagram/projection.js';
import { type Scene, type ScenePoint, type ScenePrimitive } from '../drawings/diagram/scene.js';
import { drawView } from '../drawings/diagram/view-shapes.js';
import { placeAlong } from '../drawings/geometry/path.js';
import { distance, type Point } from '../drawings/geometry/point.js';
import { diagramFor } from '../drawings/kinds/diagram-for.js';
import { type ExtraLine } from './extra-lines.js';

export interface ProtocolScene {
  readonly scene: Scene;
  /** Where each view stands on the sheet. */
  readonly projections: ReadonlyMap<ViewName, Projection>;
}

/** The kind's diagram with a protocol's own lines on it; undefined where the kind is not drawn. */
export function paintProtocol(
  request: DiagramRequest,
  lines: readonly ExtraLine[],
): ProtocolScene | undefined {
  const scene = paintDiagram(request);
  const diagram = diagramFor(request.kind);
  if (!scene || !diagram) return undefined;
  const names = request.views ?? diagram.views.map(({ name }) => name);
  const views = names.flatMap((name) => diagram.views.filter((view) => view.name === name));
  const size = {
    width: request.widthPx,
    ...(request.mostHeightPx === undefined ? {} : { mostHeight: request.mostHeightPx }),
  };
  const { places } = layOut(views.map(drawView), size, diagram.leastScale);
  const projections = new Map(
    views.flatMap(({ name }, index) => {
      const place = places[index];
      return place ? [[name, place.projection] as const] : [];
    }),
  );
  const drawn: ScenePoint[] = [];
  for (const line of lines) {
    const projection = projections.get(line.view);
    const wanted = request.points?.includes(line.pointId) ?? letterIn(request.letters, line.pointId) !== '';
    if (!projection || !wanted || line.along.length < 2) continue;
    drawn.push(paintLine(line, projection, request, ringsOf([...scene.primitives, ...drawn])));
  }
  return { scene: { ...scene, primitives: [...scene.primitives, ...drawn] }, projections };
}

function paintLine(
  line: ExtraLine,
  projection: Projection,
  request: DiagramRequest,
  rings: readonly Point[],
): ScenePoint {
  const { pointId, view, way, along } = line;
  const join = way === 'straight' || way === 'doubled' ? '--' : '..';
  const path = along.map(([x, y]) => `${tenth(x)},${tenth(y)}`).join(join);
  const drawn = drawLine({ pointId, view, way, stretches: [path], beside: 0, sag: 0 }, {}, projection);
  const style = isNarrow(request.widthPx) ? { radius: 9, size: 11.5 } : { radius: 10, size: 12 };
  const letter = {
    text: letterIn(request.letters, pointId),
    place: letterPlace(drawn, rings, 2 * style.radius + 3),
  };
  return pointMarks(drawn, letter, style, pointId === request.current);
}

/** The middles of the letters that are there already. */
function ringsOf(primitives: readonly ScenePrimitive[]): Point[] {
  const marks = primitives.flatMap((each) => (each.type === 'point' ? each.marks : []));
  return marks.flatMap((mark): Point[] =>
    mark.type === 'circle' && mark.role.startsWith('ring') ? [[mark.cx, mark.cy]] : [],
  );
}

/** From the middle of the line outwards: the first place that leaves the letters there are alone. */
const SHARES = [0.5, 0.42, 0.58, 0.34, 0.66, 0.26, 0.74, 0.18, 0.82];

function letterPlace({ stretches: [path] }: DrawnLine, rings: readonly Point[], apart: number) {
  if (!path) return undefined;
  const places = SHARES.map((share) => placeAlong(path, share).at);
  const free = places.find((at) => rings.every((ring) => distance(at, ring) >= apart));
  return { at: free ?? placeAlong(path, 0.5).at, cost: 0 };
}

function letterIn(letters: DiagramRequest['letters'], pointId: string): string {
  if (letters instanceof Map) return (letters as ReadonlyMap<string, string>).get(pointId) ?? '';
  return (letters as Readonly<Record<string, string>>)[pointId] ?? '';
}

const tenth = (value: number): number => Math.round(value * 10) / 10;

/** The garment's whole millimetres beneath a place of the sheet. */
export function placeUnder(
  [x, y]: readonly [number, number],
  { scale, originX, originY }: Projection,
): readonly [number, number] {
  return [Math.round((x - originX) / scale), Math.round((y - originY) / scale)];
}
