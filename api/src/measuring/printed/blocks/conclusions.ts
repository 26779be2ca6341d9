import type { DerivedView, FindingView, Sheet } from '@ellwand/shared/records/sheet';
import { describedLabels, type StoredTableNote } from '@ellwand/shared/records/table-note';
import { formatBoth } from '@ellwand/shared/units/format-length';
import { mm } from '@ellwand/shared/units/length';
import type { SheetPaper } from '../paper/sheet-paper';
import { styles } from '../paper/styles';
import { type Cell, cell, drawTable, type Row } from '../paper/table';
import { momentOnPaper } from './moment-on-paper';

const row = (...cells: Cell[]): Row => ({ type: 'row', cells });

/** What follows from the readings, with formula and figures. */
export function drawDerived(paper: SheetPaper, derived: readonly DerivedView[]): void {
  if (derived.length === 0) return;
  paper.heading('Worked out');
  const columns = [
    { title: 'Value', share: 50 },
    { title: 'How', share: 80 },
    { title: '', share: 50 },
  ];
  const rows = derived.map((value) =>
    row(
      cell(value.label, styles.strong),
      {
        lines: [
          { text: value.formula, style: styles.small },
          { text: value.worked, style: styles.body },
        ],
      },
      cell(derivedText(value), styles.strong),
    ),
  );
  drawTable(paper, { columns, rows });
}

export function derivedText({ valueMm, ratio, uncertaintyMm }: DerivedView): string {
  if (valueMm === null) return ratio ?? '';
  return `${formatBoth(mm(valueMm))}${uncertaintyMm === null ? '' : ` ± ${uncertaintyMm} mm`}`;
}

const severityWords: Readonly<Record<FindingView['severity'], string>> = {
  stop: 'Stop',
  question: 'Question',
  note: 'Note',
};
const severities = ['stop', 'question', 'note'] as const;

/** What the checks found, and what was answered. */
export function drawFindings(paper: SheetPaper, findings: readonly FindingView[]): void {
  paper.heading('Findings');
  if (findings.length === 0) return paper.block('P', 'The checks have nothing to say.', styles.body);
  const rows = severities
    .flatMap((severity) => findings.filter((finding) => finding.severity === severity))
    .map(({ severity, sentence, answer }) =>
      row(cell(severityWords[severity], styles.strong), cell(sentence), answered(severity, answer)),
    );
  const columns = [
    { title: '', share: 20 },
    { title: 'What was found', share: 90 },
    { title: 'Answer', share: 70 },
  ];
  drawTable(paper, { columns, rows });
}

function answered(severity: FindingView['severity'], answer: FindingView['answer']): Cell {
  if (!answer) return cell(severity === 'note' ? '' : 'not answered yet', styles.small);
  return {
    lines: [
      { text: answer.reason, style: styles.body },
      { text: `${answer.by}, ${momentOnPaper(answer.at)}`, style: styles.small },
    ],
  };
}

type Described = Extract<StoredTableNote, { about: 'described' }>;

/** What was said of label, fastenings and condition while the garment was out. */
export function drawNoted(paper: SheetPaper, { tableNotes }: Pick<Sheet, 'tableNotes'>): void {
  const described = tableNotes.filter((note): note is Described => note.about === 'described');
  if (described.length === 0) return;
  paper.heading('Seen at the table');
  const rows = described.map(({ thing, text, byName, saidAt }) =>
    row(cell(describedLabels[thing], styles.strong), {
      lines: [
        { text, style: styles.body },
        { text: `${byName}, ${momentOnPaper(saidAt)}`, style: styles.small },
      ],
    }),
  );
  const columns = [
    { title: '', share: 30 },
    { title: 'What was said', share: 150 },
  ];
  drawTable(paper, { columns, rows });
}
