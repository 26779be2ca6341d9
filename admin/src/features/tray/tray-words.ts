import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { notTakenReasons } from '@ellwand/shared/readings/reading';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import { describedLabels } from '@ellwand/shared/records/table-note';
import type { Operation, OperationOf } from '../../offline/operation.js';

const pointName = (id: string): string => findMeasuringPoint(id)?.name ?? id;

function readingWords({ reading }: OperationOf<'reading'>): string {
  const side = reading.worn ? `, ${wornSideLabels[reading.worn]}` : '';
  const round = reading.round > 1 ? `, reading ${reading.round}` : '';
  const where = `${pointName(reading.pointId)}${side}${round}`;
  if (reading.state === 'not-taken') return `${where}: ${notTakenReasons[reading.reason].toLowerCase()}`;
  const tapes = reading.tapeCount > 0 ? `${reading.tapeCount} tapes + ` : '';
  return `${where}: ${tapes}${reading.typed} ${reading.unit}`;
}

function noteWords({ note }: OperationOf<'note'>): string {
  if (note.about === 'described') return `${describedLabels[note.thing]}: ${note.text}`;
  if (note.about === 'answer') return `Answer to a finding: ${note.reason}`;
  if (note.about === 'paused') return `Put away for now: ${note.reason}`;
  if (note.about === 'hands') return 'Whose hands are at the garment';
  return note.about === 'begun' ? 'A sitting begins' : 'The cautions were read';
}

/** What an operation says, in a line. */
export function operationWords(operation: Operation): string {
  if (operation.kind === 'reading') return readingWords(operation);
  if (operation.kind === 'note') return noteWords(operation);
  const { picture } = operation;
  return picture.pointId ? `Picture of the tape at ${pointName(picture.pointId).toLowerCase()}` : 'Picture';
}
