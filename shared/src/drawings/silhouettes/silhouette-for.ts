import type { GarmentKind } from '../../points/kinds.js';
import { buttons, row, seam } from '../diagram/layers.js';
import type { Scene, ScenePrimitive } from '../diagram/scene.js';
import { ClipsOfView } from '../diagram/paint-view.js';
import { drawView } from '../diagram/view-shapes.js';
import type { View } from '../diagram/model.js';
import { projected, type Projection } from '../diagram/projection.js';
import { pathData, transformed } from '../geometry/path.js';
import { bodiceFront } from '../kinds/bodice-front.js';
import { dressFront } from '../kinds/dress-front.js';
import { skirtFront } from '../kinds/skirt-front.js';
import { glove, hat, shoe } from './accessories.js';
import { chemise, childDress, corset } from './body-linen.js';
import { bustle, crinoline } from './cages.js';
import { cape, coat, jacket, waistcoat } from './coats.js';
import { breeches, petticoat, trousers } from './legs.js';
import { shirt } from './shirt.js';
import { outlinesOf } from './silhouette.js';

const silhouettes: Readonly<Record<GarmentKind, View>> = {
  dress: outlinesOf(
    dressFront,
    seam('0,852{0}..{-9}376,816'),
    seam('0,896{0}..{-9}384,858'),
    seam('26,30{84}..{86}62,560'),
    seam('64,30{68}..{81}176,420'),
    seam('150,-352{118}..{106}34,-30'),
    seam('310,-60{-100}..{-140}226,-160'),
    seam('352,-60{-86}..{-104}356,-170'),
  ),
  bodice: outlinesOf(
    bodiceFront,
    buttons(row(8, [0, -312], [0, 104]), 4),
    seam('dartInner{101}..43,0{92}..{87}46,130'),
    seam('dartOuter{103}..77,0{91}..{77}90,118'),
  ),
  skirt: outlinesOf(
    skirtFront,
    seam('0,898{0}..{22}190,924..{46}404,1068', 'both', 'cloth'),
    seam('50,6{80}..{82}96,300{82}..{84}147,905'),
  ),
  coat,
  jacket,
  waistcoat,
  trousers,
  breeches,
  cape,
  shirt,
  chemise,
  corset,
  crinoline,
  bustle,
  petticoat,
  'child-dress': childDress,
  hat,
  glove,
  shoe,
};

/** A kind's front in outline, in millimetres. */
export const silhouetteFor = (kind: GarmentKind): View => silhouettes[kind];

export interface SilhouetteRequest {
  readonly kind: GarmentKind;
  /** Give every kind the same, and a shoe stands truly small beside a coat. */
  readonly pxPerMm: number;
  /** Before the ids of clips. */
  readonly idPrefix?: string;
}

const STROKE = { outline: 1.6, line: 1, button: 0.9 } as const;
const EDGE = 2;
const LEAST_BUTTON = 0.8;

/** The silhouette as a scene cut to its size: no letters, no caption, no title (its name stands beside it). */
export function paintSilhouette({
  kind,
  pxPerMm,
  idPrefix = `silhouette-${kind}`,
}: SilhouetteRequest): Scene {
  const drawing = drawView(silhouetteFor(kind));
  const { bounds } = drawing;
  const projection: Projection = {
    scale: pxPerMm,
    originX: EDGE - bounds.left * pxPerMm,
    originY: EDGE - bounds.top * pxPerMm,
  };
  const toSheet = projected(projection);
  const clips = new ClipsOfView(drawing, projection, idPrefix);
  const primitives = drawing.shapes.map((shape): ScenePrimitive => {
    if (shape.kind === 'button') {
      const [cx, cy] = toSheet(shape.at).map((value) => Math.round(value * 10) / 10) as [number, number];
      const r = Math.max(LEAST_BUTTON, shape.radius * pxPerMm);
      return { type: 'circle', role: 'button', cx, cy, r, strokeWidth: STROKE.button };
    }
    return {
      type: 'path',
      role: shape.role,
      d: pathData(transformed(shape.path, toSheet), shape.closed),
      strokeWidth: shape.closed ? STROKE.outline : STROKE.line,
      ...(shape.clip ? { clip: clips.idFor(shape.clip) } : {}),
    };
  });
  return {
    width: Math.ceil((bounds.right - bounds.left) * pxPerMm + 2 * EDGE),
    height: Math.ceil((bounds.bottom - bounds.top) * pxPerMm + 2 * EDGE),
    title: '',
    clips: clips.all(),
    primitives,
  };
}
