/** How the threads cross, and how many there are to the centimetre. */
export interface Weave {
  kind: 'plain' | 'twill' | 'rib' | 'satin';
  threads: number;
  depth: number;
}

/** A thread narrower than this many pixels makes moiré instead of cloth, so it fades out. */
const LEAST_PX = 3;

/** Adds the slopes of the threads into `out`. */
export function weaveAt(weave: Weave, u: number, v: number, pxPerCm: number, out: [number, number]): void {
  const px = pxPerCm / weave.threads;
  if (px < LEAST_PX) return;
  const depth = weave.depth * Math.min(1, (px - LEAST_PX) / 2);
  const a = u * weave.threads * Math.PI;
  const b = v * weave.threads * Math.PI;
  switch (weave.kind) {
    case 'plain': {
      const over = Math.sin(a) * Math.sin(b) > 0;
      out[0] += depth * (over ? Math.cos(a) : 0.35 * Math.cos(a)) * Math.sign(Math.sin(a));
      out[1] += depth * (over ? 0.35 * Math.cos(b) : Math.cos(b)) * Math.sign(Math.sin(b));
      break;
    }
    case 'twill': {
      const slope = depth * Math.cos(a * 0.8 + b * 0.8);
      out[0] += slope;
      out[1] += slope + 0.3 * depth * Math.cos(2 * (a - b));
      break;
    }
    case 'rib':
      out[1] += depth * Math.cos(b);
      out[0] += 0.25 * depth * Math.cos(2.6 * a) * Math.sign(Math.cos(b / 2));
      break;
    case 'satin':
      out[0] += 0.5 * depth * Math.cos(1.6 * a + 0.7 * Math.sin(b * 0.23));
      break;
  }
}
