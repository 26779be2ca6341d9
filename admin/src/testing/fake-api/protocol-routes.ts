import { type GarmentKind, isGarmentKind } from '@ellwand/shared/points/kinds';
import { protocolAdvice } from '@ellwand/shared/protocols/protocol-advice';
import { protocolFaults } from '@ellwand/shared/protocols/protocol-rules';
import { NewProtocol, type ProtocolVersion, toProtocol } from '@ellwand/shared/records/protocol';
import type { House } from './house.js';
import { Refusal, read } from './refuse.js';
import { type Call, json, matched, type Routes } from './router.js';

function versionsOf(house: House, kind: GarmentKind, wornTogether: boolean): readonly ProtocolVersion[] {
  return house.protocols
    .filter((each) => each.kind === kind && each.wornTogether === wornTogether)
    .sort((first, second) => second.version - first.version);
}

function asked({ params, query }: Call): { kind: GarmentKind; wornTogether: boolean } {
  const kind = params['kind'] ?? '';
  const wornTogether = query.get('wornTogether') === 'true';
  if (!isGarmentKind(kind) || (wornTogether && kind !== 'dress')) throw new Refusal(404, 'protocol.unknown');
  return { kind, wornTogether };
}

export const protocolRoutes: Routes = {
  'GET /workroom/protocols': ({ house }) => {
    const first = house.protocols.filter(({ version }) => version === 1);
    const items = first.map(({ kind, wornTogether }) => {
      const versions = versionsOf(house, kind, wornTogether);
      return { ...versions[0], versions: versions.length };
    });
    return json({ items });
  },
  'GET /workroom/protocols/:kind': (call) => {
    const { kind, wornTogether } = asked(call);
    const versions = versionsOf(call.house, kind, wornTogether);
    return json({ kind, wornTogether, version: versions[0]?.version, versions });
  },
  'POST /workroom/sheets/:id/newest-protocol': ({ house, params, version }) => {
    const sheet = house.sheet(params.id);
    if (!sheet) throw new Refusal(404, 'sheet.unknown');
    matched(sheet.version, version);
    if (sheet.readings.length > 0) throw new Refusal(409, 'sheet.has-readings');
    const [newest] = versionsOf(house, sheet.kind, sheet.wornTogether);
    if (newest) Object.assign(sheet, { protocol: newest, protocolVersion: newest.version });
    sheet.version += 1;
    return json(sheet);
  },
  'POST /workroom/protocols/:kind': (call) => {
    const { house, body, version } = call;
    const name = asked(call);
    const [newest] = versionsOf(house, name.kind, name.wornTogether);
    matched(newest?.version ?? 1, version, newest?.madeBy ?? undefined);
    const { points, ownPoints, note } = read(NewProtocol, body);
    const draft = toProtocol({ ...name, points, ownPoints, version: (newest?.version ?? 1) + 1 });
    const errors = protocolFaults(draft, house.protocols.map(toProtocol));
    if (errors.length > 0) throw new Refusal(400, 'protocol.unfit', { errors }, errors[0]?.detail);
    const made: ProtocolVersion = {
      ...name,
      ...{ version: draft.version, points, ownPoints, note },
      madeBy: house.signedIn?.name ?? null,
      madeAt: '2026-12-01T14:40:00.000Z',
    };
    house.protocols.push(made);
    return json({ ...made, warnings: protocolAdvice(draft) }, 201);
  },
};
