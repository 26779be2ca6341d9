import { describe, expect, it } from 'vitest';
import type { PublishedCutSheet } from '../records/cut-sheet.js';
import { cellText, saidColumns } from './cut-table.js';
import { cutTables } from './cut-tables.js';

const noWidths = { bust: null, waist: null, hip: null, hem: null };
const sheet: PublishedCutSheet = {
  pieces: [
    {
      key: 'front',
      name: 'Front',
      count: 2,
      onFold: false,
      grain: 'straight',
      layer: 'outside',
      widths: { ...noWidths, waist: '152.5', hem: '0' },
      note: '',
    },
    {
      key: 'collar',
      name: 'Collar',
      count: 1,
      onFold: true,
      grain: 'cross',
      layer: 'outside',
      widths: noWidths,
      note: '',
    },
  ],
  darts: [
    {
      key: 'd1',
      piece: 'front',
      where: '',
      count: 2,
      fromCentre: '58',
      centre: 'back',
      tip: '92',
      tipSide: 'below',
      length: null,
      intake: '31.75',
    },
  ],
  neck: { frontWidth: null, frontDepth: '72', backWidth: null, backDepth: null },
  underarm: { belowNeckPoint: null, aboveWaist: null },
  fullness: [],
  bones: [{ key: 'b1', where: 'Darts', count: 4, length: '162', material: '', position: '' }],
  seams: [],
  note: '',
  sums: [
    {
      level: 'waist',
      panels: 2,
      sumMm: '305',
      uncertaintyMm: '2.1',
      read: { label: 'Waist', valueMm: '306' },
    },
  ],
  pattern: {
    imageId: '0190a0a0-0000-7000-8000-0000000000aa',
    distanceMm: '400',
    drawnTo: '1:4',
    pairs: [{ name: 'Side seam', valueMm: '404.0099', uncertaintyMm: '1.1' }],
  },
};

const shown = () =>
  cutTables(sheet).map((table) => ({
    title: table.title,
    columns: saidColumns(table).map((place) => table.columns[place]?.label),
    rows: [...table.rows, ...(table.sums ?? [])].map(({ head, cells }) =>
      [head, ...saidColumns(table).map((place) => cellText(cells[place] ?? []))].join(' | '),
    ),
  }));

describe('a published cut sheet as tables', () => {
  it('has a table for everything that is said, and no column in which nothing is', () => {
    expect(shown()).toEqual([
      {
        title: 'Pieces',
        columns: ['Cut', 'Grain', 'Layer'],
        rows: ['Front | 2 | Straight | Outside', 'Collar | 1, on the fold | Cross | Outside'],
      },
      {
        title: 'Panel widths',
        columns: ['Waist', 'Hem'],
        rows: [
          'Front, 2 of it | 152.5 mm | 0 mm',
          'Sum of the panels | 305 mm ± 2.1 mm | ',
          'Round that was read | 306 mm | ',
        ],
      },
      {
        title: 'Darts',
        columns: ['Piece', 'How many', 'Stands', 'Tip', 'Intake'],
        rows: ['1 | Front | 2 | 58 mm from centre back | 92 mm below the waist | 31.75 mm'],
      },
      { title: 'Neck and underarm', columns: ['Length'], rows: ['Neck depth, front | 72 mm'] },
      {
        title: 'Boning',
        columns: ['How many', 'Length', 'Material'],
        rows: ['Darts | 4 | 162 mm | Not known'],
      },
      {
        title: 'Read off the hand-drawn pattern',
        columns: ['Length'],
        rows: ['Side seam | 404.0099 mm ± 1.1 mm'],
      },
    ]);
  });

  it('has a cell for every column of every row', () => {
    for (const { columns, rows, sums = [] } of cutTables(sheet))
      for (const { cells } of [...rows, ...sums]) expect(cells).toHaveLength(columns.length);
  });
});
