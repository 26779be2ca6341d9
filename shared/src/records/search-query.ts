import { z } from 'zod';
import { Paging } from './common.js';
import { parseMeasure } from './measure-filter.js';

const many = z
  .union([z.string(), z.array(z.string())])
  .optional()
  .transform((value) => (value === undefined ? [] : Array.isArray(value) ? value : [value]));

export { formatMeasure, type MeasureFilter, parseMeasure } from './measure-filter.js';

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
