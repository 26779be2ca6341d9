// Written out: the browser's own calendar takes longer to be read in than the sheet to be drawn.
const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];
const twoDigits = (value: number) => String(value).padStart(2, '0');

/** "14:32" where the reader sits. */
export function timeText(moment: string | number | Date): string {
  const at = new Date(moment);
  return `${twoDigits(at.getHours())}:${twoDigits(at.getMinutes())}`;
}

/** "1 December 2026". */
export function dayText(moment: string | number | Date): string {
  const at = new Date(moment);
  return `${at.getDate()} ${months[at.getMonth()]} ${at.getFullYear()}`;
}

/** "1 Dec 2026, 14:32". */
export function momentText(moment: string): string {
  const at = new Date(moment);
  return `${at.getDate()} ${months[at.getMonth()]?.slice(0, 3)} ${at.getFullYear()}, ${timeText(at)}`;
}

/** Today as the table's calendar says it, `2026-12-01`; not the day in Greenwich. */
export function today(now = new Date()): string {
  return `${now.getFullYear()}-${twoDigits(now.getMonth() + 1)}-${twoDigits(now.getDate())}`;
}
