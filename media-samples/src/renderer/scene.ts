import type { Cloth } from '../cloths/cloth';

/** One point of a layer of cloth: place in cm (y up, z towards the wearer's front) and cloth coordinates in cm. */
export interface Point {
  x: number;
  y: number;
  z: number;
  u: number;
  v: number;
  /** The direction off the face of the cloth, level with the floor unless a layer says otherwise. */
  nx: number;
  ny: number;
  nz: number;
}

export const newPoint = (): Point => ({ x: 0, y: 0, z: 0, u: 0, v: 0, nx: 0, ny: 0, nz: 1 });

/**
 * A layer of cloth on the figure: `u` runs round it and `v` from top to hem, both 0–1; the point lies `lift` cm off
 * its face. Whatever is sewn to a layer asks the same function, so that nothing pokes through.
 */
export type Layer = (u: number, v: number, lift: number, p: Point) => void;

/** A laid sheet: a grid of points. */
export interface Sheet {
  cloth: Cloth;
  across: number;
  along: number;
  closed: boolean;
  casts: boolean;
  /** Which side of the grid is the cloth's face: 1, -1, or 0 where it must be found from the shape. */
  facing: -1 | 0 | 1;
  place: Float32Array;
  onCloth: Float32Array;
  cut: Uint8Array;
}

export interface Laying {
  cloth: Cloth;
  /** Points round and down, at fineness 1. */
  across: number;
  along: number;
  /** Whether the last column joins the first. */
  closed?: boolean;
  /** Whether it throws a shadow; nets and laces do not. */
  casts?: boolean;
}

export class Scene {
  readonly sheets: Sheet[] = [];

  /** `fineness` multiplies the points of every sheet: 1 for a picture 2800 px high. */
  constructor(readonly fineness = 1) {}

  /** Lays a sheet; `at` gives the place of each point and returns false where the cloth is cut away. */
  lay(laying: Laying, at: (u: number, v: number, p: Point) => boolean | void): Sheet {
    const across = Math.max(4, Math.round(laying.across * (laying.across > 60 ? this.fineness : 1)));
    const along = Math.max(3, Math.round(laying.along * (laying.along > 60 ? this.fineness : 1)));
    const closed = laying.closed ?? false;
    const place = new Float32Array(across * along * 3);
    const onCloth = new Float32Array(across * along * 2);
    const cut = new Uint8Array(across * along);
    const p = newPoint();
    for (let j = 0, k = 0; j < along; j++) {
      for (let i = 0; i < across; i++, k++) {
        const kept = at(closed ? i / across : i / (across - 1), j / (along - 1), p);
        place.set([p.x, p.y, p.z], k * 3);
        onCloth[k * 2] = p.u;
        onCloth[k * 2 + 1] = p.v;
        if (kept === false) cut[k] = 1;
      }
    }
    const sheet: Sheet = {
      cloth: laying.cloth,
      across,
      along,
      closed,
      casts: laying.casts ?? true,
      facing: 0,
      place,
      onCloth,
      cut,
    };
    this.sheets.push(sheet);
    return sheet;
  }

  /** Lays a whole layer. A layer knows which way its face looks, so the sheet is told. */
  layLayer(laying: Laying, layer: Layer, lift = 0): void {
    const sheet = this.lay(laying, (u, v, p) => layer(u, v, lift, p));
    sheet.facing = facingOf(sheet, layer, lift);
  }

  /** Lays a layer that is open down its middle (u 0.5) as two halves, so that no cloth is drawn across the opening. */
  layHalves(laying: Laying, layer: Layer, lift = 0): void {
    const half = { ...laying, across: Math.round(laying.across / 2) };
    this.layLayer(half, (u, v, off, p) => layer(u * 0.49999, v, off, p), lift);
    this.layLayer(half, (u, v, off, p) => layer(0.50001 + u * 0.49999, v, off, p), lift);
  }
}

/** Compares the grid's own turn with the layer's normals at a few dozen places and takes the majority. */
function facingOf(sheet: Sheet, layer: Layer, lift: number): -1 | 1 {
  const { across, along, closed, place } = sheet;
  const p = newPoint();
  let sum = 0;
  for (let n = 0; n < 64; n++) {
    const i = Math.floor((((n * 0.618) % 1) * 0.96 + 0.02) * (across - 1));
    const j = Math.floor(((n + 0.5) / 64) * (along - 1));
    const k = (j * across + i) * 3;
    const right = k + 3;
    const down = k + across * 3;
    layer(closed ? i / across : i / (across - 1), j / (along - 1), lift, p);
    const a = [
      place[right]! - place[k]!,
      place[right + 1]! - place[k + 1]!,
      place[right + 2]! - place[k + 2]!,
    ] as const;
    const b = [
      place[down]! - place[k]!,
      place[down + 1]! - place[k + 1]!,
      place[down + 2]! - place[k + 2]!,
    ] as const;
    const turn =
      (a[1] * b[2] - a[2] * b[1]) * p.nx +
      (a[2] * b[0] - a[0] * b[2]) * p.ny +
      (a[0] * b[1] - a[1] * b[0]) * p.nz;
    sum += Math.sign(turn);
  }
  return sum < 0 ? -1 : 1;
}
