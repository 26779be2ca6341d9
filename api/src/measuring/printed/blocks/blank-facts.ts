import { dutyLabels } from '@ellwand/shared/records/hands';
import { supportLabels } from '@ellwand/shared/records/sheet';
import { points } from '../paper/paper-size';
import type { SheetPaper } from '../paper/sheet-paper';
import { rule, styles } from '../paper/styles';

interface Field {
  readonly label: string;
  /** Of the width, in twelfths. */
  readonly twelfths: number;
  /** Boxes to tick, where there is nothing to write. */
  readonly choices?: readonly string[];
}

const rowHeight = points(10);
const gap = points(3);

const garmentFields: readonly Field[] = [
  { label: 'Number', twelfths: 3 },
  { label: 'Garment', twelfths: 6 },
  { label: 'Date', twelfths: 3 },
];

const factFields: readonly Field[] = [
  { label: 'Measured on', twelfths: 3 },
  { label: 'Place', twelfths: 5 },
  { label: 'Written in', twelfths: 4, choices: ['mm', 'cm', 'inches'] },
  { label: dutyLabels.read, twelfths: 4 },
  { label: dutyLabels.held, twelfths: 4 },
  { label: dutyLabels.wrote, twelfths: 4 },
  { label: 'Or one person alone, because', twelfths: 12 },
  { label: 'It lies', twelfths: 12, choices: Object.values(supportLabels) },
  { label: 'Tape', twelfths: 4 },
  { label: 'Its length', twelfths: 2 },
  { label: 'It shows at its beginning', twelfths: 3 },
  { label: 'Fastened at which pair', twelfths: 3 },
];

/** Lines to write on: who, when, where, on what, with which tape; and of what, where the sheet does not know. */
export function drawBlankFacts(
  paper: SheetPaper,
  { garmentKnown }: { readonly garmentKnown: boolean },
): void {
  const fields = [...(garmentKnown ? [] : garmentFields), ...factFields];
  for (const row of rowsOf(fields)) {
    paper.room(rowHeight);
    let { edge: x } = paper;
    for (const field of row) {
      const width = (paper.width * field.twelfths) / 12;
      drawField(paper, field, x, width - gap);
      x += width;
    }
    paper.y += rowHeight;
  }
  paper.y += points(3);
}

function rowsOf(fields: readonly Field[]): readonly (readonly Field[])[] {
  const rows: Field[][] = [[]];
  for (const field of fields) {
    const last = rows.at(-1) ?? [];
    const taken = last.reduce((sum, { twelfths }) => sum + twelfths, 0);
    if (taken + field.twelfths > 12) rows.push([field]);
    else last.push(field);
  }
  return rows;
}

function drawField(paper: SheetPaper, { label, choices }: Field, x: number, width: number): void {
  const { y } = paper;
  paper.tag('P', () => paper.set(label, styles.label, { x, y, width }));
  if (choices) return drawChoices(paper, choices, x);
  paper.hairline(y + rowHeight - points(1.5), x, x + width, rule);
}

function drawChoices(paper: SheetPaper, choices: readonly string[], from: number): void {
  const y = paper.y + points(4.5);
  const side = points(3.2);
  let x = from;
  for (const choice of choices) {
    const left = x;
    paper.ornament((doc) => doc.lineWidth(0.5).strokeColor(rule).rect(left, y, side, side).stroke());
    paper.tag('P', () =>
      paper.set(choice, styles.body, { x: left + side + points(1.5), y: y - points(0.4), width: points(60) }),
    );
    x += side + points(6) + paper.doc.widthOfString(choice);
  }
}
