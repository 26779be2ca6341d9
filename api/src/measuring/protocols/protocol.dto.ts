import { kindIds } from '@ellwand/shared/points/kinds';
import { NewProtocol, ProtocolHistory, ProtocolList, ProtocolMade } from '@ellwand/shared/records/protocol';
import { createZodDto } from 'nestjs-zod';
import { z } from 'zod';

export class KindParam extends createZodDto(z.object({ kind: z.enum(kindIds) })) {}
/** `?wornTogether=true` for the protocol of parts laid together as worn. */
export class WornTogetherDto extends createZodDto(
  z.object({ wornTogether: z.enum(['true', 'false']).default('false') }),
) {}
export class NewProtocolDto extends createZodDto(NewProtocol) {}
export class ProtocolListDto extends createZodDto(ProtocolList) {}
export class ProtocolHistoryDto extends createZodDto(ProtocolHistory) {}
export class ProtocolMadeDto extends createZodDto(ProtocolMade) {}
