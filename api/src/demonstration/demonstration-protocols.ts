import { Injectable } from '@nestjs/common';
import { ProtocolsService } from '../measuring/protocols/protocols.service';
import type { DemonstrationGarment, DemonstrationProtocol } from './demonstration-data';
import { type Staff, staffMember } from './demonstration-sheets';

/** Makes the later versions of protocols, as administrators do, once the sheets that keep earlier ones are taken. */
@Injectable()
export class DemonstrationProtocols {
  constructor(private readonly protocols: ProtocolsService) {}

  async make({ madeBy, version, ...protocol }: DemonstrationProtocol, staff: Staff): Promise<void> {
    const { kind, wornTogether, points, ownPoints, note } = protocol;
    const administrator = staffMember(staff, madeBy);
    await this.protocols.make(
      { kind, wornTogether },
      version - 1,
      { points, ownPoints, note },
      administrator,
    );
  }
}

/** Whether every sheet of the garment was taken by the house's first protocols: those are taken before any other. */
export function keepsFirstProtocols({ parts }: DemonstrationGarment): boolean {
  return parts.every(({ sheet }) => (sheet?.protocolVersion ?? 1) === 1);
}
