import { z } from 'zod';
import { Paging } from './common.js';

const many = z
  .union([z.string(), z.array(z.string())])
  .optional()
  .transform((value) => (value === undefined ? [] : Array.isArray(value) ? value : [value]));

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

export const searchSorts = ['relevance', 'date', 'date-desc', 'title', 'newest'] as const;

/** The query of a search, as the address carries it. Lengths are millimetres. */
export const SearchQuery = Paging.extend({
  q: z.string().trim().max(200).default(''),
  kind: many,
  decade: many,
  maker: many,
  place: many,
  material: many,
  colour: many,
  from: z.coerce.number().int().min(1000).max(2100).optional(),
  to: z.coerce.number().int().min(1000).max(2100).optional(),
  measure: many.pipe(
    z.array(
      z.string().transform((text, context) => {
        const filter = parseMeasure(text);
        if (filter) return filter;
        context.addIssue({
          code: 'custom',
          message: `Expected a measure such as waist:560..620, got "${text.slice(0, 80)}"`,
        });
        return z.NEVER;
      }),
    ),
  ),
  sort: z.enum(searchSorts).default('relevance'),
});
export type SearchQuery = z.output<typeof SearchQuery>;
