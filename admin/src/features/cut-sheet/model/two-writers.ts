import { inUnit, type TypedSheet } from './typed-sheet.js';

/** The sections of a cut sheet: what one person or the other may have written. */
export const sectionWords = {
  pieces: 'Pieces and panel widths',
  darts: 'Darts',
  neck: 'Neck',
  underarm: 'Underarm',
  fullness: 'Pleats and gathers',
  bones: 'Boning',
  seams: 'Seams',
  note: 'Note on the cut',
  innerNote: 'Inner note',
  pattern: 'Hand-drawn pattern',
} as const satisfies Partial<Record<keyof TypedSheet, string>>;
export type Section = keyof typeof sectionWords;

export const sections = Object.keys(sectionWords) as Section[];

/** What another person kept while this form was open. */
export interface OtherWriter {
  readonly by: string | null;
  readonly at: string | null;
  readonly theirs: TypedSheet;
  /** Sections that both have written: one's own stand until one decides otherwise. */
  readonly both: readonly Section[];
}

const same = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other);

interface Versions {
  /** The sheet as it was when this form was opened, as the other person left it, and as it stands in the form. */
  readonly opened: TypedSheet;
  readonly theirs: TypedSheet;
  readonly mine: TypedSheet;
}

/** All in the unit of the form, so that a figure means the same wherever it ends up. */
function inOneUnit({ opened, theirs, mine }: Versions): Versions {
  return { opened: inUnit(opened, mine.unit), theirs: inUnit(theirs, mine.unit), mine };
}

/** Sections that both have changed, and not to the same. */
export function bothChanged(versions: Versions): readonly Section[] {
  const { opened, theirs, mine } = inOneUnit(versions);
  return sections.filter(
    (section) =>
      !same(opened[section], theirs[section]) &&
      !same(opened[section], mine[section]) &&
      !same(theirs[section], mine[section]),
  );
}

/** One's own wherever one has written; theirs where only they have. Nothing typed is lost. */
export function mergedSheet(versions: Versions): TypedSheet {
  const { opened, theirs, mine } = inOneUnit(versions);
  const entries = sections.map((section) => [
    section,
    same(opened[section], mine[section]) ? theirs[section] : mine[section],
  ]);
  return { ...mine, ...(Object.fromEntries(entries) as Pick<TypedSheet, Section>) };
}
