import { type Image, ImageChange } from '@ellwand/shared/records/image';
import { image } from './garments.js';
import type { House } from './house.js';
import { Refusal, read } from './refuse.js';
import { json, matched, nothing, type Routes } from './router.js';

const FORMS = 8;

function found(house: House, id: string) {
  for (const garment of house.garments) {
    const picture = garment.images.find((one) => one.id === id);
    if (picture) return { garment, picture };
  }
  throw new Refusal(404, 'image.unknown');
}

/** Each time somebody asks, a few more smaller forms are ready. */
function goOn(picture: Image): void {
  if (picture.state === 'received') picture.state = 'making';
  else if (picture.state === 'making') {
    picture.formsMade = Math.min(FORMS, picture.formsMade + 3);
    if (picture.formsMade === FORMS) picture.state = 'ready';
  }
}

export const imageRoutes: Routes = {
  'POST /workroom/garments/:id/images': ({ house, params, form }) => {
    const file = form?.get('file');
    const garment = house.garment(params.id);
    if (!garment || !file || typeof file === 'string') throw new Refusal(400, 'image.missing');
    if (file.name.endsWith('.svg'))
      throw new Refusal(415, 'image.type', {}, 'SVG is not kept. JPEG, PNG, WebP and TIFF are.');
    if (file.name.startsWith('broken'))
      throw new Refusal(422, 'image.refused', {}, 'The picture ends in the middle: it was not copied whole.');
    const fresh = image(
      garment.images.length + 700 + garment.images.length,
      garment.id,
      garment.images.length,
      { fileName: file.name, state: 'received', formsMade: 0, id: house.newId() },
    );
    garment.images.push(fresh);
    return json(fresh, 201);
  },
  'GET /workroom/garments/:id/images': ({ house, params }) => {
    const garment = house.garment(params.id);
    if (!garment) throw new Refusal(404, 'garment.unknown');
    garment.images.forEach(goOn);
    return json({ items: garment.images });
  },
  'PATCH /workroom/images/:id': ({ house, params, body, version }) => {
    const { garment, picture } = found(house, params.id);
    matched(picture.version, version);
    const { position, ...change } = read(ImageChange, body);
    Object.assign(picture, change, { version: picture.version + 1 });
    if (position !== undefined) {
      const others = garment.images.filter(({ id }) => id !== picture.id);
      garment.images = [...others.slice(0, position), picture, ...others.slice(position)];
      garment.images.forEach((one, index) => (one.position = index));
    }
    return json(picture);
  },
  'DELETE /workroom/images/:id': ({ house, params, version }) => {
    const { garment, picture } = found(house, params.id);
    matched(picture.version, version);
    garment.images = garment.images.filter(({ id }) => id !== picture.id);
    return nothing();
  },
};
