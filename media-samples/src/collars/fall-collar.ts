import type { Cloth } from '../cloths/cloth';
import { loft } from '../renderer/loft';
import { mix } from '../renderer/numbers';
import type { Noise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';

export interface FallCollar {
  /** Heights of the foot, of the roll at the back and of the fallen edge at the back, cm. */
  foot: number;
  roll: number;
  fall: number;
  /** Half the angle open in front, and how much lower the roll lies there. */
  opens: number;
  drop: number;
  half: number;
  middleZ?: number;
}

/** A collar that stands and then falls over, as on a man's coat. v runs from the foot over the roll to the edge. */
export function layFallCollar(scene: Scene, noise: Noise, c: FallCollar, cloth: Cloth): Layer {
  const z = c.middleZ ?? -1.9;
  const form = loft([
    { y: 0, half: c.half + 1, front: c.half + 0.8, back: c.half + 0.6, cz: z },
    { y: 0.55, half: c.half, front: c.half + 0.3, back: c.half - 0.2, cz: z - 0.3 },
    { y: 1, half: c.half - 0.2, front: c.half + 0.4, back: c.half - 0.3, cz: z - 0.5 },
  ]);
  const layer: Layer = (u, v, lift, p) => {
    const theta = mix(c.opens, 2 * Math.PI - c.opens, u);
    const behind = 0.5 - 0.5 * Math.cos(theta);
    const up = v < 0.42 ? v / 0.42 : v < 0.56 ? 1 : 1 - (v - 0.56) / 0.44;
    const over = v < 0.42 ? 0 : v < 0.56 ? (1 - Math.cos(((v - 0.42) / 0.14) * Math.PI)) / 2 : 1;
    const crown = v > 0.42 && v < 0.56 ? 0.6 * Math.sin(((v - 0.42) / 0.14) * Math.PI) : 0;
    const low = v < 0.5 ? c.foot : c.fall;
    const out = 0.2 + over * (1.3 + 2.4 * Math.pow(1 - up, 1.2)) + 0.2 * noise.at(u * 5, v * 2) * over;
    form(up, theta, out + lift, p);
    p.y = mix(low, c.roll, up) + crown - c.drop * (1 - behind) * up - (1 - behind) * (v >= 0.5 ? 0.8 : 0);
    p.u = u * 52;
    p.v = v * 19;
  };
  scene.layLayer({ cloth, across: 640, along: 220 }, layer);
  return layer;
}
