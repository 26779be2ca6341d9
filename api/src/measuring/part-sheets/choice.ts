import type { Tx } from '../../common/work';
import type { PartRow } from '../../garments/part.entity';
import { UserRow } from '../../users/user.entity';

/** Who chose the sheet that speaks for a part, and why; null where nobody did. */
export async function choiceOf(
  tx: Tx,
  { speakingBecause, speakingBy, speakingAt }: Pick<PartRow, 'speakingBecause' | 'speakingBy' | 'speakingAt'>,
): Promise<{ because: string; by: string; at: string } | null> {
  if (speakingBecause === null || speakingBy === null || speakingAt === null) return null;
  const by = await tx.findOneBy(UserRow, { id: speakingBy });
  return { because: speakingBecause, by: by?.name ?? '', at: speakingAt.toISOString() };
}
