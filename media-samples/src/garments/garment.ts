import type { Scene } from '../renderer/scene';
import type { Shot } from '../renderer/picture';

export type View = 'front' | 'back' | 'side' | 'inside' | 'detail' | 'label';

export interface GarmentPicture {
  view: View;
  /** Ends the file's name: `front`, `back`, `detail-cuff`. */
  name: string;
  shot: Shot;
  /** A true sentence of what the picture shows. */
  alt: string;
  caption: string;
  /** Points of the meshes: 1 unless a close-up needs more. */
  fineness?: number;
  /** What is photographed, where it is not the whole garment. */
  build?: (scene: Scene) => void;
}

/** An invented garment of the demonstration. */
export interface Garment {
  /** Its number in the museum, `LH.1966.30`. */
  number: string;
  kind: string;
  build: (scene: Scene) => void;
  pictures: readonly GarmentPicture[];
}

const STANDING = { pitch: 5, distance: 900 } as const;

/** A garment standing on the floor, whole. */
export const standing = (
  yaw: number,
  framing: { lookAt: readonly [number, number]; span: number; aspect: number; reach?: number },
  more: Partial<Shot> = {},
): Shot => ({
  camera: { ...STANDING, yaw, lookAt: framing.lookAt, span: framing.span, aspect: framing.aspect },
  backdrop: 'floor',
  reach: framing.reach ?? 120,
  lampsAt: [0, framing.span * 0.45],
  ...more,
});

/** A garment hung before the board. */
export const hung = (
  yaw: number,
  framing: {
    lookAt: readonly [number, number];
    span: number;
    aspect: number;
    reach?: number;
    pitch?: number;
  },
  more: Partial<Shot> = {},
): Shot => ({
  camera: {
    yaw,
    pitch: framing.pitch ?? 5,
    distance: 600,
    lookAt: framing.lookAt,
    span: framing.span,
    aspect: framing.aspect,
  },
  backdrop: 'wall',
  reach: framing.reach ?? framing.span * 0.7,
  bias: 0.35,
  ...more,
});

/** A close-up of the garment as it stands. */
export const closeUp = (
  yaw: number,
  framing: { lookAt: readonly [number, number]; span: number; aspect: number; pitch?: number },
  more: Partial<Shot> = {},
): Shot => ({
  camera: {
    yaw,
    pitch: framing.pitch ?? 8,
    distance: 400,
    lookAt: framing.lookAt,
    span: framing.span,
    aspect: framing.aspect,
  },
  backdrop: 'wall',
  reach: Math.max(34, framing.span * 1.4),
  bias: 0.16,
  ...more,
});
