import type { Sheet } from './scene';

/** A sheet turned to face the camera: places and directions off the cloth in the camera's own space. */
export interface Seen {
  sheet: Sheet;
  place: Float32Array;
  normal: Float32Array;
  key: Float32Array;
  fill: Float32Array;
}

function turned(sheet: Sheet, yaw: number): Float32Array {
  const c = Math.cos(yaw);
  const s = Math.sin(yaw);
  const { place } = sheet;
  const out = new Float32Array(place.length);
  for (let k = 0; k < place.length; k += 3) {
    const x = place[k]!;
    const z = place[k + 2]!;
    out[k] = x * c + z * s;
    out[k + 1] = place[k + 1]!;
    out[k + 2] = z * c - x * s;
  }
  return out;
}

function crossNormals(sheet: Sheet, w: Float32Array): Float32Array {
  const { across, along, closed } = sheet;
  const normal = new Float32Array(w.length);
  for (let j = 0; j < along; j++) {
    const up = Math.max(0, j - 1) * across;
    const down = Math.min(along - 1, j + 1) * across;
    for (let i = 0; i < across; i++) {
      const left = (j * across + (i > 0 ? i - 1 : closed ? across - 1 : 0)) * 3;
      const right = (j * across + (i < across - 1 ? i + 1 : closed ? 0 : i)) * 3;
      const a = (up + i) * 3;
      const b = (down + i) * 3;
      const ux = w[right]! - w[left]!;
      const uy = w[right + 1]! - w[left + 1]!;
      const uz = w[right + 2]! - w[left + 2]!;
      const vx = w[b]! - w[a]!;
      const vy = w[b + 1]! - w[a + 1]!;
      const vz = w[b + 2]! - w[a + 2]!;
      const nx = uy * vz - uz * vy;
      const ny = uz * vx - ux * vz;
      const nz = ux * vy - uy * vx;
      const length = Math.sqrt(nx * nx + ny * ny + nz * nz);
      const k = (j * across + i) * 3;
      // Where a sheet closes to a point there is no direction; straight up is as good as any.
      normal[k] = length > 1e-12 ? nx / length : 0;
      normal[k + 1] = length > 1e-12 ? ny / length : 1;
      normal[k + 2] = length > 1e-12 ? nz / length : 0;
    }
  }
  return normal;
}

/** +1 if the normals mostly look away from the middle of the sheet, else -1. */
function outwardness(w: Float32Array, normal: Float32Array): number {
  const middle = [0, 0, 0];
  for (let k = 0; k < w.length; k += 3) for (let a = 0; a < 3; a++) middle[a]! += (w[k + a]! * 3) / w.length;
  let sum = 0;
  for (let k = 0; k < w.length; k += 3)
    for (let a = 0; a < 3; a++) sum += normal[k + a]! * (w[k + a]! - middle[a]!);
  return sum < 0 ? -1 : 1;
}

/**
 * Turns each normal to the side the camera sees. A normal that looks only a little away belongs to the edge of the
 * form and is bent level with the picture instead: turning it round would draw a ragged edge.
 */
function faceCamera(normal: Float32Array, sign: number, sinPitch: number, cosPitch: number): void {
  for (let k = 0; k < normal.length; k += 3) {
    let nx = normal[k]! * sign;
    let ny = normal[k + 1]! * sign;
    let nz = normal[k + 2]! * sign;
    const towards = ny * sinPitch + nz * cosPitch;
    if (towards < -0.3) {
      nx = -nx;
      ny = -ny;
      nz = -nz;
    } else if (towards < 0.02) {
      ny -= (towards - 0.02) * sinPitch;
      nz -= (towards - 0.02) * cosPitch;
      const length = Math.sqrt(nx * nx + ny * ny + nz * nz) || 1;
      nx /= length;
      ny /= length;
      nz /= length;
    }
    normal[k] = nx;
    normal[k + 1] = ny;
    normal[k + 2] = nz;
  }
}

export function see(sheet: Sheet, yaw: number, pitch: number): Seen {
  const place = turned(sheet, yaw);
  const normal = crossNormals(sheet, place);
  faceCamera(normal, sheet.facing || outwardness(place, normal), Math.sin(pitch), Math.cos(pitch));
  const points = place.length / 3;
  return { sheet, place, normal, key: new Float32Array(points), fill: new Float32Array(points) };
}
