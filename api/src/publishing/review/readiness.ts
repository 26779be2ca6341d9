import { readDate } from '@ellwand/shared/records/edtf-date';
import type { GarmentRecord } from '@ellwand/shared/records/garment';
import type { Image } from '@ellwand/shared/records/image';
import type { Readiness } from '@ellwand/shared/records/publishing';
import type { z } from 'zod';

type Entry = z.output<typeof Readiness>;

/** What readiness looks at, gathered by the review service. */
export interface ReadinessFacts {
  readonly garmentId: string;
  readonly record: GarmentRecord;
  readonly parts: readonly {
    readonly name: string;
    readonly sheets: readonly { readonly id: string; readonly state: string; readonly purpose: string }[];
  }[];
  readonly images: readonly Image[];
  /** Questions without an answer, by the sheet that speaks for each part. */
  readonly openQuestions: readonly {
    readonly sheetId: string;
    readonly partName: string;
    readonly count: number;
  }[];
}

/** What still keeps a record from the next step, each in one sentence with the place to mend it. */
export function readiness(facts: ReadinessFacts): Entry[] {
  return [...aboutRecord(facts), ...aboutSheets(facts), ...aboutPictures(facts), ...aboutQuestions(facts)];
}

const garmentHref = ({ garmentId }: ReadinessFacts) => `/garments/${garmentId}`;

function aboutRecord(facts: ReadinessFacts): Entry[] {
  if (readDate(facts.record.date)) return [];
  const sentence = `The date “${facts.record.date}” cannot be read. Write a year or a span, such as 1885~ or 1858/1861.`;
  return [{ blocks: 'submit', sentence, href: garmentHref(facts) }];
}

function aboutSheets(facts: ReadinessFacts): Entry[] {
  const sheets = facts.parts.flatMap((part) =>
    // A study sheet is never published: whether it is done is no matter of the record's.
    part.sheets.filter(({ purpose }) => purpose === 'record').map((sheet) => ({ ...sheet, part: part.name })),
  );
  const open = sheets.filter((sheet) => sheet.state === 'open');
  if (sheets.length === 0)
    return [{ blocks: 'submit', sentence: 'Nothing has been measured yet.', href: garmentHref(facts) }];
  return open.map((sheet) => ({
    blocks: 'submit',
    sentence: `${sheet.part}: the measuring sheet is still open.`,
    href: `/sheets/${sheet.id}`,
  }));
}

function aboutPictures(facts: ReadinessFacts): Entry[] {
  const shown = facts.images.filter((image) => !image.hidden && image.state !== 'refused');
  const making = shown.filter((image) => image.state !== 'ready').length;
  const wordless = shown.filter((image) => image.alt.trim() === '').length;
  const href = garmentHref(facts);
  const entries: Entry[] = [];
  if (making > 0)
    entries.push({ blocks: 'submit', sentence: `${pictures(making)} still being made ready.`, href });
  if (wordless > 0)
    entries.push({ blocks: 'submit', sentence: `${pictures(wordless)} without an alternative text.`, href });
  return entries;
}

const pictures = (count: number) => (count === 1 ? 'One picture is' : `${count} pictures are`);

function aboutQuestions(facts: ReadinessFacts): Entry[] {
  return facts.openQuestions
    .filter((open) => open.count > 0)
    .map((open) => ({
      blocks: 'approve',
      sentence: `${open.partName}: ${open.count === 1 ? 'one question is' : `${open.count} questions are`} open.`,
      href: `/sheets/${open.sheetId}`,
    }));
}
