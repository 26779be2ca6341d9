import { points } from './paper-size';
import type { SheetPaper } from './sheet-paper';
import { hair, ink, rule, type Style, styles, well } from './styles';

export interface Column {
  readonly title: string;
  /** Share of the width; the shares of a table add up to anything. */
  readonly share: number;
}

export interface Line {
  readonly text: string;
  readonly style: Style;
}

/** A cell: its lines one under the other, and rules or boxes to write in. */
export interface Cell {
  readonly lines: readonly Line[];
  /** Drawn beneath the lines, for the eye alone. */
  readonly ornament?: (doc: PDFKit.PDFDocument, box: Box) => void;
}

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export type Row =
  | { readonly type: 'row'; readonly cells: readonly Cell[] }
  /** A heading across the table, for the rows that follow. */
  | { readonly type: 'band'; readonly text: string };

export interface Table {
  readonly columns: readonly Column[];
  readonly rows: readonly Row[];
  /** No row is lower, whatever stands in it. */
  readonly leastHeight?: number;
}

const pad = points(1.2);
const headHeight = points(6);
const bandHeight = points(6.5);

export const cell = (text: string, style: Style = styles.body): Cell => ({
  lines: text === '' ? [] : [{ text, style }],
});

/** Sets a table; where it goes over a page, the names of its columns stand on the next page too. */
export function drawTable(paper: SheetPaper, table: Table): void {
  const widths = widthsOf(table.columns, paper.width);
  paper.group('Table', () => {
    const [first, second] = table.rows.map((row) => rowHeight(paper, table, widths, row));
    paper.room(headHeight + (first ?? 0) + (second ?? 0));
    head(paper, table.columns, widths, 'named');
    table.rows.forEach((row, index) => {
      const next = row.type === 'band' ? rowHeight(paper, table, widths, table.rows[index + 1]) : 0;
      const turned = paper.room(rowHeight(paper, table, widths, row) + next);
      if (turned) head(paper, table.columns, widths, 'repeated');
      if (row.type === 'band') band(paper, row.text);
      else drawRow(paper, row.cells, widths, rowHeight(paper, table, widths, row));
    });
  });
}

function widthsOf(columns: readonly Column[], whole: number): readonly number[] {
  const shares = columns.reduce((sum, { share }) => sum + share, 0);
  return columns.map(({ share }) => (whole * share) / shares);
}

function rowHeight(
  paper: SheetPaper,
  { leastHeight = 0 }: Table,
  widths: readonly number[],
  row?: Row,
): number {
  if (!row) return 0;
  if (row.type === 'band') return bandHeight;
  const heights = row.cells.map(({ lines }, index) =>
    lines.reduce((sum, { text, style }) => sum + paper.heightOf(text, style, innerWidth(widths[index])), 0),
  );
  return Math.max(leastHeight, ...heights.map((height) => height + 2 * pad));
}

const innerWidth = (width = 0) => width - 2 * pad;

/** The names of the columns: of the table where it begins, for the eye alone where they are repeated. */
function head(
  paper: SheetPaper,
  columns: readonly Column[],
  widths: readonly number[],
  which: 'named' | 'repeated',
): void {
  const y = paper.y + pad;
  const places = boxesOf(paper, widths, headHeight);
  const title = (index: number) => {
    const { x, width } = places[index] ?? { x: 0, width: 0 };
    paper.set(columns[index]?.title ?? '', styles.label, { x: x + pad, y, width: innerWidth(width) });
  };
  const draw = () =>
    columns.forEach((_, index) => {
      if (which === 'named') paper.tag('TH', () => title(index), { scope: 'Column' });
      else paper.ornament(() => title(index));
    });
  if (which === 'named') paper.group('TR', draw);
  else draw();
  paper.y += headHeight;
  paper.hairline(paper.y, paper.edge, paper.right, ink);
}

function band(paper: SheetPaper, text: string): void {
  const { edge: x, y, width } = paper;
  paper.ornament((doc) => doc.rect(x, y, width, bandHeight).fill(well));
  paper.group('TR', () =>
    paper.tag('TH', () => paper.set(text, styles.strong, { x: x + pad, y: y + pad, width }), {
      scope: 'Row',
    }),
  );
  paper.y += bandHeight;
  paper.hairline(paper.y, paper.edge, paper.right, rule);
}

function boxesOf({ edge, y }: SheetPaper, widths: readonly number[], height: number): readonly Box[] {
  return widths.map((width, index) => ({
    x: edge + widths.slice(0, index).reduce((sum, one) => sum + one, 0),
    y,
    width,
    height,
  }));
}

function drawRow(paper: SheetPaper, cells: readonly Cell[], widths: readonly number[], height: number): void {
  const boxes = boxesOf(paper, widths, height);
  paper.group('TR', () =>
    cells.forEach(({ lines, ornament }, index) => {
      const box = boxes[index];
      if (!box) return;
      if (ornament) paper.ornament((doc) => ornament(doc, box));
      paper.tag('TD', () => setLines(paper, lines, box));
    }),
  );
  paper.y += height;
  paper.hairline(paper.y, paper.edge, paper.right, hair);
}

function setLines(paper: SheetPaper, lines: readonly Line[], box: Box): void {
  let y = box.y + pad;
  const width = innerWidth(box.width);
  for (const { text, style } of lines) {
    paper.set(text, style, { x: box.x + pad, y, width });
    y += paper.heightOf(text, style, width);
  }
}
