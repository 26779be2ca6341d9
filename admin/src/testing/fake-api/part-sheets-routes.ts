import type { Garment, Part } from '@ellwand/shared/records/garment';
import { SpeakingSheet } from '@ellwand/shared/records/part-sheets';
import type { House } from './house.js';
import { partSheetsOf } from './part-sheets.js';
import { read, Refusal } from './refuse.js';
import { json, matched, type Routes } from './router.js';

function known(house: House, partId: string): { garment: Garment; part: Part } {
  for (const garment of house.garments) {
    const part = garment.parts.find(({ id }) => id === partId);
    if (part) return { garment, part };
  }
  throw new Refusal(404, 'part.unknown', {}, 'There is no such part.');
}

export const partSheetsRoutes: Routes = {
  'GET /workroom/parts/:id/sheets': ({ house, params }) => {
    const { garment, part } = known(house, params.id);
    return json(partSheetsOf(house, garment, part));
  },
  'PUT /workroom/parts/:id/speaking-sheet': ({ house, params, body, version }) => {
    const { garment, part } = known(house, params.id);
    matched(garment.version, version);
    const { sheetId, reason } = read(SpeakingSheet, body);
    if (sheetId === null) house.choices.delete(part.id);
    else
      house.choices.set(part.id, {
        sheetId,
        because: reason,
        by: house.signedIn!.name,
        at: new Date().toISOString(),
      });
    Object.assign(garment, { version: garment.version + 1, stage: 'draft' });
    return json(partSheetsOf(house, garment, part));
  },
  'POST /workroom/garments/:id/worn-together': ({ house, params, version }) => {
    const garment = house.garment(params.id);
    if (!garment) throw new Refusal(404, 'garment.unknown');
    if (garment.parts.some(({ wornTogether }) => wornTogether)) return json(garment, 201);
    matched(garment.version, version);
    garment.parts.push({
      id: house.newId(),
      garmentId: garment.id,
      suffix: 'worn',
      kind: 'dress',
      name: 'Laid together as worn',
      position: 999,
      wornTogether: true,
      sheets: [],
    });
    garment.version += 1;
    return json(garment, 201);
  },
};
