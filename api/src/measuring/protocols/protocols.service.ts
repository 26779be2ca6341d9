import { kindIds, kindLabels } from '@ellwand/shared/points/kinds';
import type { Protocol } from '@ellwand/shared/protocols/protocol';
import { protocolAdvice } from '@ellwand/shared/protocols/protocol-advice';
import { protocolChanges } from '@ellwand/shared/protocols/protocol-changes';
import { protocolFaults } from '@ellwand/shared/protocols/protocol-rules';
import { wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import {
  type NewProtocol,
  type ProtocolHistory,
  type ProtocolList,
  type ProtocolMade,
  type ProtocolVersion,
  toProtocol,
  toProtocolView,
} from '@ellwand/shared/records/protocol';
import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { v7 as uuidv7 } from 'uuid';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { staleVersion } from '../../common/if-match';
import { conflict, notFound, Refusal } from '../../common/refusal';
import { isDuplicate, type Tx, Work } from '../../common/work';
import { UserRow } from '../../users/user.entity';
import { firstVersion, ProtocolBook, type ProtocolKey, viewOf } from './protocol-book';
import { ProtocolRow } from './protocol.entity';

const everyKey: readonly ProtocolKey[] = [
  ...kindIds.map((kind) => ({ kind, wornTogether: false })),
  { kind: wornTogetherProtocol.kind, wornTogether: true },
];

/** Protocols as administrators keep them: read, and made anew in numbered versions. */
@Injectable()
export class ProtocolsService {
  constructor(
    private readonly work: Work,
    private readonly book: ProtocolBook,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  /** What every kind is measured by now. */
  async list(): Promise<ProtocolList> {
    const tx = this.work.reader;
    const rows = await newestOfEach(tx);
    const names = await namesOf(tx, rows);
    const items = everyKey.map((key) => {
      const row = rows.find((each) => isOf(each, key));
      const shown = row ? madeVersion(row, names) : standardVersion(key);
      return { ...shown, versions: shown.version };
    });
    return { items };
  }

  /** @throws Refusal 404 for a kind that has no protocol for parts laid together */
  async history(key: ProtocolKey): Promise<ProtocolHistory> {
    refuseUnknown(key);
    const tx = this.work.reader;
    const rows = await tx.find(ProtocolRow, { where: { ...key }, order: { version: 'DESC' } });
    const names = await namesOf(tx, rows);
    const versions = [...rows.map((row) => madeVersion(row, names)), standardVersion(key)];
    return { ...key, version: versions[0]?.version ?? 1, versions };
  }

  /** Makes the next version. Sheets taken by earlier ones keep theirs. */
  make(key: ProtocolKey, seen: number, made: NewProtocol, actor: Actor): Promise<ProtocolMade> {
    refuseUnknown(key);
    return this.work.run(async (tx) => {
      const newest = await this.book.newest(tx, key);
      const before = newest ? toProtocol(viewOf(newest)) : firstVersion(key);
      if (seen !== before.version) throw await this.stale(tx, seen, key);
      const draft = toProtocol({ ...key, ...made, version: before.version + 1 });
      await refuseUnfit(tx, draft, before);
      const row = await this.insert(tx, draft, made.note, actor).catch(async (fault: unknown) => {
        throw isDuplicate(fault) ? await this.stale(tx, seen, key) : fault;
      });
      await this.note(tx, actor, row, protocolChanges(before, draft));
      const names = new Map([[actor.id, actor.name]]);
      return { ...madeVersion(row, names), warnings: [...protocolAdvice(draft)] };
    });
  }

  private async insert(tx: Tx, draft: Protocol, note: string, actor: Actor): Promise<ProtocolRow> {
    const { kind, wornTogether, version, points, ownPoints } = toProtocolView(draft);
    const row: ProtocolRow = {
      id: uuidv7(),
      ...{ kind, wornTogether, version, note },
      body: { points, ownPoints },
      madeBy: actor.id,
      madeAt: this.clock.now(),
    };
    await tx.insert(ProtocolRow, row);
    return row;
  }

  private note(tx: Tx, actor: Actor, row: ProtocolRow, changes: readonly string[]): Promise<void> {
    const what = `version ${row.version} of the protocol ${titleOf(row)}`;
    return this.audit.note(tx, actor, {
      verb: 'make',
      subjectKind: 'protocol',
      subjectId: row.id,
      summary: `${actor.name} made ${what}: ${row.note}`,
      facts: { kind: row.kind, wornTogether: row.wornTogether, version: row.version, changes },
    });
  }

  private async stale(tx: Tx, seen: number, key: ProtocolKey): Promise<Refusal> {
    const newest = await this.book.newest(tx, key);
    const by = newest && (await tx.findOne(UserRow, { where: { id: newest.madeBy } }));
    return staleVersion(seen, newest?.version ?? 1, by?.name ?? null, newest?.madeAt ?? null);
  }
}

function isOf(row: ProtocolRow, { kind, wornTogether }: ProtocolKey): boolean {
  return row.kind === kind && Boolean(row.wornTogether) === wornTogether;
}

function titleOf({ kind, wornTogether }: ProtocolKey): string {
  return wornTogether ? 'for parts laid together as worn' : `for ${kindLabels[kind].plural.toLowerCase()}`;
}

function refuseUnknown(key: ProtocolKey): void {
  if (everyKey.some(({ kind, wornTogether }) => kind === key.kind && wornTogether === key.wornTogether))
    return;
  throw notFound('protocol.unknown', 'protocol');
}

/** @throws Refusal 400 with every fault at its place, 409 where nothing differs */
async function refuseUnfit(tx: Tx, draft: Protocol, before: Protocol): Promise<void> {
  const faults = protocolFaults(draft, await versionsWithOwnPoints(tx));
  if (faults.length > 0) {
    const [first] = faults;
    const message =
      faults.length === 1 && first
        ? first.detail
        : `${faults.length} things stand in the way of version ${draft.version}.`;
    throw new Refusal(400, 'protocol.unfit', message, {}, faults);
  }
  if (protocolChanges(before, draft).length > 0) return;
  throw conflict('protocol.unchanged', `Nothing differs from version ${before.version}.`);
}

async function versionsWithOwnPoints(tx: Tx): Promise<Protocol[]> {
  const rows = await tx
    .createQueryBuilder(ProtocolRow, 'protocol')
    .where("JSON_LENGTH(protocol.body, '$.ownPoints') > 0")
    .orderBy({ 'protocol.kind': 'ASC', 'protocol.version': 'DESC' })
    .getMany();
  return rows.map((row) => toProtocol(viewOf(row)));
}

function newestOfEach(tx: Tx): Promise<ProtocolRow[]> {
  return tx
    .createQueryBuilder(ProtocolRow, 'protocol')
    .where((query) => {
      const newest = query
        .subQuery()
        .select('MAX(other.version)')
        .from(ProtocolRow, 'other')
        .where('other.kind = protocol.kind AND other.wornTogether = protocol.wornTogether')
        .getQuery();
      return `protocol.version = ${newest}`;
    })
    .getMany();
}

async function namesOf(tx: Tx, rows: readonly ProtocolRow[]): Promise<Map<string, string>> {
  if (rows.length === 0) return new Map();
  const users = await tx.find(UserRow, { where: { id: In([...new Set(rows.map((row) => row.madeBy))]) } });
  return new Map(users.map(({ id, name }) => [id, name]));
}

function madeVersion(row: ProtocolRow, names: ReadonlyMap<string, string>): ProtocolVersion {
  const madeBy = names.get(row.madeBy) ?? null;
  return { ...viewOf(row), note: row.note, madeBy, madeAt: row.madeAt.toISOString() };
}

function standardVersion(key: ProtocolKey): ProtocolVersion {
  return { ...toProtocolView(firstVersion(key)), note: '', madeBy: null, madeAt: null };
}
