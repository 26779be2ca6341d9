import { handlingStepLabels, handlingSteps, type MeasuringPoint } from '@ellwand/shared/points/point';
import { lettersFor, pointIn, type Protocol, type ProtocolPoint } from '@ellwand/shared/protocols/protocol';
import { levelLabels, notTakenReasons } from '@ellwand/shared/readings/reading';
import { describedLabels } from '@ellwand/shared/records/table-note';
import { points } from '../paper/paper-size';
import type { SheetPaper } from '../paper/sheet-paper';
import { rule, styles } from '../paper/styles';
import { type Box, type Cell, cell, drawTable, type Row } from '../paper/table';
import { pointWords } from './point-words';

/** A hand in a glove writes large. */
const leastHeight = points(11);

const columns = [
  { title: '', share: 7 },
  { title: 'Measuring point', share: 72 },
  { title: 'Reading', share: 33 },
  { title: 'Read again', share: 33 },
  { title: 'Level, side, why not, remark', share: 45 },
];

/** Every point in handling order, with boxes to write in. */
export function drawBlankTable(paper: SheetPaper, protocol: Protocol): void {
  const letters = lettersFor(protocol);
  const asked = protocol.points.flatMap((one) => {
    const point = pointIn(protocol, one.pointId);
    return point ? [{ ...one, point }] : [];
  });
  const rows = handlingSteps.flatMap((step): Row[] => {
    const own = asked.filter(({ point }) => point.handlingStep === step);
    if (own.length === 0) return [];
    return [
      { type: 'band', text: handlingStepLabels[step] },
      ...own.map((one): Row => ({ type: 'row', cells: blankCells(one, letters.get(one.pointId) ?? '') })),
    ];
  });
  drawTable(paper, { columns, rows, leastHeight });
  legend(
    paper,
    asked.some(({ point }) => point.levelRecorded),
  );
}

type Asked = ProtocolPoint & { readonly point: MeasuringPoint };

function blankCells({ point, required, rounds }: Asked, letter: string): readonly Cell[] {
  const name = required ? point.name : `${point.name} (if it applies)`;
  const hint = [
    point.takesTapeLengths ? 'whole tapes + rest' : '',
    point.how === 'flat-doubled' ? 'the half' : '',
  ]
    .filter((word) => word !== '')
    .join(', ');
  return [
    cell(letter, styles.letter),
    {
      lines: [
        { text: name, style: styles.strong },
        { text: pointWords(point), style: styles.small },
      ],
    },
    box(hint),
    box(rounds > 1 ? 'wanted, without looking' : ''),
    { lines: [] },
  ];
}

/** A box to write a figure in; what is special about it stands small at its top. */
const box = (hint: string): Cell => ({
  lines: hint === '' ? [] : [{ text: hint, style: styles.foot }],
  ornament: (doc, { x, y, width, height }: Box) =>
    doc
      .lineWidth(0.5)
      .strokeColor(rule)
      .rect(x + points(0.6), y + points(0.6), width - points(1.2), height - points(1.2))
      .stroke(),
});

function legend(paper: SheetPaper, hasLevels: boolean): void {
  paper.y += points(3);
  const reasons = Object.values(notTakenReasons).map((reason, index) => `${index + 1} ${reason}`);
  const levels = `Level found: ${Object.values(levelLabels).join(', ')}.`;
  if (hasLevels) paper.block('P', levels, styles.small, { after: points(1.5) });
  paper.block('P', `Why a point is not taken: ${reasons.join('; ')}.`, styles.small, { after: points(2) });
}

/** Ruled lines for what is seen while the garment is out. */
export function drawBlankNotes(paper: SheetPaper): void {
  paper.heading('Seen at the table');
  for (const label of Object.values(describedLabels)) {
    const height = points(18);
    paper.room(height);
    const { edge: x, y, width } = paper;
    paper.tag('P', () => paper.set(label, styles.label, { x, y, width }));
    paper.hairline(y + points(9), x + points(22));
    paper.hairline(y + points(17));
    paper.y += height + points(1.5);
  }
}
