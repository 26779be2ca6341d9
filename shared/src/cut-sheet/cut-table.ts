/** A table of a published cut sheet as data: what is said, under which heading; pages paint it. */

/** A length in decimal millimetres, for the page to show in the reader's unit. */
export interface CellLength {
  readonly mm: string;
  readonly uncertaintyMm?: string;
}

/** What one cell says: words and lengths one after the other; nothing where nothing was said. */
export type Cell = readonly (string | CellLength)[];

export interface CutColumn {
  readonly label: string;
  /** In a sentence, where it is called something else there: "waist width". */
  readonly said?: string;
  /** Lengths or numbers alone, to be set right. */
  readonly figures?: boolean;
}

export interface CutRow {
  readonly key: string;
  /** The row's own heading. */
  readonly head: string;
  /** What a sentence calls it: "Piece Front", "Dart 2". */
  readonly said: string;
  /** One for each column. */
  readonly cells: readonly Cell[];
}

export interface CutTable {
  readonly id: string;
  readonly title: string;
  readonly head: string;
  readonly columns: readonly CutColumn[];
  readonly rows: readonly CutRow[];
  /** Under the rows: what they come to. */
  readonly sums?: readonly CutRow[];
}

export const words = (text: string | null): Cell => (text ? [text] : []);
export const length = (mm: string | null): Cell => (mm === null ? [] : [{ mm }]);

/** The columns in which anything is said, by their places. */
export function saidColumns({ columns, rows, sums = [] }: CutTable): readonly number[] {
  const all = [...rows, ...sums];
  return columns.flatMap((_column, place) =>
    all.some(({ cells }) => (cells[place] ?? []).length > 0) ? [place] : [],
  );
}

/** Words and lengths of a cell in millimetres: "58 mm from centre front", "404 mm ± 1.1 mm". */
export function cellText(cell: Cell): string {
  return cell
    .map((part) =>
      typeof part === 'string'
        ? part
        : `${part.mm} mm${part.uncertaintyMm === undefined ? '' : ` ± ${part.uncertaintyMm} mm`}`,
    )
    .join(' ');
}
