import type { Cloth } from '../cloths/cloth';
import { thetaOf } from '../bodices/bodice';
import type { Noise } from '../renderer/noise';
import type { Layer, Scene } from '../renderer/scene';

export interface Pelerine {
  /** Heights of the neck edge and of the lower edge before, at the shoulder and behind, cm. */
  neckY: number;
  dropFront: number;
  dropSide: number;
  dropBack: number;
  /** How far the lower edge reaches from the neck: to the sides, before and behind, cm. */
  reachSide: number;
  reachFront: number;
  reachBack: number;
  neckHalf: number;
  /** Ripples of the free edge and how high, cm. */
  ripples: number;
  rippleHeight: number;
  /** Half the angle left open in front, at the neck and at the edge. */
  openAt?: number;
  opens?: number;
  length: number;
  depth: number;
}

/** A flat collar or bertha that lies over the shoulders: v runs from the neck to its edge. */
export function pelerineLayer(noise: Noise, c: Pelerine): Layer {
  return (u, v, lift, p) => {
    const { openAt = 0, opens = 0 } = c;
    const gap = openAt + opens * v;
    const raw = thetaOf(u);
    // The front opening is made by drawing the cloth apart, so that its edges stay clean.
    const theta = Math.sign(raw) * (gap + Math.abs(raw) * (1 - gap / Math.PI));
    const s = Math.sin(theta);
    const cosine = Math.cos(theta);
    const aside = Math.pow(Math.abs(s), 1.3);
    const before = Math.max(0, cosine);
    const behind = Math.max(0, -cosine);
    const drop =
      c.dropSide * aside + (before > 0 ? c.dropFront * before * before : c.dropBack * behind * behind);
    const ripple =
      c.rippleHeight *
      v *
      (Math.sin(u * 2 * Math.PI * c.ripples + 1.7 * noise.at(u * 9, 1)) + 0.4 * noise.at(u * 14, v));
    const out = Math.pow(v, 0.82);
    p.x = (c.neckHalf + (c.reachSide * aside + 1.5) * out) * s + s * (lift + ripple * 0.4);
    p.z =
      -1.5 +
      (c.neckHalf * 0.86 + (before > 0 ? c.reachFront : c.reachBack) * out) * cosine +
      cosine * (lift + ripple * 0.5);
    p.y = c.neckY - 1.6 * before - drop * Math.pow(v, 1.35) + ripple * 0.5 + lift * 0.7;
    p.nx = s * 0.7;
    p.ny = 0.7;
    p.nz = cosine * 0.7;
    p.u = u * c.length;
    p.v = v * c.depth;
  };
}

export function layPelerine(scene: Scene, noise: Noise, c: Pelerine, cloth: Cloth, across = 1300): Layer {
  const layer = pelerineLayer(noise, c);
  scene.layHalves({ cloth, across, along: 150 }, layer);
  return layer;
}
