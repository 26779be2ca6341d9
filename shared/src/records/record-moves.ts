import { z } from 'zod';

/**
 * Where a garment's record stands. What the public sees goes on apart from it: a published garment may have
 * an edited draft beside it, and then its stage is `draft` while its version stays current.
 */
export const recordStages = ['draft', 'in-review', 'approved', 'published', 'withdrawn'] as const;
export const RecordStage = z.enum(recordStages);
export type RecordStage = z.infer<typeof RecordStage>;

export const stageLabels: Readonly<Record<RecordStage, string>> = {
  draft: 'Draft',
  'in-review': 'In review',
  approved: 'Approved',
  published: 'Published',
  withdrawn: 'Withdrawn',
};

/** Every move a record may make. Guards, screens and tests read this one table. */
export const recordMoves = {
  draft: ['in-review', 'withdrawn'], // withdrawn: only while a version is public
  'in-review': ['draft', 'approved', 'withdrawn'], // back to draft needs a reason
  approved: ['draft', 'published', 'withdrawn'],
  published: ['draft', 'withdrawn'], // draft: edited beside the public version
  withdrawn: ['draft'],
} as const satisfies Record<RecordStage, readonly RecordStage[]>;

export function mayMove(from: RecordStage, to: RecordStage): boolean {
  return (recordMoves[from] as readonly RecordStage[]).includes(to);
}

/** Where one published version stands. At most one version of a garment is current. */
export const versionStates = ['current', 'superseded', 'withdrawn'] as const;
export const VersionState = z.enum(versionStates);
export type VersionState = z.infer<typeof VersionState>;

export const versionMoves = {
  current: ['superseded', 'withdrawn'],
  superseded: ['withdrawn'],
  withdrawn: [],
} as const satisfies Record<VersionState, readonly VersionState[]>;
