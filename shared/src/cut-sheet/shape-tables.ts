import type { PublishedCutSheet } from '../records/cut-sheet.js';
import { type Cell, type CutRow, type CutTable, length, words } from './cut-table.js';
import {
  centreLabels,
  grainLabels,
  layerLabels,
  levelNames,
  neckAndUnderarm,
  panelLevels,
  tipSideLabels,
} from './words.js';

export function piecesTable({ pieces }: PublishedCutSheet): CutTable {
  return {
    id: 'pieces',
    title: 'Pieces',
    head: 'Piece',
    columns: [{ label: 'Cut' }, { label: 'Grain' }, { label: 'Layer' }, { label: 'Note' }],
    rows: pieces.map(({ key, name, count, onFold, grain, layer, note }) => ({
      key,
      head: name,
      said: `Piece ${name}`,
      cells: [
        words(`${count}${onFold ? ', on the fold' : ''}`),
        words(grainLabels[grain]),
        words(layerLabels[layer]),
        words(note),
      ],
    })),
  };
}

export function panelsTable({ pieces, sums }: PublishedCutSheet): CutTable {
  const panels = pieces.filter(({ widths }) => Object.values(widths).some((width) => width !== null));
  const sumRow = (key: string, head: string, of: (sum: (typeof sums)[number]) => Cell): CutRow => ({
    key,
    head,
    said: head,
    cells: panelLevels.map((level) => {
      const sum = sums.find((each) => each.level === level);
      return sum ? of(sum) : [];
    }),
  });
  const readRow = sumRow('read', 'Round that was read', ({ read }) => length(read?.valueMm ?? null));
  return {
    id: 'panels',
    title: 'Panel widths',
    head: 'Panel',
    columns: panelLevels.map((level) => ({
      label: levelNames[level],
      said: `${levelNames[level].toLowerCase()} width`,
      figures: true,
    })),
    rows: panels.map(({ key, name, count, widths }) => ({
      key,
      head: count > 1 ? `${name}, ${count} of it` : name,
      said: `Piece ${name}`,
      cells: panelLevels.map((level) => length(widths[level])),
    })),
    sums: [
      sumRow('sum', 'Sum of the panels', ({ sumMm, uncertaintyMm }) => [{ mm: sumMm, uncertaintyMm }]),
      readRow,
    ].filter(({ cells }) => cells.some((cell) => cell.length > 0)),
  };
}

export function dartsTable({ darts, pieces }: PublishedCutSheet): CutTable {
  return {
    id: 'darts',
    title: 'Darts',
    head: 'Dart',
    columns: [
      { label: 'Piece' },
      { label: 'How many', figures: true },
      { label: 'Stands' },
      { label: 'Tip' },
      { label: 'Length', figures: true },
      { label: 'Intake', figures: true },
    ],
    rows: darts.map((dart, index) => ({
      key: dart.key,
      head: dart.where || String(index + 1),
      said: dart.where ? `Dart ${index + 1}, ${dart.where}` : `Dart ${index + 1}`,
      cells: [
        words(pieces.find(({ key }) => key === dart.piece)?.name ?? null),
        words(String(dart.count)),
        lengthThen(dart.fromCentre, `from ${centreLabels[dart.centre].toLowerCase()}`),
        lengthThen(dart.tip, tipSideLabels[dart.tipSide].toLowerCase()),
        length(dart.length),
        length(dart.intake),
      ],
    })),
  };
}

const lengthThen = (mm: string | null, after: string): Cell => (mm === null ? [] : [{ mm }, after]);

export function neckTable({ neck, underarm }: PublishedCutSheet): CutTable {
  const rowsOf = (
    labels: Readonly<Record<string, string>>,
    lengths: Readonly<Record<string, string | null>>,
  ) =>
    Object.entries(labels).flatMap(([field, label]): CutRow[] => {
      const mm = lengths[field] ?? null;
      return mm === null ? [] : [{ key: field, head: label, said: label, cells: [length(mm)] }];
    });
  return {
    id: 'neck',
    title: 'Neck and underarm',
    head: 'Where',
    columns: [{ label: 'Length', said: '', figures: true }],
    rows: [...rowsOf(neckAndUnderarm.neck, neck), ...rowsOf(neckAndUnderarm.underarm, underarm)],
  };
}
