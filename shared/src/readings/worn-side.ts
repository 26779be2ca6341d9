/** Left and right are the wearer's, never the viewer's. */
export const wornSides = ['left', 'right'] as const;
export type WornSide = (typeof wornSides)[number];

export const wornSideLabels: Readonly<Record<WornSide, string>> = {
  left: 'left, as worn',
  right: 'right, as worn',
};

interface OnASide {
  readonly worn?: WornSide;
}

/**
 * Of a point read on both sides one side speaks for it, so that two sleeves are never averaged into one that does not
 * exist: readings whose side was not said, else the right, else the left.
 */
export function speakingReadings<R extends OnASide>(readings: readonly R[]): readonly R[] {
  const ofSide = (side: WornSide | undefined) => readings.filter(({ worn }) => worn === side);
  return [undefined, 'right' as const, 'left' as const].map(ofSide).find((found) => found.length > 0) ?? [];
}
