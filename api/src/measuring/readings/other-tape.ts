import { pointIn, type Protocol } from '@ellwand/shared/protocols/protocol';
import { Refusal } from '../../common/refusal';
import type { Tx } from '../../common/work';
import { workOut } from './reading-intake';
import { ReadingRow } from './reading.entity';
import { trimmedMm } from './stored-reading';

interface Tape {
  readonly tapeLengthMm: string;
  readonly tapeZeroMm: string;
}

/**
 * Works every standing reading of a sheet out again where its tape is described differently than before. What was keyed
 * stays; only the millimetres that follow from it change.
 * @returns how many readings have another value now
 * @throws Refusal 400 where a reading would come out below nothing
 */
export async function workOutAgain(
  tx: Tx,
  sheetId: string,
  protocol: Protocol,
  { before, after }: { readonly before: Tape; readonly after: Tape },
): Promise<number> {
  const isSame =
    trimmedMm(before.tapeLengthMm) === trimmedMm(after.tapeLengthMm) &&
    trimmedMm(before.tapeZeroMm) === trimmedMm(after.tapeZeroMm);
  if (isSame) return 0;
  let changed = 0;
  for (const row of await tx.find(ReadingRow, { where: { sheetId, state: 'taken', stands: true } })) {
    const worked = valueWith(row, protocol, after);
    if (worked.valueMm === null || row.valueMm === null || trimmedMm(row.valueMm) === worked.valueMm)
      continue;
    await tx.update(
      ReadingRow,
      { id: row.id },
      { valueMm: worked.valueMm, tapeLengthMm: worked.tapeLengthMm },
    );
    changed++;
  }
  return changed;
}

function valueWith(row: ReadingRow, protocol: Protocol, tape: Tape) {
  const { pointId, typed, unit } = row;
  const point = pointIn(protocol, pointId);
  if (!point || typed === null || unit === null)
    throw new Error(`A taken reading of ${pointId} lacks what was keyed`);
  const worked = workOut({ ...row, typed, unit, how: row.method ?? point.how }, tape);
  if (worked.accepted) return worked;
  const detail = `${point.name}, read as ${typed} ${unit}: ${worked.because}`;
  throw new Refusal(400, 'sheet.tape', detail, {}, [{ pointer: '/tapeZeroMm', detail }]);
}
