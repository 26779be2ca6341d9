const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', hour12: false });
const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
const shortDay = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** "14:32" where the reader sits. */
export const timeText = (moment: string | number | Date): string => time.format(new Date(moment));

/** "1 December 2026". */
export const dayText = (moment: string | number | Date): string => day.format(new Date(moment));

/** "1 Dec 2026, 14:32". */
export const momentText = (moment: string): string =>
  `${shortDay.format(new Date(moment))}, ${timeText(moment)}`;

/** Today as the table's calendar says it, `2026-12-01`; not the day in Greenwich. */
export function today(now = new Date()): string {
  const pad = (value: number) => String(value).padStart(2, '0');
  return `${now.getFullYear()}-${pad(now.getMonth() + 1)}-${pad(now.getDate())}`;
}
