import { cellText, type CutRow, type CutTable } from '@ellwand/shared/cut-sheet/cut-table';
import { cutTables } from '@ellwand/shared/cut-sheet/cut-tables';
import type { PublishedCutSheet } from '@ellwand/shared/records/cut-sheet';
import type { PublishedPart } from '@ellwand/shared/records/published-garment';

/** A field of a cut sheet: what tells it from every other, what it is called, and how its value reads. */
interface SaidField {
  readonly key: string;
  readonly label: string;
  readonly text: string;
}

/** Everything that a part's cut sheet says, field by field, in the order of the sheet; sums follow from their panels. */
export function cutSheetFields({ number, name, cutSheet }: PublishedPart): readonly SaidField[] {
  // Documents from before cut sheets have no such field at all.
  const sheet = (cutSheet as PublishedCutSheet | null | undefined) ?? null;
  if (!sheet) return [];
  const cells = cutTables(sheet).flatMap((table) => table.rows.flatMap((row) => cellsOf(table, row)));
  return [...cells, ...single(sheet)].map(({ key, label, text }) => ({
    key: `${number} cut sheet ${key}`,
    label: `${label} (${name})`,
    text,
  }));
}

function cellsOf({ id, columns }: CutTable, { key, said, cells }: CutRow): SaidField[] {
  return columns.map((column, place) => {
    const field = column.said ?? column.label.toLowerCase();
    return {
      key: `${id} ${key} ${column.label}`,
      label: field ? `${said}, ${field}` : said,
      text: cellText(cells[place] ?? []),
    };
  });
}

function single({ note, pattern }: PublishedCutSheet): SaidField[] {
  const scale = pattern && [`${pattern.distanceMm} mm between its marks`, pattern.drawnTo].filter(Boolean);
  return [
    { key: 'note', label: 'Note on the cut', text: note },
    { key: `pattern ${pattern?.imageId}`, label: 'Hand-drawn pattern', text: scale?.join(', ') ?? '' },
  ];
}
