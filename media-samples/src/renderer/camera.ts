/** Where the camera stands and what it takes in. Lengths in cm, angles in degrees. */
export interface Camera {
  /** 0 is the front; 90 shows the wearer's left to the right of the picture's middle turned towards us; 180 the back. */
  yaw: number;
  /** How far the camera looks down. */
  pitch: number;
  distance: number;
  /** What lies in the middle of the picture, after turning: sideways and height. */
  lookAt: readonly [number, number];
  /** Height of the picture at the garment. */
  span: number;
  /** Width over height of the picture. */
  aspect: number;
}

export interface Projection {
  width: number;
  height: number;
  pxPerCm: number;
  sinPitch: number;
  cosPitch: number;
  /** Picture x, picture y and nearness of a turned place. */
  project(x: number, y: number, z: number, out: Float32Array, k: number): void;
}

export function projection(camera: Camera, width: number, height: number): Projection {
  const pitch = (camera.pitch * Math.PI) / 180;
  const sinPitch = Math.sin(pitch);
  const cosPitch = Math.cos(pitch);
  const pxPerCm = height / camera.span;
  const [cx, cy] = camera.lookAt;
  const project = (x: number, y: number, z: number, out: Float32Array, k: number): void => {
    const up = (y - cy) * cosPitch - z * sinPitch;
    const near = (y - cy) * sinPitch + z * cosPitch;
    const scale = (camera.distance / (camera.distance - near)) * pxPerCm;
    out[k] = width / 2 + (x - cx) * scale;
    out[k + 1] = height / 2 - up * scale;
    out[k + 2] = near;
  };
  return { width, height, pxPerCm, sinPitch, cosPitch, project };
}
