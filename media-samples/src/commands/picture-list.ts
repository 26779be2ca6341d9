import { existsSync } from 'node:fs';
import { writeFile } from 'node:fs/promises';
import sharp from 'sharp';
import type { Garment, GarmentPicture, View } from '../garments/garment';

export interface PictureFile {
  garment: Garment;
  picture: GarmentPicture;
  /** `lh-1966-30-front.jpg` */
  name: string;
}

/** Every picture of every garment with the name of its file. */
export const pictureFiles = (garments: readonly Garment[]): PictureFile[] =>
  garments.flatMap((garment) =>
    garment.pictures.map((picture) => ({
      garment,
      picture,
      name: `${garment.number.toLowerCase().replaceAll('.', '-')}-${picture.name}.jpg`,
    })),
  );

/** One entry of pictures.json: what the demonstration needs to show a picture honestly. */
export interface PictureEntry {
  file: string;
  number: string;
  view: View;
  alt: string;
  caption: string;
  widthPx: number;
  heightPx: number;
  /** Millimetres of the garment to one pixel, in the plane of the garment's middle. */
  mmPerPx: number;
}

/** Writes pictures.json for the pictures that are there. */
export async function writePictureList(garments: readonly Garment[], folder: string): Promise<void> {
  const entries: PictureEntry[] = [];
  for (const { garment, picture, name } of pictureFiles(garments)) {
    if (!existsSync(`${folder}${name}`)) continue;
    const { width, height } = await sharp(`${folder}${name}`).metadata();
    entries.push({
      file: name,
      number: garment.number,
      view: picture.view,
      alt: picture.alt,
      caption: picture.caption,
      widthPx: width,
      heightPx: height,
      mmPerPx: Number(((picture.shot.camera.span * 10) / height).toFixed(4)),
    });
  }
  await writeFile(`${folder}pictures.json`, `${JSON.stringify(entries, null, 2)}\n`);
}
