/** Without I and O, which read as one and nought. */
const ALPHABET = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/**
 * Letters for measuring points in the order given: A to Z, then AA, AB…
 * The table beside a diagram uses the same, so that letter and row match.
 */
export function lettersInOrder(pointIds: readonly string[]): ReadonlyMap<string, string> {
  return new Map(pointIds.map((pointId, index) => [pointId, letterAt(index)]));
}

function letterAt(index: number): string {
  const own = ALPHABET.charAt(index % ALPHABET.length);
  return index < ALPHABET.length ? own : letterAt(Math.floor(index / ALPHABET.length) - 1) + own;
}
