import { placeAlong } from '../geometry/path.js';
import { pathFrom } from '../geometry/path-language.js';

/**
 * Paths for `count` pleats between two edges of a flounce, evenly spread along both.
 * @param lean shifts the lower ends along their edge, as a share of its length: knife pleats lie to one side
 */
export function pleatsBetween(upperEdge: string, lowerEdge: string, count: number, lean = 0): string[] {
  const [upper, lower] = [pathFrom(upperEdge), pathFrom(lowerEdge)];
  return Array.from({ length: count }, (_, index) => {
    const share = (index + 0.5) / count;
    const from = placeAlong(upper, share).at;
    const to = placeAlong(lower, Math.min(1, Math.max(0, share + lean))).at;
    return `${written(from)}--${written(to)}`;
  });
}

const written = (point: readonly [number, number]): string =>
  point.map((value) => value.toFixed(1)).join(',');
