/** How well readings repeat, point by point, as it travels. Figures are statistics in mm, not lengths; readers have no names. */
import { z } from 'zod';

export const repeatabilitySources = ['all', 'study', 'record'] as const;
export type RepeatabilitySource = (typeof repeatabilitySources)[number];

/** `GET /workroom/repeatability?from=`: study sheets, the repeat points of record sheets, or both. */
export const RepeatabilityQuery = z.object({ from: z.enum(repeatabilitySources).default('all') });

export const RepeatabilityPoint = z.object({
  pointId: z.string(),
  label: z.string(),
  /** How many things were read more than once at this point, and the most readings that one of them had. */
  n: z.number().int(),
  k: z.number().int(),
  /** Of the pairs, how many had their later reading from somebody else. */
  byAnother: z.number().int(),
  /** Null where there is too little to work it out, or all readings are alike. */
  temMm: z.number().nullable(),
  percentTem: z.number().nullable(),
  r: z.number().nullable(),
  meanDifferenceMm: z.number().nullable(),
  limitsMm: z.object({ lower: z.number(), upper: z.number() }).nullable(),
  /** Each later reading against the first. */
  pairs: z.array(z.object({ meanMm: z.number(), differenceMm: z.number() })),
  /** How far these figures can be trusted. */
  says: z.string(),
});
export type RepeatabilityPoint = z.infer<typeof RepeatabilityPoint>;

export const Repeatability = z.object({
  from: z.enum(repeatabilitySources),
  points: z.array(RepeatabilityPoint),
  /** True where the house has more repeated readings than are worked out here; the newest were taken. */
  more: z.boolean(),
});
export type Repeatability = z.infer<typeof Repeatability>;
