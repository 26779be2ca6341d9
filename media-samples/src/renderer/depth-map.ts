/** A square map of how near the nearest cloth lies to a lamp. */
export interface DepthMap {
  size: number;
  depth: Float32Array;
}

/** Draws one triangle (three points of `at`, as x, y in map pixels and depth) keeping the nearest. */
export function shadeTriangle(map: DepthMap, at: Float32Array, a: number, b: number, c: number): void {
  const { size, depth } = map;
  const ax = at[a * 3]!;
  const ay = at[a * 3 + 1]!;
  const bx = at[b * 3]!;
  const by = at[b * 3 + 1]!;
  const cx = at[c * 3]!;
  const cy = at[c * 3 + 1]!;
  const area = (bx - ax) * (cy - ay) - (by - ay) * (cx - ax);
  if (area > -1e-9 && area < 1e-9) return;
  const left = Math.max(0, Math.ceil(Math.min(ax, bx, cx)));
  const right = Math.min(size - 1, Math.floor(Math.max(ax, bx, cx)));
  const top = Math.max(0, Math.ceil(Math.min(ay, by, cy)));
  const bottom = Math.min(size - 1, Math.floor(Math.max(ay, by, cy)));
  if (left > right || top > bottom) return;
  const az = at[a * 3 + 2]!;
  const bz = at[b * 3 + 2]! - az;
  const cz = at[c * 3 + 2]! - az;
  const over = 1 / area;
  for (let y = top; y <= bottom; y++) {
    for (let x = left; x <= right; x++) {
      const wb = ((x - ax) * (cy - ay) - (y - ay) * (cx - ax)) * over;
      const wc = ((bx - ax) * (y - ay) - (by - ay) * (x - ax)) * over;
      if (wb < 0 || wc < 0 || wb + wc > 1) continue;
      const z = az + wb * bz + wc * cz;
      const k = y * size + x;
      if (z > depth[k]!) depth[k] = z;
    }
  }
}
