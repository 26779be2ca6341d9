import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { Protocol } from '@ellwand/shared/protocols/protocol';
import { protocolFor, wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import { ProtocolView, toProtocol } from '@ellwand/shared/records/protocol';
import { Injectable } from '@nestjs/common';
import type { Tx } from '../../common/work';
import type { PartRow } from '../../garments/part.entity';
import { ProtocolRow } from './protocol.entity';

export interface ProtocolKey {
  readonly kind: GarmentKind;
  readonly wornTogether: boolean;
}

type Measured = Pick<PartRow, 'kind' | 'wornTogether'>;

/** The protocol that a part is measured by: its kind's, or the one of parts laid together, whatever they are. */
export function protocolKey({ kind, wornTogether }: Measured): ProtocolKey {
  return wornTogether ? { kind: wornTogetherProtocol.kind, wornTogether } : { kind, wornTogether };
}

/** The house's first version, which nobody stored. */
export function firstVersion({ kind, wornTogether }: ProtocolKey): Protocol {
  return wornTogether ? wornTogetherProtocol : protocolFor(kind);
}

/** A stored version as it travels. */
export function viewOf({ kind, wornTogether, version, body }: ProtocolRow): ProtocolView {
  return ProtocolView.parse({ kind, wornTogether: Boolean(wornTogether), version, ...body });
}

/** Which protocol a part is measured by: the newest for a new sheet, its own version for an old one. */
@Injectable()
export class ProtocolBook {
  /**
   * Versions read within one transaction. They never change, but a transaction is the longest that anything is
   * remembered: another process may restore the database to an earlier day.
   */
  private readonly readIn = new WeakMap<object, Map<string, Promise<Protocol>>>();

  async current(tx: Tx, part: Measured): Promise<Protocol> {
    const key = protocolKey(part);
    const newest = await this.newest(tx, key);
    return newest ? toProtocol(viewOf(newest)) : firstVersion(key);
  }

  /** The version that a sheet keeps, whatever has been made since. */
  at(tx: Tx, part: Measured, version: number): Promise<Protocol> {
    const key = protocolKey(part);
    const first = firstVersion(key);
    if (version === first.version) return Promise.resolve(first);
    const name = `${key.kind} ${key.wornTogether} ${version}`;
    const read = this.rememberedIn(tx);
    const known = read.get(name) ?? this.read(tx, key, version);
    read.set(name, known);
    return known;
  }

  /** The newest version that was made here; null where there is only the house's first. */
  newest(tx: Tx, key: ProtocolKey): Promise<ProtocolRow | null> {
    return tx.findOne(ProtocolRow, { where: { ...key }, order: { version: 'DESC' } });
  }

  private async read(tx: Tx, key: ProtocolKey, version: number): Promise<Protocol> {
    const row = await tx.findOneOrFail(ProtocolRow, { where: { ...key, version } });
    return toProtocol(viewOf(row));
  }

  /** Outside of a transaction there is one manager for everybody: nothing is remembered in it. */
  private rememberedIn({ queryRunner }: Tx): Map<string, Promise<Protocol>> {
    const read = (queryRunner && this.readIn.get(queryRunner)) ?? new Map<string, Promise<Protocol>>();
    if (queryRunner) this.readIn.set(queryRunner, read);
    return read;
  }
}
