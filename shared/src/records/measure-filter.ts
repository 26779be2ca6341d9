/* Kept apart from the schema that uses it, so that the public pages read an address without loading zod. */

/** `waist:560..620`, either end open: a point or group, and millimetres. */
const measure = /^([a-z0-9-]{1,60}):(\d{1,6}(?:\.\d{1,4})?)?\.\.(\d{1,6}(?:\.\d{1,4})?)?$/;

export interface MeasureFilter {
  readonly point: string;
  readonly minMm: string | null;
  readonly maxMm: string | null;
}

/** Reads one `measure=` value; null where it is not of the form `point:min..max`. */
export function parseMeasure(text: string): MeasureFilter | null {
  const found = measure.exec(text);
  if (!found?.[1] || (found[2] === undefined && found[3] === undefined)) return null;
  return { point: found[1], minMm: found[2] ?? null, maxMm: found[3] ?? null };
}

export function formatMeasure({ point, minMm, maxMm }: MeasureFilter): string {
  return `${point}:${minMm ?? ''}..${maxMm ?? ''}`;
}
