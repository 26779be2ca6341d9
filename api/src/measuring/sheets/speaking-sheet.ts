import type { Tx } from '../../common/work';
import type { PartRow } from '../../garments/part.entity';
import { SheetRow } from './sheet.entity';

type Choice = Pick<PartRow, 'speakingSheetId'>;
type Candidate = Pick<SheetRow, 'id' | 'state' | 'purpose'>;

/** Whether a sheet may speak for its part at all: an open one is not done, and a study sheet never does. */
export const maySpeak = ({ state, purpose }: Omit<Candidate, 'id'>): boolean =>
  state === 'complete' && purpose === 'record';

/**
 * Of several sheets over the years the one that was chosen speaks for its part, else the newest complete one.
 * @param sheets the part's, newest first
 */
export function speakingOf<S extends Candidate>(
  { speakingSheetId }: Choice,
  sheets: readonly S[],
): S | undefined {
  const candidates = sheets.filter(maySpeak);
  return candidates.find(({ id }) => id === speakingSheetId) ?? candidates[0];
}

/** Every sheet of a part, newest first. */
export function sheetsOf(tx: Tx, partId: string): Promise<SheetRow[]> {
  return tx.find(SheetRow, { where: { partId }, order: { measuredOn: 'DESC', createdAt: 'DESC' } });
}

/** The readings that count for a part while others are measured: of the sheet being taken, else of the one that speaks. */
export async function currentSheet(
  tx: Tx,
  part: Choice & Pick<PartRow, 'id'>,
): Promise<SheetRow | undefined> {
  const sheets = (await sheetsOf(tx, part.id)).filter(({ purpose }) => purpose === 'record');
  const [newest] = sheets;
  return newest?.state === 'open' ? newest : speakingOf(part, sheets);
}
