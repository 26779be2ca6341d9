import { z } from 'zod';

/** A UUID of any version, in small letters as it is kept; ids made by Ellwand are UUIDv7, so that they sort by time. */
export const Uuid = z.uuid().toLowerCase();

/** An exact length in millimetres as a decimal string of at most four places: "612", "920.75". Never a float. */
export const LengthMm = z
  .string()
  .regex(
    /^\d{1,6}(\.\d{1,4})?$/,
    'a length in millimetres with at most four decimal places, for example 612 or 920.75',
  );

/** A moment: ISO 8601 in UTC, `2026-12-01T09:30:00.000Z`. */
export const Moment = z.iso.datetime();

/** A calendar day, `2026-12-01`. */
export const Day = z.iso.date();

/** One line of text: trimmed, at least one character, without control characters. */
export const line = (longest: number) =>
  z
    .string()
    .trim()
    .min(1, 'Write something here')
    .max(longest, `At most ${longest} characters`)
    .refine(
      (text) => ![...text].some((c) => c < ' ' || c === '\u007f'),
      'One line, without control characters',
    );

/** Several lines of plain text; empty means "nothing said". Never markup. */
export const prose = (longest: number) =>
  z
    .string()
    .trim()
    .max(longest, `At most ${longest} characters`)
    .refine((text) => !text.includes('\u0000'), 'Plain text');

/** Numbers of pages begin at 1; `size` is at most 100. */
export const Paging = z.object({
  page: z.coerce.number().int().min(1).default(1),
  size: z.coerce.number().int().min(1).max(100).default(24),
});

/** A page of anything: how many there are in all, which page this is, and what is on it. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({ total: z.number().int(), page: z.number().int(), size: z.number().int(), items: z.array(item) });
