/**
 * What a drawing consists of once it stands on its sheet: plain data in pixels, painted by whoever shows it.
 * Classes and SVG attributes only, never `style`, so that a strict content security policy holds.
 */
export interface Scene {
  readonly width: number;
  readonly height: number;
  /** For `<title>`: what is seen. */
  readonly title: string;
  readonly clips: readonly SceneClip[];
  /** In order of painting. */
  readonly primitives: readonly ScenePrimitive[];
}

/** A clipPath: whatever names it is seen only within the union of its paths. */
export interface SceneClip {
  readonly id: string;
  readonly paths: readonly string[];
}

export type SceneRole =
  | 'cloth'
  | 'lining'
  | 'piece'
  | 'piece-lining'
  | 'edge'
  | 'seam'
  | 'fold'
  | 'stitching'
  | 'button'
  | 'caption'
  | 'halo'
  | 'line'
  | 'line-current'
  | 'behind'
  | 'step'
  | 'arrow'
  | 'leader'
  | 'hit'
  | 'ring'
  | 'ring-current'
  | 'inner-ring'
  | 'inner-ring-current'
  | 'letter'
  | 'letter-current';

export interface ScenePath {
  readonly type: 'path';
  readonly role: SceneRole;
  readonly d: string;
  /** In pixels; 0 for a shape that is only filled. */
  readonly strokeWidth: number;
  readonly dash?: string;
  /** Id of the clip that cuts it off. */
  readonly clip?: string;
  readonly pointId?: string;
}

export interface SceneCircle {
  readonly type: 'circle';
  readonly role: SceneRole;
  readonly cx: number;
  readonly cy: number;
  readonly r: number;
  readonly strokeWidth: number;
  readonly pointId?: string;
}

export interface SceneText {
  readonly type: 'text';
  readonly role: SceneRole;
  readonly x: number;
  readonly y: number;
  readonly size: number;
  readonly text: string;
  readonly pointId?: string;
}

export type SceneMark = ScenePath | SceneCircle | SceneText;

/** A measuring line with its letter: one thing to point at, light and choose. */
export interface ScenePoint {
  readonly type: 'point';
  readonly pointId: string;
  readonly letter: string;
  readonly view: string;
  readonly current: boolean;
  readonly marks: readonly SceneMark[];
}

export type ScenePrimitive = SceneMark | ScenePoint;
