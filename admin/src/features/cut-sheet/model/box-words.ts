import { levelNames, neckAndUnderarm, panelLevels } from '@ellwand/shared/cut-sheet/words';

/** What each box is called, by the row it stands in; the page's labels and the list of mistakes both read this. */
export const boxWords: Readonly<Record<string, string>> = {
  name: 'name',
  count: 'how many',
  grain: 'grain',
  layer: 'layer',
  piece: 'piece',
  where: 'where',
  fromCentre: 'from the centre line',
  tip: 'height of the tip',
  length: 'length',
  intake: 'intake',
  depth: 'depth',
  stitchedDown: 'stitched down',
  material: 'material',
  position: 'position',
  allowance: 'allowance',
  stitchesPer10Mm: 'stitches on 10 mm',
  note: 'note',
  'bones.where': 'seam or channel',
  'seams.where': 'which seam',
  ...Object.fromEntries(panelLevels.map((level) => [level, `${levelNames[level].toLowerCase()} width`])),
};

/** One of the rows of each list: "Piece 2". */
export const rowWords: Readonly<Record<string, string>> = {
  pieces: 'Piece',
  darts: 'Dart',
  fullness: 'Pleats or gathers',
  bones: 'Bone',
  seams: 'Seam',
  pairs: 'Pair',
};

const single: Readonly<Record<string, string>> = {
  ...neckAndUnderarm.neck,
  ...neckAndUnderarm.underarm,
  imageId: 'Picture of the pattern',
  distance: 'Distance on the garment',
  onPaper: 'Distance on the paper',
  note: 'Note on the cut',
  innerNote: 'Inner note',
};

const markWords: Readonly<Record<string, string>> = { from: 'first mark', to: 'second mark' };

/** "Piece 2, waist width" for `pieces.1.widths.waist`: which of many like boxes a sentence is about. */
export function placeOf(name: string): string {
  const row = /(?:^|\.)(\w+)\.(\d+)\./.exec(name);
  const mark = /(marks|pairs\.\d+)\.(from|to)/.exec(name)?.[2];
  const last = name.split('.').at(-1) ?? name;
  if (!row) return mark ? `Scale, ${markWords[mark]}` : (single[last] ?? last);
  const which = `${rowWords[row[1] ?? ''] ?? row[1]} ${Number(row[2]) + 1}`;
  const box = boxWords[`${row[1]}.${last}`] ?? boxWords[last] ?? last;
  return `${which}, ${mark ? markWords[mark] : box}`;
}
