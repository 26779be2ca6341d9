import type { Cloth } from '../cloths/cloth';
import type { Loft } from '../renderer/loft';
import { clamp, curve, ease, mix } from '../renderer/numbers';
import type { Layer, Scene } from '../renderer/scene';

export interface Shawl {
  form: Loft;
  /** Heights of the break in front, of the shoulder and of the neck behind. */
  breakY: number;
  shoulderY: number;
  backY: number;
  /** Angle of the turned edge at a height, up to the shoulder. */
  edge: (y: number) => number;
  /** Greatest width on the chest, and width behind, cm. */
  width: number;
  widthBehind: number;
  lift: number;
}

/** A collar in one with the turned fronts: from the break it goes up over the shoulder and round the neck. */
export function layShawl(scene: Scene, shawl: Shawl, cloth: Cloth): void {
  const wide = curve([
    [0, 0.3],
    [0.22, shawl.width * 0.75],
    [0.45, shawl.width],
    [0.72, shawl.widthBehind * 1.05],
    [1, shawl.widthBehind],
  ]);
  const OVER = 0.62;
  for (const side of [1, -1] as const) {
    const layer: Layer = (u, v, lift, p) => {
      const up = clamp(u / OVER);
      const round = clamp((u - OVER) / (1 - OVER));
      const y =
        u < OVER
          ? mix(shawl.breakY, shawl.shoulderY, up)
          : mix(shawl.shoulderY, shawl.backY, ease(0, 1, round));
      const theta = u < OVER ? shawl.edge(y) : mix(shawl.edge(shawl.shoulderY), Math.PI + 0.004, round);
      // Outwards on the chest, downwards behind the neck.
      const turn = (ease(0.42, 0.82, u) * Math.PI) / 2;
      const w = wide(u) * v;
      const roll = 0.8 * Math.exp(-Math.pow(v / 0.25, 2)) + 0.3 + 0.3 * Math.sin(v * Math.PI);
      shawl.form(
        y - w * Math.sin(turn),
        theta + (w * Math.cos(turn)) / 14.5,
        shawl.lift + roll - 0.25 * ease(0.9, 1, v) + lift,
        p,
      );
      p.x *= side;
      p.nx *= side;
      p.u = w + 2;
      p.v = u * 40;
    };
    scene.layLayer({ cloth, across: 420, along: 100 }, layer);
    scene.lay({ cloth, across: 420, along: 8 }, (u, v, p) => layer(u, 1, -0.4 * v, p));
  }
}
