const MINUS = '\u2212';

/** "1.4", "−0.25": a figure of the page, never a length to be kept. */
export function figure(value: number, places: number): string {
  const text = Math.abs(value).toFixed(places);
  return value < 0 && Number(text) !== 0 ? `${MINUS}${text}` : text;
}

/** With its sign always, for what lies to either side of nothing. */
export function signed(value: number, places: number): string {
  const text = figure(value, places);
  return value > 0 && Number(text) !== 0 ? `+${text}` : text;
}

export const NOT_YET = 'cannot be told yet';

/** R is never rounded up to 1: only readings that all agree are as good as that. */
export function reliabilityText(r: number): string {
  return figure(r < 1 && r > 0.999 ? 0.999 : r, 3);
}
