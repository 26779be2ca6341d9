import { z } from 'zod';
import { Day, line, Moment, prose, Uuid } from './common.js';

export const imageViews = ['front', 'back', 'side', 'inside', 'detail', 'label', 'tape', 'pattern'] as const;
export const ImageView = z.enum(imageViews);
export const imageViewLabels: Readonly<Record<z.infer<typeof ImageView>, string>> = {
  front: 'Front',
  back: 'Back',
  side: 'Side',
  inside: 'Inside',
  detail: 'Detail',
  label: 'Label',
  tape: 'The tape at a point',
  pattern: 'Hand-drawn pattern',
};

/** Widths of the smaller forms in pixels. A form is never wider than its original. */
export const formWidths = [320, 640, 1280, 1920] as const;
export const formFormats = ['avif', 'jpg'] as const;

/** received → making (with progress) → ready, or refused with a sentence. */
export const ImageState = z.enum(['received', 'making', 'ready', 'refused']);

export const Image = z.object({
  id: Uuid,
  garmentId: Uuid,
  version: z.number().int(),
  position: z.number().int(),
  view: ImageView,
  alt: z.string(),
  caption: z.string(),
  credit: z.string(),
  hidden: z.boolean(),
  fileName: z.string(),
  state: ImageState,
  /** Forms made and forms wanted, while `state` is `making`: a true fraction. */
  formsMade: z.number().int(),
  formsWanted: z.number().int(),
  refusal: z.string().nullable(),
  widthPx: z.number().int().nullable(),
  heightPx: z.number().int().nullable(),
  widths: z.array(z.number().int()),
  pointId: z.string().nullable(),
  takenOn: Day.nullable(),
  createdAt: Moment,
});
export type Image = z.infer<typeof Image>;

/** `PATCH /workroom/images/:id` with If-Match. */
export const ImageChange = z.strictObject({
  view: ImageView.optional(),
  alt: prose(1000).optional(),
  caption: prose(1000).optional(),
  credit: prose(300).optional(),
  hidden: z.boolean().optional(),
  pointId: line(60).nullable().optional(),
  position: z.number().int().min(0).max(999).optional(),
});
export type ImageChange = z.infer<typeof ImageChange>;
export const Images = z.object({ items: z.array(Image) });
