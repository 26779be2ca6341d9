import sharp, { type Sharp } from 'sharp';
import type { Rgb } from '../cloths/cloth';
import { floorLight, wallLight, type Backdrop, type BoardLight } from './backdrop';
import { projection, type Camera, type Projection } from './camera';
import { expose, PER_PIXEL, type Film } from './film';
import { lightScene } from './light';
import { see } from './normals';
import { seededNoise } from './noise';
import type { Scene } from './scene';
import { shade, standpoint } from './shade';
import type { Vec3 } from './tube';

/** One picture to take of a scene. */
export interface Shot {
  camera: Camera;
  backdrop: Backdrop;
  /** Middle of what the lamps see; the camera's own by default. */
  lampsAt?: readonly [number, number];
  /** Half the width the lamps see, cm. */
  reach: number;
  /** Where shadows begin off the cloth, cm. */
  bias?: number;
  exposure?: number;
  keyTowards?: Vec3;
}

export interface Print {
  /** Size of the finished picture, px. */
  widthPx: number;
  heightPx: number;
  /** How many times larger it is drawn before it is brought down. */
  oversample: number;
}

const KEY: Vec3 = [-0.55, 0.62, 0.64];
/** The board's own colour, linear: a neutral grey paper with a breath of warmth. */
const BOARD = [0.78, 0.771, 0.748] as const;
/** Dyes of the time are quieter than a screen's own colours. */
const CALM = 0.84;
const grain = seededNoise(11);

/** Takes the picture and hands back its pixels, finished, as a sharp image. */
export function takePicture(scene: Scene, shot: Shot, print: Print): Sharp {
  const height = Math.round(print.heightPx * print.oversample);
  const width = Math.round(height * shot.camera.aspect);
  const view = projection(shot.camera, width, height);
  const seen = scene.sheets.map((sheet) =>
    see(sheet, (shot.camera.yaw * Math.PI) / 180, (shot.camera.pitch * Math.PI) / 180),
  );
  const keyTowards = shot.keyTowards ?? KEY;
  lightScene(seen, {
    keyTowards,
    keySamples: 24,
    fillSamples: 40,
    reach: shot.reach,
    middle: shot.lampsAt ?? shot.camera.lookAt,
    bias: shot.bias ?? 0.5,
  });
  const film = expose(seen, view);
  const board: BoardLight =
    shot.backdrop === 'floor'
      ? floorLight(seen, view, shot.camera.lookAt, shot.camera.span)
      : shot.backdrop === 'wall'
        ? wallLight(film)
        : () => 1;
  return sharp(develop(film, view, board, keyTowards, shot.exposure ?? 1), {
    raw: { width, height, channels: 3 },
  })
    .resize({ width: print.widthPx, height: print.heightPx, fit: 'fill', kernel: 'lanczos3' })
    .sharpen({ sigma: 0.5 });
}

/** Light to 8-bit sRGB, with highlights rolled off above 0.7 as film does. */
const TONE = Uint8Array.from({ length: 4097 }, (_, i) => {
  const light = i / 1024;
  const rolled = light < 0.7 ? light : 0.7 + (1 - Math.exp(-(light - 0.7) / 0.3)) * 0.3;
  return Math.round(255 * (rolled <= 0.0031308 ? 12.92 * rolled : 1.055 * Math.pow(rolled, 1 / 2.4) - 0.055));
});
const toned = (light: number): number => TONE[light <= 0 ? 0 : light >= 4 ? 4096 : (light * 1024 + 0.5) | 0]!;

function develop(
  film: Film,
  view: Projection,
  board: BoardLight,
  keyTowards: Vec3,
  exposure: number,
): Buffer {
  const { width, height } = film;
  const out = Buffer.alloc(width * height * 3);
  const from = standpoint(keyTowards, view.sinPitch, view.cosPitch, view.pxPerCm);
  const light: Rgb = [0, 0, 0];
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const p = y * width + x;
      const cloth = film.cloth[p]!;
      if (cloth > 0) {
        shade(film.cloths[cloth - 1]!, film.held, p * PER_PIXEL, from, light);
        const grey = 0.3 * light[0] + 0.59 * light[1] + 0.11 * light[2];
        for (let i = 0; i < 3; i++) out[p * 3 + i] = toned((grey + (light[i]! - grey) * CALM) * exposure);
      } else {
        const level =
          boardLevel(x / width, y / height) *
          board(x, y) *
          (1 + 0.012 * grain.layers((x / width) * 260, (y / width) * 260, 3));
        for (let i = 0; i < 3; i++) out[p * 3 + i] = toned(BOARD[i]! * level);
      }
    }
  }
  return out;
}

/** The board is brightest towards the lamp and falls off to the corners. */
function boardLevel(x: number, y: number): number {
  const side = x - 0.5;
  return 1 + 0.05 * (1 - y) - 0.22 * side * side - 0.05 * y * y * y - 0.035 * (side + 0.5) * (1 - 0.4 * y);
}
