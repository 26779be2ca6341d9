import type { PublishedCutSheet } from '../records/cut-sheet.js';
import { type CutTable, length, words } from './cut-table.js';
import { directionLabels, edgeLabels, fullnessLabels, stitchingLabels } from './words.js';

export function fullnessTable({ fullness }: PublishedCutSheet): CutTable {
  return {
    id: 'fullness',
    title: 'Pleats and gathers',
    head: 'Where',
    columns: [
      { label: 'Kind' },
      { label: 'How many', figures: true },
      { label: 'Depth', figures: true },
      { label: 'Laid' },
      { label: 'Stitched down', figures: true },
      { label: 'Note' },
    ],
    rows: fullness.map(({ key, where, kind, count, depth, direction, stitchedDown, note }) => ({
      key,
      head: where,
      said: `Pleats or gathers, ${where}`,
      cells: [
        words(fullnessLabels[kind]),
        words(count === null ? null : String(count)),
        length(depth),
        words(direction === 'not-said' ? null : directionLabels[direction]),
        length(stitchedDown),
        words(note),
      ],
    })),
  };
}

export function bonesTable({ bones }: PublishedCutSheet): CutTable {
  return {
    id: 'bones',
    title: 'Boning',
    head: 'Seam or channel',
    columns: [
      { label: 'How many', figures: true },
      { label: 'Length', figures: true },
      { label: 'Material' },
      { label: 'Position' },
    ],
    rows: bones.map((bone) => ({
      key: bone.key,
      head: bone.where,
      said: `Bone, ${bone.where}`,
      cells: [
        words(String(bone.count)),
        length(bone.length),
        words(bone.material || 'Not known'),
        words(bone.position),
      ],
    })),
  };
}

export function seamsTable({ seams }: PublishedCutSheet): CutTable {
  return {
    id: 'seams',
    title: 'Seams',
    head: 'Seam',
    columns: [
      { label: 'Allowance', figures: true },
      { label: 'Sewn' },
      { label: 'Stitches on 10 mm', figures: true },
      { label: 'Edge' },
      { label: 'Note' },
    ],
    rows: seams.map(({ key, where, allowance, stitching, stitchesPer10Mm, edge, note }) => ({
      key,
      head: where,
      said: `Seam, ${where}`,
      cells: [
        length(allowance),
        words(stitchingLabels[stitching]),
        words(stitchesPer10Mm),
        words(edgeLabels[edge]),
        words(note),
      ],
    })),
  };
}

export function patternTable({ pattern }: PublishedCutSheet): CutTable {
  return {
    id: 'pattern',
    title: 'Read off the hand-drawn pattern',
    head: 'What',
    columns: [{ label: 'Length', said: '', figures: true }],
    rows: (pattern?.pairs ?? []).map(({ name, valueMm, uncertaintyMm }, index) => ({
      key: String(index),
      head: name,
      said: `Read off the pattern, ${name}`,
      cells: [[{ mm: valueMm, uncertaintyMm }]],
    })),
  };
}
