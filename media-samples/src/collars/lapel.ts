import type { Cloth } from '../cloths/cloth';
import type { Loft } from '../renderer/loft';
import { clamp, ease, mix } from '../renderer/numbers';
import type { Layer, Scene } from '../renderer/scene';

export interface Lapel {
  form: Loft;
  /** Heights of the break, where the front begins to turn back, and of the gorge, where it meets the collar. */
  breakY: number;
  gorgeY: number;
  /** Angle of the turned edge at a height. */
  edge: (y: number) => number;
  /** Width of the turned-back front at shares 0 (break) to 1 (gorge), cm. */
  width: (t: number) => number;
  lift: number;
  side: 1 | -1;
}

/** A front turned back on the chest: u runs from the break up to the gorge, v from the turn outwards. */
export function lapelLayer(lapel: Lapel): Layer {
  return (u, v, lift, p) => {
    const y = mix(lapel.breakY, lapel.gorgeY, u);
    const wide = lapel.width(u) * v;
    // The outer edge slopes down a little, as the cloth does when it turns back.
    const lower = y - 0.22 * wide * ease(0.3, 1, u);
    const theta = lapel.edge(y) + wide / 14.5;
    const roll = 0.75 * Math.exp(-Math.pow(v / 0.22, 2)) + 0.25 + 0.3 * Math.sin(clamp(v) * Math.PI);
    lapel.form(lower, theta, lapel.lift + roll - 0.25 * ease(0.9, 1, v) + lift, p);
    p.x *= lapel.side;
    p.nx *= lapel.side;
    p.u = wide + 3;
    p.v = u * (lapel.gorgeY - lapel.breakY);
  };
}

export function layLapel(scene: Scene, lapel: Lapel, cloth: Cloth): Layer {
  const layer = lapelLayer(lapel);
  scene.layLayer({ cloth, across: 300, along: 110 }, layer);
  // The edge is turned: a thin roll keeps it from looking like paper.
  scene.lay({ cloth, across: 300, along: 10 }, (u, v, p) => layer(u, 1, -0.35 * v, p));
  return layer;
}
