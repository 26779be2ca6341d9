import { Day, line, prose, Uuid } from '@ellwand/shared/records/common';
import { Image, ImageChange, Images, ImageView } from '@ellwand/shared/records/image';
import { createZodDto } from 'nestjs-zod';
import { z } from 'zod';

/** The texts that come beside the file: multipart fields, so an empty one means that nothing was said. */
export const ImageFields = z.strictObject({
  /** UUIDv7 made where the picture was taken: sent twice, it is one picture. */
  id: Uuid.optional(),
  view: ImageView,
  alt: prose(1000).default(''),
  caption: prose(1000).default(''),
  credit: prose(300).default(''),
  pointId: z.preprocess((text) => (text === '' ? null : text), line(60).nullable().default(null)),
  takenOn: z.preprocess((text) => (text === '' ? null : text), Day.nullable().default(null)),
});
export type ImageFields = z.output<typeof ImageFields>;

export class ImageDto extends createZodDto(Image) {}
export class ImagesDto extends createZodDto(Images) {}
export class ImageChangeDto extends createZodDto(ImageChange) {}
export class ImageFieldsDto extends createZodDto(ImageFields) {}

export class FormParam extends createZodDto(z.object({ id: Uuid, form: z.string().max(20) })) {}
