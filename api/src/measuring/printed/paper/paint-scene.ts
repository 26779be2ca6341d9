import type { Scene, SceneMark, ScenePath } from '@ellwand/shared/drawings/diagram/scene';
import { paperPalette } from '@ellwand/shared/drawings/diagram/scene-to-svg';

/** Where a drawing stands on the page, and how many points one of its pixels takes. */
export interface ScenePlace {
  readonly x: number;
  readonly y: number;
  readonly scale: number;
}

/** Paints a drawing as lines and letters, so that it stays sharp at any size and its letters can be read out. */
export function paintScene(doc: PDFKit.PDFDocument, scene: Scene, { x, y, scale }: ScenePlace): void {
  const clips = new Map(scene.clips.map(({ id, paths }) => [id, paths]));
  doc.save();
  doc.translate(x, y).scale(scale);
  for (const primitive of scene.primitives) {
    const marks = primitive.type === 'point' ? primitive.marks : [primitive];
    for (const mark of marks) paintMark(doc, mark, clips);
  }
  doc.restore();
}

type Clips = ReadonlyMap<string, readonly string[]>;

function paintMark(doc: PDFKit.PDFDocument, mark: SceneMark, clips: Clips): void {
  // What a finger has to meet on a screen is nothing on paper.
  if (mark.role === 'hit') return;
  if (mark.type === 'text') return setLetter(doc, mark);
  if (mark.type === 'circle') {
    doc.circle(mark.cx, mark.cy, mark.r);
    return ink(doc, mark);
  }
  const within = mark.clip === undefined ? undefined : clips.get(mark.clip);
  if (!within) {
    doc.path(mark.d);
    return ink(doc, mark, mark.dash);
  }
  // Cut off by several shapes at once, it is seen within any of them: painted once for each.
  for (const shape of within) paintWithin(doc, mark, shape);
}

function paintWithin(doc: PDFKit.PDFDocument, mark: ScenePath, shape: string): void {
  doc.save();
  doc.path(shape).clip();
  doc.path(mark.d);
  ink(doc, mark, mark.dash);
  doc.restore();
}

/** Fills and strokes the path at hand in the colours of its role. */
function ink(
  doc: PDFKit.PDFDocument,
  { role, strokeWidth }: Pick<SceneMark & { strokeWidth: number }, 'role' | 'strokeWidth'>,
  dash?: string,
): void {
  const look: Readonly<Record<string, string>> = paperPalette[role];
  const fill = colour(look['fill']);
  const stroke = strokeWidth > 0 ? colour(look['stroke']) : undefined;
  if (fill) doc.fillColor(fill, 1);
  if (stroke) {
    doc.lineWidth(strokeWidth).strokeColor(stroke, Number(look['stroke-opacity'] ?? 1));
    doc.lineCap(look['stroke-linecap'] === 'round' ? 'round' : 'butt');
    doc.lineJoin(look['stroke-linejoin'] === 'round' ? 'round' : 'miter');
    const steps = dash?.split(/[\s,]+/).map(Number) ?? [];
    const [length, space] = steps;
    if (length === undefined) doc.undash();
    else doc.dash(length, { space: space ?? length });
  }
  if (fill && stroke) doc.fillAndStroke();
  else if (fill) doc.fill();
  else doc.stroke();
}

const colour = (value: string | undefined) => (value === undefined || value === 'none' ? undefined : value);

function setLetter(doc: PDFKit.PDFDocument, mark: Extract<SceneMark, { type: 'text' }>): void {
  const look: Readonly<Record<string, string>> = paperPalette[mark.role];
  const face = look['font-weight'] === '600' ? 'sans-semibold-latin' : 'sans-latin';
  doc
    .font(face)
    .fontSize(mark.size)
    .fillColor(look['fill'] ?? '#000000', 1);
  const x = mark.x - doc.widthOfString(mark.text) / 2;
  doc.text(mark.text, x, mark.y, { baseline: 'alphabetic', lineBreak: false });
}
