import {
  centreLabels,
  directionLabels,
  edgeLabels,
  fullnessLabels,
  grainLabels,
  layerLabels,
  levelNames,
  neckAndUnderarm,
  panelLevels,
  stitchingLabels,
  tipSideLabels,
} from '@ellwand/shared/cut-sheet/words';
import type { PublishedCutSheet } from '@ellwand/shared/records/cut-sheet';
import type { PublishedPart } from '@ellwand/shared/records/published-garment';

/** A field of a cut sheet: what tells it from every other, what it is called, and how its value reads. */
interface SaidField {
  readonly key: string;
  readonly label: string;
  readonly text: string;
}

type Fields = readonly (readonly [name: string, text: string | null])[];

const length = (mm: string | null) => mm && `${mm} mm`;

/** Everything that a part's cut sheet says, field by field, in the order of the sheet. */
export function cutSheetFields({ number, name, cutSheet }: PublishedPart): readonly SaidField[] {
  // Documents from before cut sheets have no such field at all.
  const sheet = (cutSheet as PublishedCutSheet | null | undefined) ?? null;
  if (!sheet) return [];
  return [...rowsOf(sheet), ...single(sheet)].map(({ key, label, text }) => ({
    key: `${number} cut sheet ${key}`,
    label: `${label} (${name})`,
    text,
  }));
}

function fieldsOf(key: string, label: string, fields: Fields): SaidField[] {
  return fields.flatMap(([field, text]) =>
    text ? [{ key: `${key} ${field}`, label: field ? `${label}, ${field}` : label, text }] : [],
  );
}

function rowsOf(sheet: PublishedCutSheet): SaidField[] {
  const titled = (word: string, where: string, index: number) =>
    where ? `${word} ${index + 1}, ${where}` : `${word} ${index + 1}`;
  return [
    ...sheet.pieces.flatMap((piece) => fieldsOf(piece.key, `Piece ${piece.name}`, pieceFields(piece))),
    ...sheet.darts.flatMap((dart, index) =>
      fieldsOf(dart.key, titled('Dart', dart.where, index), dartFields(dart, sheet)),
    ),
    ...sheet.fullness.flatMap((row, index) =>
      fieldsOf(row.key, titled('Fullness', row.where, index), [
        ['kind', fullnessLabels[row.kind]],
        ['count', row.count === null ? null : String(row.count)],
        ['depth', length(row.depth)],
        ['direction', row.direction === 'not-said' ? null : directionLabels[row.direction]],
        ['stitched down', length(row.stitchedDown)],
        ['note', row.note],
      ]),
    ),
    ...sheet.bones.flatMap((row, index) =>
      fieldsOf(row.key, titled('Bone', row.where, index), [
        ['count', String(row.count)],
        ['length', length(row.length)],
        ['material', row.material],
        ['position', row.position],
      ]),
    ),
    ...sheet.seams.flatMap((row, index) =>
      fieldsOf(row.key, titled('Seam', row.where, index), [
        ['allowance', length(row.allowance)],
        ['stitching', stitchingLabels[row.stitching]],
        ['stitches on 10 mm', row.stitchesPer10Mm],
        ['edge', edgeLabels[row.edge]],
        ['note', row.note],
      ]),
    ),
  ];
}

function pieceFields(piece: PublishedCutSheet['pieces'][number]): Fields {
  return [
    ['', `${piece.name}, cut ${piece.count}${piece.onFold ? ' on the fold' : ''}`],
    ['grain', grainLabels[piece.grain]],
    ['layer', layerLabels[piece.layer]],
    ...panelLevels.map(
      (level) => [`${levelNames[level].toLowerCase()} width`, length(piece.widths[level])] as const,
    ),
    ['note', piece.note],
  ];
}

function dartFields(dart: PublishedCutSheet['darts'][number], { pieces }: PublishedCutSheet): Fields {
  const from = centreLabels[dart.centre].toLowerCase();
  return [
    ['piece', pieces.find(({ key }) => key === dart.piece)?.name ?? null],
    ['count', String(dart.count)],
    ['place', dart.fromCentre && `${dart.fromCentre} mm from ${from}`],
    ['tip', dart.tip && `${dart.tip} mm ${tipSideLabels[dart.tipSide].toLowerCase()}`],
    ['length', length(dart.length)],
    ['intake', length(dart.intake)],
  ];
}

/** What a sheet says once. */
function single({ neck, underarm, note, pattern }: PublishedCutSheet): SaidField[] {
  const lengths = (
    labels: Readonly<Record<string, string>>,
    values: Readonly<Record<string, string | null>>,
  ) =>
    Object.entries(labels).flatMap(([field, label]) =>
      fieldsOf(field, label, [['', length(values[field] ?? null)]]),
    );
  return [
    ...lengths(neckAndUnderarm.neck, neck),
    ...lengths(neckAndUnderarm.underarm, underarm),
    ...fieldsOf('note', 'Note on the cut', [['', note]]),
    ...(pattern ? patternFields(pattern) : []),
  ];
}

function patternFields(pattern: NonNullable<PublishedCutSheet['pattern']>): SaidField[] {
  const { imageId, distanceMm, drawnTo, pairs } = pattern;
  return [
    ...fieldsOf(`pattern ${imageId}`, 'Hand-drawn pattern', [
      ['', `${distanceMm} mm between its marks`],
      ['scale', drawnTo],
    ]),
    ...pairs.flatMap(({ name, valueMm, uncertaintyMm }, index) =>
      fieldsOf(`pattern pair ${index}`, `Read off the pattern, ${name}`, [
        ['', `${valueMm} mm ± ${uncertaintyMm} mm`],
      ]),
    ),
  ];
}
