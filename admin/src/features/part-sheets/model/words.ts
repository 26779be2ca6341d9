import type { PartSheets, SheetOfPart } from '@ellwand/shared/records/part-sheets';
import { absolute, type Length } from '@ellwand/shared/units/length';
import { readMm } from '@ellwand/shared/units/format-length';
import { dayText, momentText } from '../../../lib/moments.js';

/** "5 mm shorter" than on the sheet before. */
export function changeText(change: Length): string {
  return `${readMm(absolute(change))} ${change < 0 ? 'shorter' : 'longer'}`;
}

/** Where a sheet stands: "Complete", "Open", "For study". */
export function standingText({ state, purpose }: SheetOfPart): string {
  if (purpose === 'study') return 'For study';
  return state === 'open' ? 'Open' : 'Complete';
}

export const maySpeak = ({ state, purpose }: SheetOfPart): boolean =>
  state === 'complete' && purpose === 'record';

/** What the public sees now, in one sentence. */
export function publishedText({ published, sheets }: PartSheets): string {
  const sheet = sheets.find(({ id }) => id === published?.sheetId);
  if (!published || !sheet) return 'None of these sheets is public now.';
  return `Public now: the sheet of ${dayText(sheet.measuredOn)}, in version ${published.version}.`;
}

/** Which sheet speaks for the part when it is next published, and why, in one sentence. */
export function speakingText({ speaking, chosen, published, sheets }: PartSheets): string {
  const sheet = sheets.find(({ id }) => id === speaking?.sheetId);
  if (!sheet) return 'No sheet can be published yet: none is complete and for the record.';
  const which = sheet.id === published?.sheetId ? 'It' : `The sheet of ${dayText(sheet.measuredOn)}`;
  if (!chosen) return `${which} speaks for the part, as the newest complete one.`;
  return `${which} speaks for the part, chosen by ${chosen.by}, ${momentText(chosen.at)}: ${chosen.because}`;
}

const did = { read: 'read', held: 'held', wrote: 'wrote' } as const;

/** "Wren Aldous read and wrote; Imogen Sallow held". */
export function peopleText({ people }: SheetOfPart): string {
  const names = [...new Set(people.map(({ name }) => name))];
  const of = (name: string) => people.filter((one) => one.name === name).map(({ duty }) => did[duty]);
  return names.map((name) => `${name} ${of(name).join(' and ')}`).join('; ');
}
