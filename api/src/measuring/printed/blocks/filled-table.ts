import { handlingStepLabels, handlingSteps } from '@ellwand/shared/points/point';
import type { Sheet } from '@ellwand/shared/records/sheet';
import type { SheetPaper } from '../paper/sheet-paper';
import { type Style, styles } from '../paper/styles';
import { type Cell, cell, drawTable, type Row } from '../paper/table';
import { pointWords } from './point-words';
import { type PointOnPaper, pointsOnPaper } from './readings-on-paper';

const columns = [
  { title: '', share: 7 },
  { title: 'Measuring point', share: 62 },
  { title: 'As it was keyed', share: 42 },
  { title: 'Value', share: 43 },
  { title: 'Level, remark', share: 26 },
];

/** Every point with its readings as they were keyed and the value that follows from them. */
export function drawFilledTable(paper: SheetPaper, sheet: Sheet): void {
  const all = pointsOnPaper(sheet);
  const rows = handlingSteps.flatMap((step): Row[] => {
    const own = all.filter(({ point }) => point.handlingStep === step);
    if (own.length === 0) return [];
    return [{ type: 'band', text: handlingStepLabels[step] }, ...own.map(rowOf)];
  });
  drawTable(paper, { columns, rows });
}

const lines = (texts: readonly string[], style: Style): Cell => ({
  lines: texts.map((text) => ({ text, style })),
});

function rowOf({ letter, point, required, keyed, values, remarks }: PointOnPaper): Row {
  const nothing = required ? 'not read yet' : 'not read';
  return {
    type: 'row',
    cells: [
      cell(letter, styles.letter),
      {
        lines: [
          { text: point.name, style: styles.strong },
          { text: pointWords(point), style: styles.small },
        ],
      },
      keyed.length > 0 ? lines(keyed, styles.body) : cell(nothing, styles.small),
      {
        lines: values.flatMap(({ value, trust }) => [
          { text: value, style: styles.strong },
          { text: trust, style: styles.small },
        ]),
      },
      lines(remarks, styles.body),
    ],
  };
}
