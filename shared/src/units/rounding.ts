/**
 * `numerator ÷ denominator` as a whole number, ties away from zero ("half-up", and the same for a negative
 * difference as for its mirror image). BigInt, because a length times a denominator may pass 2⁵³.
 */
export function divideHalfUp(numerator: bigint, denominator: bigint): bigint {
  if (denominator <= 0n) throw new RangeError(`expected a denominator above 0, got ${denominator}`);
  const magnitude = numerator < 0n ? -numerator : numerator;
  const rounded = (2n * magnitude + denominator) / (2n * denominator);
  return numerator < 0n ? -rounded : rounded;
}
