import { z } from 'zod';
import { line, Moment, prose, Uuid } from './common.js';

export const ReturnReason = z.strictObject({ reason: line(1000) });
/** The public wording and the inner reason are two things; only the first ever leaves the Workroom. */
export const Withdrawal = z.strictObject({ notice: line(1000), innerReason: prose(2000).default('') });
export type Withdrawal = z.infer<typeof Withdrawal>;

/** `GET /workroom/garments/:id/changes`: field by field against the last published version. */
export const Change = z.object({
  kind: z.enum(['added', 'removed', 'changed']),
  area: z.enum(['record', 'measurement', 'cut-sheet', 'picture']),
  /** What changed, in words: "Title", "Waist (bodice)", "Picture, front". */
  label: z.string(),
  before: z.string().nullable(),
  after: z.string().nullable(),
});
export type Change = z.infer<typeof Change>;

/** What still keeps a record from the next step, in plain sentences; `blocks` tells which step. */
export const Readiness = z.object({
  blocks: z.enum(['submit', 'approve', 'publish']),
  sentence: z.string(),
  /** Where in the Workroom to mend it. */
  href: z.string().nullable(),
});

export const Review = z.object({
  garmentId: Uuid,
  version: z.number().int(),
  nextVersion: z.number().int(),
  changes: z.array(Change),
  readiness: z.array(Readiness),
  /** Why the person who asks may not approve; null when they may. */
  mayNotApprove: z.string().nullable(),
  people: z.array(z.object({ name: z.string(), did: z.string() })),
});
export type Review = z.infer<typeof Review>;

export const Revision = z.object({
  id: Uuid,
  number: z.number().int(),
  outcome: z.enum(['in-review', 'returned', 'approved', 'published', 'set-aside']),
  submittedBy: z.string(),
  submittedAt: Moment,
  decidedBy: z.string().nullable(),
  decidedAt: Moment.nullable(),
  reason: z.string().nullable(),
  publishedVersion: z.number().int().nullable(),
});
export const Revisions = z.object({ items: z.array(Revision) });

export const AuditEntry = z.object({
  id: Uuid,
  at: Moment,
  actor: z.string().nullable(),
  verb: z.string(),
  subjectKind: z.string(),
  subjectId: z.string().nullable(),
  summary: z.string(),
});
