import { type Cloth } from '../cloths/cloth';

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
  lay(laying: Laying, at: (u: number, v: number, p: Point) => boolean | void): void {
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
    this.sheets.push({
      cloth: laying.cloth,
      across,
      along,
      closed,
      casts: laying.casts ?? true,
      place,
      onCloth,
      cut,
    });
  }

  /** Lays a whole layer. */
  layLayer(laying: Laying, layer: Layer, lift = 0): void {
    this.lay(laying, (u, v, p) => layer(u, v, lift, p));
  }

  /** Lays a layer that is open down its middle (u 0.5) as two halves, so that no cloth is drawn across the opening. */
  layHalves(laying: Laying, layer: Layer, lift = 0): void {
    const half = { ...laying, across: Math.round(laying.across / 2) };
    this.lay(half, (u, v, p) => layer(u * 0.49999, v, lift, p));
    this.lay(half, (u, v, p) => layer(0.50001 + u * 0.49999, v, lift, p));
  }
}
