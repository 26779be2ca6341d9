import { dye, plain, type Cloth, type Rgb } from '../cloths/cloth';
import { lining, metal, ribbon, thread } from '../cloths/cloths';
import { leaf } from '../motifs/motifs';
import { bell, ease, mix } from '../renderer/numbers';
import type { Noise } from '../renderer/noise';
import type { Scene } from '../renderer/scene';
import { line, tube, type Vec3 } from '../renderer/tube';

/**
 * The inside of a bodice, laid open: a waist tape over a striped lining, with a woven label of ornament (no words),
 * stitched at its ends, and a hook facing its eye. Centimetres; x along the tape, z towards the camera.
 */
export function layWaistTape(scene: Scene, noise: Noise): void {
  const base = (x: number, y: number): number =>
    0.55 * noise.layers(x * 0.13 + 4, y * 0.13, 3) +
    0.3 *
      (noise.fold(x * 0.16 + y * 0.07 + 30 + 0.5 * noise.at(x * 0.1, y * 0.1), 3) - 0.5) *
      ease(2, 7, Math.abs(y));
  const bow = (x: number): number => -0.0036 * x * x;
  const face = (x: number): number => base(x, 0) * 0.35 + 0.42;
  scene.lay({ cloth: stripedLining(), across: 900, along: 640 }, (u, v, p) => {
    p.x = mix(-19, 23, u);
    p.y = mix(15, -15, v);
    p.z = base(p.x, p.y) - 0.22 * bell(p.x, -7.9 + 0.12 * Math.sin(p.y * 0.4), 0.16);
    p.u = p.x;
    p.v = p.y;
  });
  scene.lay({ cloth: ribbon(dye('#ddd4c0')), across: 900, along: 120 }, (u, v, p) => {
    const across = mix(1.6, -1.6, v);
    p.x = mix(-21, 9.2, u);
    p.y = across + bow(p.x);
    p.z =
      face(p.x) +
      0.12 * bell(p.x, 8.6, 0.35) -
      0.25 * ease(9, 9.2, p.x) -
      0.12 * ease(1.5, 1.6, Math.abs(across));
    // The ribs of the tape run across it.
    p.u = v * 3.2;
    p.v = p.x;
  });
  layLabel(scene, -6, (x) => face(x) + 0.16, bow);
  const cotton = thread(dye('#9c8a68'));
  for (const [end, way] of [
    [-5.9, -1],
    [2.5, 1],
  ] as const)
    for (let i = 0; i < 9; i++) {
      const y = mix(1.05, -1.05, i / 8) + bow(end);
      stitch(
        scene,
        [end - way * 0.14, y, face(end) + 0.26],
        [end + way * 0.24, y - 0.1, face(end) + 0.04],
        cotton,
      );
    }
  for (const y of [1, 0.35, -0.35, -1])
    for (const lean of [1, -1])
      stitch(
        scene,
        [-8.25, y - 0.28 * lean, face(-8) + 0.1],
        [-7.6, y + 0.28 * lean, face(-8) + 0.1],
        cotton,
      );
  for (const y of [0.75, -0.75]) layHookAndEye(scene, y + bow(9), face(8) + 0.22, base(13, y) + 0.2, cotton);
}

function stripedLining(): Cloth {
  const cloth = lining(dye('#cdbb96'));
  return {
    ...cloth,
    openness: 1,
    colour: (u, v, out) => {
      cloth.colour(u, v, out);
      const stripe = u * 0.5 - Math.floor(u * 0.5);
      if (stripe < 0.045) for (let i = 0; i < 3; i++) out[i] = out[i]! * 0.68;
    },
  };
}

/** 1 gilt, 2 blue, 0 ground: scrolls and leaves either side of a rosette, between rules. */
function ornament(u: number, v: number): 0 | 1 | 2 {
  const x = Math.abs(u - 4.3);
  const y = v - 1.15;
  const high = Math.abs(y);
  if (Math.abs(high - 0.92) < 0.035 || Math.abs(high - 0.82) < 0.016) return 1;
  if (high > 0.8 || x > 3.95) return 0;
  const r = Math.hypot(x, y);
  if (r < 0.6) {
    if (r < 0.13 || Math.abs(r - 0.56) < 0.03) return 2;
    return r < 0.38 + 0.13 * Math.cos(Math.atan2(y, x) * 8) && r > 0.18 ? 1 : 0;
  }
  for (const [k, cx] of [1.15, 1.95, 2.7, 3.35].entries()) {
    const sx = x - cx;
    const sy = (k & 1 ? -y : y) + 0.05;
    const turn = (Math.atan2(sy, sx) + Math.PI) / (2 * Math.PI);
    if (Math.abs(Math.hypot(sx, sy) - 0.4 * (1 - k * 0.13) * (0.35 + 0.65 * turn)) < 0.04) return 1;
    if (Math.hypot(sx, sy) < 0.085 || leaf(sx, sy, 0.25, -0.42, 0.64, 0.24, 0.075) < 1) return 2;
  }
  return 0;
}

/** A label woven on a loom: every figure is drawn in whole picks. */
function layLabel(scene: Scene, left: number, face: (x: number) => number, bow: (x: number) => number): void {
  const inks: readonly Rgb[] = [dye('#dcd4c2'), dye('#9a7838'), dye('#2a3955')];
  const woven = plain({
    gloss: 0.4,
    tightness: 8,
    colour: (u, v, out) => {
      const ink = ornament(Math.round(u * 30) / 30, Math.round(v * 36) / 36);
      for (let i = 0; i < 3; i++)
        out[i] = inks[ink]![i]! * (ink ? 0.9 + 0.15 * Math.sin(v * 36 * Math.PI) : 1);
    },
    weave: { kind: 'rib', threads: 30, depth: 0.22 },
  });
  scene.lay({ cloth: woven, across: 500, along: 150 }, (u, v, p) => {
    const end = Math.min(u, 1 - u) * 8.6;
    p.x = left + 8.6 * u;
    p.y = mix(1.15, -1.15, v) + bow(p.x);
    p.z = face(p.x) + 0.1 * ease(0, 0.3, end) + 0.05 * Math.sin(u * 7 + v * 2) - 0.12 * ease(0.06, 0, end);
    p.u = u * 8.6;
    p.v = v * 2.3;
  });
}

function stitch(scene: Scene, from: Vec3, to: Vec3, cotton: Cloth): void {
  const middle: Vec3 = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2, Math.max(from[2], to[2]) + 0.08];
  const { layer } = tube({
    spine: line([from, middle, to]),
    radius: (t) => [0.05 * Math.sin(mix(0.5, 2.64, t)), 0.05 * Math.sin(mix(0.5, 2.64, t))],
    clothWidth: 0.3,
    facing: [0, 0.2, 1],
  });
  scene.layLayer({ cloth: cotton, across: 12, along: 14, closed: true }, layer);
}

const arc = (cx: number, cy: number, z: number, r: number, from: number, to: number, steps = 12): Vec3[] =>
  Array.from({ length: steps }, (_, i) => {
    const a = mix(from, to, i / (steps - 1));
    return [cx + r * Math.cos(a), cy + r * Math.sin(a), z];
  });

/** A bent wire hook sewn to the tape's end, and the eye it takes hold of, sewn to the lining. */
function layHookAndEye(scene: Scene, y: number, z: number, ze: number, cotton: Cloth): void {
  const steel = metal(dye('#7c766a'));
  const wire = (points: readonly Vec3[]): void => {
    const { layer } = tube({
      spine: line(points),
      radius: () => [0.085, 0.085],
      clothWidth: 0.5,
      facing: [0, 0.1, 1],
    });
    scene.layLayer({ cloth: steel, across: 24, along: 240, closed: true }, layer);
  };
  const PI = Math.PI;
  for (const s of [1, -1]) {
    const bend: Vec3[] =
      s > 0
        ? [
            [9.98, y, z + 0.42],
            [9.6, y, z + 0.52],
            [9, y, z + 0.47],
            [8.72, y, z + 0.36],
          ]
        : [[9.98, y, z + 0.42]];
    wire([
      ...arc(7.55, y + s * 0.36, z, 0.27, -s * PI * 0.35, s * PI * 1.45),
      [8.2, y + s * 0.11, z],
      [9.2, y + s * 0.1, z],
      [9.75, y + s * 0.09, z + 0.03],
      [10.02, y + s * 0.05, z + 0.16],
      ...bend,
    ]);
    for (let i = 0; i < 5; i++) {
      const a = (i / 5) * 2 * PI + 0.5;
      const at = (r: number, cx: number, cy: number, h: number): Vec3 => [
        cx + r * Math.cos(a),
        cy + r * Math.sin(a),
        h,
      ];
      stitch(scene, at(0.12, 7.55, y + s * 0.36, z + 0.04), at(0.46, 7.55, y + s * 0.36, z - 0.12), cotton);
      stitch(
        scene,
        at(0.12, 12.35, y + s * 0.42, ze + 0.04),
        at(0.45, 12.35, y + s * 0.42, ze - 0.12),
        cotton,
      );
    }
  }
  for (const x of [8.45, 8.6, 8.75]) stitch(scene, [x, y - 0.28, z - 0.08], [x, y + 0.28, z - 0.08], cotton);
  wire([
    ...arc(12.35, y + 0.42, ze, 0.26, -PI * 0.75, PI * 0.95),
    [11.75, y + 0.5, ze],
    ...arc(11.2, y, ze, 0.5, PI * 0.5, PI * 1.5, 14),
    [11.75, y - 0.5, ze],
    ...arc(12.35, y - 0.42, ze, 0.26, -PI * 0.95, PI * 0.75),
  ]);
}
