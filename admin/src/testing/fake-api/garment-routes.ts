import {
  type Garment,
  GarmentQuery,
  GarmentRecord,
  type GarmentSummary,
  NewGarment,
  NewPart,
  type Part,
} from '@ellwand/shared/records/garment';
import { ReturnReason, Withdrawal } from '@ellwand/shared/records/publishing';
import { kindName } from './garments.js';
import type { House } from './house.js';
import { speakingSheet } from './part-sheets.js';
import { publishedOf, reviewOf } from './publishing.js';
import { Refusal, read } from './refuse.js';
import { json, matched, type Routes } from './router.js';
import { summaryOf } from './sheets.js';

const known = (house: House, id: string): Garment => {
  const garment = house.garment(id);
  if (!garment) throw new Refusal(404, 'garment.unknown', {}, 'There is no such garment.');
  for (const part of garment.parts) {
    const speaking = speakingSheet(house, part.id);
    part.sheets = house.sheets
      .filter(({ partId }) => partId === part.id)
      .map((sheet) => summaryOf(sheet, sheet === speaking))
      .toSorted((one, other) => other.measuredOn.localeCompare(one.measuredOn));
  }
  return garment;
};

function summary(garment: Garment): GarmentSummary {
  const { id, record, stage, isPublic, publicNumber, parts, images, updatedAt } = garment;
  const openSheets = parts.flatMap(({ sheets }) => sheets).filter(({ state }) => state === 'open').length;
  const { ownNumber, title, kind, date } = record;
  return {
    id,
    ownNumber,
    title,
    kind,
    date,
    stage,
    isPublic,
    publicNumber,
    openSheets,
    pictures: images.length,
    firstImageId: images[0]?.id ?? null,
    updatedAt,
  };
}

function partOf(garment: Pick<Garment, 'id' | 'parts'>, { kind, name, suffix }: NewPart, id: string): Part {
  return {
    id,
    garmentId: garment.id,
    suffix,
    kind,
    name: name || kindName(kind),
    position: garment.parts.length,
    wornTogether: false,
    sheets: [],
  };
}

function changed(garment: Garment, change: Partial<Garment>): Response {
  Object.assign(garment, change, { version: garment.version + 1 });
  return json(garment);
}

export const garmentRoutes: Routes = {
  'GET /workroom/garments': ({ house, query }) => {
    const { q, stage, page, size } = GarmentQuery.parse(Object.fromEntries(query));
    const found = house.garments.filter(
      ({ record, stage: own }) =>
        (!stage || own === stage) &&
        (!q ||
          `${record.ownNumber} ${record.title} ${record.maker ?? ''}`
            .toLowerCase()
            .includes(q.toLowerCase())),
    );
    for (const { id } of found) known(house, id);
    return json({
      total: found.length,
      page,
      size,
      items: found.slice((page - 1) * size, page * size).map(summary),
    });
  },
  'POST /workroom/garments': ({ house, body }) => {
    const { id, record, parts } = read(NewGarment, body);
    const again = id === undefined ? undefined : house.garment(id);
    if (again) return json(again, 201);
    const now = new Date().toISOString();
    const garment: Garment = {
      id: id ?? house.newId(),
      version: 1,
      stage: 'draft',
      publicNumber: null,
      publishedVersion: null,
      isPublic: false,
      record,
      parts: [],
      images: [],
      returned: null,
      createdAt: now,
      updatedAt: now,
    };
    for (const part of parts) garment.parts.push(partOf(garment, part, house.newId()));
    house.garments.unshift(garment);
    return json(garment, 201);
  },
  'GET /workroom/garments/:id': ({ house, params }) => json(known(house, params.id)),
  'PUT /workroom/garments/:id/record': ({ house, params, body, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    if (garment.stage === 'in-review' || garment.stage === 'approved')
      throw new Refusal(409, 'record.locked');
    return changed(garment, {
      record: read(GarmentRecord, body),
      updatedAt: new Date().toISOString(),
      stage: 'draft',
    });
  },
  'POST /workroom/garments/:id/parts': ({ house, params, body, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    return changed(garment, {
      parts: [...garment.parts, partOf(garment, read(NewPart, body), house.newId())],
    });
  },
  'DELETE /workroom/parts/:id': ({ house, params, version }) => {
    const garment = house.garments.find(({ parts }) => parts.some(({ id }) => id === params.id));
    if (!garment) throw new Refusal(404, 'part.unknown');
    matched(garment.version, version);
    return changed(garment, { parts: garment.parts.filter(({ id }) => id !== params.id) });
  },
  'GET /workroom/garments/:id/review': ({ house, params }) => json(reviewOf(house, known(house, params.id))),
  'GET /workroom/garments/:id/preview': ({ house, params }) =>
    json(publishedOf(house, known(house, params.id))),
  'GET /workroom/garments/:id/revisions': () => json({ items: [] }),
  'POST /workroom/garments/:id/submit': ({ house, params, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    const { readiness } = reviewOf(house, garment);
    const blocks = readiness.filter(({ blocks: step }) => step === 'submit');
    if (blocks.length > 0)
      throw new Refusal(409, 'record.not-ready', { readiness: blocks }, 'Not ready for review.');
    return changed(garment, { stage: 'in-review', returned: null });
  },
  'POST /workroom/garments/:id/return': ({ house, params, body, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    const { reason } = read(ReturnReason, body);
    return changed(garment, {
      stage: 'draft',
      returned: { reason, by: house.signedIn!.name, at: new Date().toISOString() },
    });
  },
  'POST /workroom/garments/:id/approve': ({ house, params, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    if (house.mayNotApprove !== null) throw new Refusal(403, 'review.own-measuring', {}, house.mayNotApprove);
    return changed(garment, { stage: 'approved' });
  },
  'POST /workroom/garments/:id/publish': ({ house, params, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    const publicNumber = garment.publicNumber ?? garment.record.ownNumber.toLowerCase().replaceAll('.', '-');
    return changed(garment, {
      stage: 'published',
      isPublic: true,
      publicNumber,
      publishedVersion: (garment.publishedVersion ?? 0) + 1,
    });
  },
  'POST /workroom/garments/:id/withdraw': ({ house, params, body, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    read(Withdrawal, body);
    return changed(garment, { stage: 'withdrawn', isPublic: false });
  },
  'POST /workroom/garments/:id/revise': ({ house, params, version }) => {
    const garment = known(house, params.id);
    matched(garment.version, version);
    return changed(garment, { stage: 'draft' });
  },
};
