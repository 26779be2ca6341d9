import { formFormats, formWidths } from '@ellwand/shared/records/image';
import { type PictureType, pictureTypes } from '../intake/sniff-picture';

export type FormFormat = (typeof formFormats)[number];

/** One smaller form of a picture. */
export interface PictureForm {
  readonly widthPx: number;
  readonly format: FormFormat;
}

export const formMediaTypes: Readonly<Record<FormFormat, string>> = { avif: 'image/avif', jpg: 'image/jpeg' };

/** UUIDv7 begin with the time; their last digits spread evenly over 256 folders. */
const shelf = (id: string) => id.slice(-2);

export const originalKey = (id: string, type: PictureType) =>
  `originals/${shelf(id)}/${id}.${pictureTypes[type].extension}`;
/** The upright sRGB picture that forms are made of; kept until they all are. */
export const masterKey = (id: string) => `masters/${shelf(id)}/${id}.tif`;
export const formKey = (id: string, { widthPx, format }: PictureForm) =>
  `forms/${shelf(id)}/${id}/${widthPx}.${format}`;

/** Widths of the forms of an original: never wider than itself. */
export function widthsFor(originalWidthPx: number): number[] {
  return formWidths.filter((width) => width <= originalWidthPx);
}

/** All forms of an original, in the order in which they are made: small ones first, to be seen early. */
export function formsFor(originalWidthPx: number): PictureForm[] {
  return widthsFor(originalWidthPx).flatMap((widthPx) =>
    (['jpg', 'avif'] as const satisfies readonly FormFormat[]).map((format) => ({ widthPx, format })),
  );
}

/** Reads `640.avif`; null for anything else. */
export function parseFormName(name: string): PictureForm | null {
  const found = /^([1-9]\d{1,4})\.(avif|jpg)$/.exec(name);
  const format = formFormats.find((known) => known === found?.[2]);
  return found && format ? { widthPx: Number(found[1]), format } : null;
}
