import { EmailAddress } from '@ellwand/shared/records/session';
import { z } from 'zod';

const oneLine = z
  .string()
  .min(1)
  .max(300)
  .refine((text) => !/\p{Cc}/u.test(text), 'a subject is one line');

/** One letter to one person. */
export const Letter = z.object({ to: EmailAddress, subject: oneLine, text: z.string(), html: z.string() });
export type Letter = z.infer<typeof Letter>;
