const day = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});
const moment = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
  hour12: false,
  timeZoneName: 'short',
});

/** A day of the calendar: "1 December 2026". */
export const dayOnPaper = (text: string): string => day.format(new Date(`${text}T00:00:00Z`));

/** A moment where the museum's machine stands, with its time zone: paper travels. */
export const momentOnPaper = (at: string | Date): string => moment.format(new Date(at));
