import type { Cloth } from '../cloths/cloth';
import { thetaOf } from '../bodices/bodice';
import { loft } from '../renderer/loft';
import { mix } from '../renderer/numbers';
import type { Layer, Scene } from '../renderer/scene';

export interface StandCollar {
  /** Heights of its foot and its upper edge, cm. */
  foot: number;
  top: number;
  /** Radii at the foot and the top: width and depth. */
  footHalf?: number;
  /** Depth before at the foot, cm; less than its half-width where the neck is hollow in front. */
  footFront?: number;
  topHalf?: number;
  middleZ?: number;
  lift?: number;
}

/** A collar that stands round the neck, a little lower in front. Its layer runs from the top (v 0) to the foot. */
export function layStandCollar(scene: Scene, collar: StandCollar, cloth: Cloth, inside: Cloth): Layer {
  const { foot, top, footHalf = 6.5, topHalf = 5.7, middleZ = -1.2, lift = 0.5 } = collar;
  const form = loft([
    {
      y: foot,
      half: footHalf,
      front: collar.footFront ?? footHalf * 0.93,
      back: footHalf * 0.88,
      cz: middleZ,
    },
    {
      y: (foot + top) / 2,
      half: mix(footHalf, topHalf, 0.7),
      front: mix(footHalf, topHalf, 0.7) * 0.92,
      back: mix(footHalf, topHalf, 0.7) * 0.91,
      cz: middleZ,
    },
    { y: top, half: topHalf, front: topHalf * 0.91, back: topHalf * 0.94, cz: middleZ - 0.1 },
  ]);
  const layer: Layer = (u, v, off, p) => {
    const theta = thetaOf(u);
    const upper = top - 0.5 * Math.exp(-theta * theta * 6);
    form(mix(upper, foot, v), theta, lift + 0.45 * v * v + 0.1 * Math.sin(v * Math.PI) + off, p);
    p.u = u * 40;
    p.v = v * (top - foot);
  };
  scene.layLayer({ cloth, across: 420, along: 70, closed: true }, layer);
  scene.lay({ cloth: inside, across: 240, along: 40, closed: true }, (u, v, p) =>
    layer(u, mix(0.02, 0.97, v), -0.35, p),
  );
  return layer;
}
