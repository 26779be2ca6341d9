import { emptyCutSheet, keptCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import { roundsRead } from '@ellwand/shared/cut-sheet/rounds-read';
import { type CutSheet, NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { toReading } from '@ellwand/shared/records/measured';
import { toMmString } from '@ellwand/shared/units/length';
import type { House } from './house.js';
import { read, Refusal } from './refuse.js';
import { json, matched, type Routes } from './router.js';

function cutSheetOf(house: House, partId: string): CutSheet {
  if (!house.garments.some(({ parts }) => parts.some(({ id }) => id === partId)))
    throw new Refusal(404, 'part.unknown', {}, 'There is no such part.');
  const readings = house.sheets.find((sheet) => sheet.partId === partId)?.readings ?? [];
  return {
    ...(house.cutSheets.get(partId) ?? {
      partId,
      version: 0,
      body: emptyCutSheet,
      updatedAt: null,
      updatedBy: null,
    }),
    rounds: roundsRead(readings.map(toReading)).map(({ level, label, value }) => ({
      level,
      label,
      valueMm: toMmString(value),
    })),
  };
}

export const cutSheetRoutes: Routes = {
  'GET /workroom/parts/:id/cut-sheet': ({ house, params }) => json(cutSheetOf(house, params.id)),
  'PUT /workroom/parts/:id/cut-sheet': ({ house, params, body, version }) => {
    const before = cutSheetOf(house, params.id);
    matched(before.version, version);
    const kept: CutSheet = {
      ...before,
      version: before.version + 1,
      body: keptCutSheet(read(NewCutSheet, body)),
      updatedAt: new Date().toISOString(),
      updatedBy: house.signedIn!.name,
    };
    house.cutSheets.set(params.id, kept);
    return json(kept);
  },
};
