import type { Scene, SceneMark, ScenePrimitive, SceneRole } from './scene.js';

/** SVG attributes per role, for where no style sheet reaches: files, prints, previews. */
export type ScenePalette = Readonly<Partial<Record<SceneRole, Readonly<Record<string, string>>>>>;

const INK = '#17212B';
const INK_3 = '#5A6670';
const MADDER = '#A12830';
const WELL = '#ECEFEB';
const SHEET = '#FFFFFF';

const stroked = (stroke: string) => ({
  fill: 'none',
  stroke,
  'stroke-linejoin': 'round',
  'stroke-linecap': 'round',
});
const filled = (fill: string) => ({ fill, stroke: INK, 'stroke-linejoin': 'round' });
const lettered = (fill: string) => ({
  fill,
  'font-family': 'Inter, Arial, sans-serif',
  'font-weight': '600',
  'text-anchor': 'middle',
});

/** Ink on white, measuring lines in madder: the light look of the screens, for paper. */
export const paperPalette: Required<ScenePalette> = {
  cloth: filled(SHEET),
  piece: filled(SHEET),
  lining: filled(WELL),
  'piece-lining': filled(WELL),
  edge: stroked(INK),
  seam: stroked(INK),
  fold: stroked(INK_3),
  stitching: { fill: 'none', stroke: INK_3 },
  button: { fill: SHEET, stroke: INK },
  caption: { fill: '#414D58', 'font-family': 'Inter, Arial, sans-serif', 'text-anchor': 'middle' },
  halo: { fill: 'none', stroke: SHEET, 'stroke-opacity': '0.85' },
  line: { fill: 'none', stroke: MADDER },
  'line-current': { fill: 'none', stroke: MADDER },
  behind: { fill: 'none', stroke: MADDER, 'stroke-opacity': '0.75' },
  step: { fill: 'none', stroke: MADDER },
  arrow: { fill: MADDER },
  leader: { fill: 'none', stroke: MADDER },
  hit: { fill: 'none', stroke: 'none' },
  ring: { fill: SHEET, stroke: MADDER },
  'ring-current': { fill: MADDER, stroke: MADDER },
  'inner-ring': { fill: 'none', stroke: MADDER },
  'inner-ring-current': { fill: 'none', stroke: SHEET },
  letter: lettered(MADDER),
  'letter-current': lettered(SHEET),
};

export interface SvgOptions {
  /** With it the file stands alone; without it the roles' classes wait for a style sheet. */
  readonly palette?: ScenePalette;
}

/** The class that carries a role's colours in a style sheet. */
export const classOfRole = (role: SceneRole): string => `drawing-${role}`;

/** A scene as an SVG document. Holds no `style`, so it may also stand in a page under a strict policy. */
export function sceneToSvg(scene: Scene, { palette }: SvgOptions = {}): string {
  const size = `width="${scene.width}" height="${scene.height}" viewBox="0 0 ${scene.width} ${scene.height}"`;
  const clips = scene.clips.map(
    ({ id, paths }) =>
      `<clipPath id="${escaped(id)}">${paths.map((d) => `<path d="${d}"/>`).join('')}</clipPath>`,
  );
  const body = scene.primitives.map((primitive) => primitiveToSvg(primitive, palette)).join('');
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" ${size} role="img"><title>${escaped(scene.title)}</title>` +
    `<defs>${clips.join('')}</defs>${body}</svg>`
  );
}

function primitiveToSvg(primitive: ScenePrimitive, palette?: ScenePalette): string {
  if (primitive.type !== 'point') return markToSvg(primitive, palette);
  const marks = primitive.marks.map((mark) => markToSvg(mark, palette)).join('');
  return `<g data-point="${escaped(primitive.pointId)}">${marks}</g>`;
}

function markToSvg(mark: SceneMark, palette?: ScenePalette): string {
  const look = attributes({ class: classOfRole(mark.role), ...palette?.[mark.role] });
  if (mark.type === 'text') {
    return `<text${look}${attributes({ x: mark.x, y: mark.y, 'font-size': mark.size })}>${escaped(mark.text)}</text>`;
  }
  const stroke = mark.strokeWidth === 0 ? {} : { 'stroke-width': mark.strokeWidth };
  if (mark.type === 'circle') {
    return `<circle${look}${attributes({ cx: mark.cx, cy: mark.cy, r: mark.r, ...stroke })}/>`;
  }
  const dash = mark.dash === undefined ? {} : { 'stroke-dasharray': mark.dash };
  const clip = mark.clip === undefined ? {} : { 'clip-path': `url(#${mark.clip})` };
  return `<path${look}${attributes({ d: mark.d, ...stroke, ...dash, ...clip })}/>`;
}

const attributes = (values: Readonly<Record<string, string | number | undefined>>): string =>
  Object.entries(values)
    .filter(([, value]) => value !== undefined)
    .map(([name, value]) => ` ${name}="${escaped(String(value))}"`)
    .join('');

const ENTITIES: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };
const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => ENTITIES[sign] ?? sign);
