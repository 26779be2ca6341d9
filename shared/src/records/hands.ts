import { z } from 'zod';
import { Uuid } from './common.js';

/** What somebody did at the measuring table. One person may do several; reading and holding take two. */
export const duties = ['read', 'held', 'wrote'] as const;
export const Duty = z.enum(duties);
export const dutyLabels: Readonly<Record<z.infer<typeof Duty>, string>> = {
  read: 'Read the tape',
  held: 'Held the tape and steadied the garment',
  wrote: 'Wrote the readings down',
};
export const SheetPerson = z.strictObject({ userId: Uuid, duty: Duty });
