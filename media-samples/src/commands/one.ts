import { mkdir } from 'node:fs/promises';
import { dirname } from 'node:path';
import type { Garment, GarmentPicture } from '../garments/garment';
import { takePicture } from '../renderer/picture';
import { Scene } from '../renderer/scene';

export interface Size {
  /** The longer side, px. */
  longSide: number;
  oversample: number;
}

export function pixelsOf(picture: GarmentPicture, longSide: number): { width: number; height: number } {
  const { aspect } = picture.shot.camera;
  return aspect > 1
    ? { width: longSide, height: Math.round(longSide / aspect) }
    : { width: Math.round(longSide * aspect), height: longSide };
}

/** Fineness of meshes that a picture of this size needs. */
const finenessAt = (longSide: number): number => Math.min(1, Math.max(0.45, longSide / 2600));

const MARK = 'rendered; invented garment';
const XMP = `<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"><rdf:Description xmlns:dc="http://purl.org/dc/elements/1.1/"><dc:description><rdf:Alt><rdf:li xml:lang="x-default">${MARK}</rdf:li></rdf:Alt></dc:description></rdf:Description></rdf:RDF></x:xmpmeta>`;

/** Renders one picture into `file` as a JPEG that says, inside, what it is. */
export async function renderPicture(
  garment: Garment,
  picture: GarmentPicture,
  size: Size,
  file: string,
): Promise<void> {
  const scene = new Scene(Math.min(1, finenessAt(size.longSide) * (picture.fineness ?? 1)));
  (picture.build ?? garment.build)(scene);
  const { width, height } = pixelsOf(picture, size.longSide);
  await mkdir(dirname(file), { recursive: true });
  await takePicture(scene, picture.shot, { widthPx: width, heightPx: height, oversample: size.oversample })
    .withExif({ IFD0: { ImageDescription: MARK } })
    .withXmp(XMP)
    .jpeg({ quality: 86, mozjpeg: true, chromaSubsampling: '4:4:4' })
    .toFile(file);
}
