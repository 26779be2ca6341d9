import { type Duty, dutyLabels } from '@ellwand/shared/records/hands';
import { type Sheet, supportLabels } from '@ellwand/shared/records/sheet';
import { sittingsOf } from '@ellwand/shared/records/sittings';
import { fromMmString, ZERO_LENGTH } from '@ellwand/shared/units/length';
import { readMm } from '@ellwand/shared/units/format-length';
import type { z } from 'zod';
import { points } from '../paper/paper-size';
import type { SheetPaper } from '../paper/sheet-paper';
import { styles } from '../paper/styles';
import { cell, drawTable, type Row } from '../paper/table';
import { dayOnPaper, momentOnPaper } from './moment-on-paper';

type Fact = readonly [string, string];

/** Who measured when, where, on what and with which tape. */
export function drawFilledFacts(paper: SheetPaper, sheet: Sheet): void {
  const facts = factsOf(sheet).filter(([, text]) => text !== '');
  const rows = facts.map(([label, text]): Row => ({
    type: 'row',
    cells: [cell(label, styles.label), cell(text)],
  }));
  drawTable(paper, {
    columns: [
      { title: 'The measuring', share: 50 },
      { title: '', share: 130 },
    ],
    rows,
  });
  paper.y += points(3);
}

function factsOf({ facts, readings, tableNotes }: Sheet): readonly Fact[] {
  const tape = `${facts.tape}, ${readMm(fromMmString(facts.tapeLengthMm))} long`;
  const zero = fromMmString(facts.tapeZeroMm);
  const shows =
    zero === ZERO_LENGTH ? '' : `; it shows ${readMm(zero)} at its beginning, taken off every reading`;
  return [
    ['Measured on', dayOnPaper(facts.measuredOn)],
    ['Place', facts.place],
    ...(['read', 'held', 'wrote'] as const).map((duty): Fact => [
      dutyLabels[duty],
      namesOf(facts.people, duty),
    ]),
    ['One person alone, because', facts.aloneBecause],
    ['It lay', supportLabels[facts.support].toLowerCase()],
    ['Tape', `${tape}${shows}`],
    ['Fastened at', facts.fasteningPair],
    ['Remark', facts.note],
    ...sittingsOf(tableNotes, readings).map(
      ({ begunAt, pausedAt, pausedBecause, readings: count }, index): Fact => [
        `Sitting ${index + 1}`,
        [
          `from ${momentOnPaper(begunAt)}`,
          pausedAt ? ` to ${momentOnPaper(pausedAt)}` : '',
          `, ${count === 1 ? '1 reading' : `${count} readings`}`,
          pausedBecause ? `; put away: ${pausedBecause}` : '',
        ].join(''),
      ],
    ),
  ];
}

const namesOf = (people: Sheet['facts']['people'], duty: z.infer<typeof Duty>): string =>
  people
    .filter((person) => person.duty === duty)
    .map(({ name }) => name)
    .join(', ');
