import { pointIn, type Protocol } from '@ellwand/shared/protocols/protocol';
import { numberOfPart } from '@ellwand/shared/records/garment';
import type { StoredReading } from '@ellwand/shared/records/sheet';
import { lowerKind } from '@ellwand/shared/points/kinds';
import { Inject, Injectable } from '@nestjs/common';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { ENVIRONMENT } from '../../common/environment.token';
import type { Tx } from '../../common/work';
import type { Environment } from '../../config/environment';
import { GarmentRow } from '../../garments/garment.entity';
import { MailSender } from '../../mail/sender.service';
import { damageSeenLetter } from '../../mail/templates/damage-seen';
import { damageReportedTo } from '../../users/damage-reported-to';
import { museumName } from '../../users/museum';
import { UserRow } from '../../users/user.entity';
import type { SheetInHand } from '../sheets/sheet-edits';

/** Tells whoever cares for the garments that measuring was stopped because damage was seen. */
@Injectable()
export class DamageService {
  constructor(
    private readonly mail: MailSender,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    @Inject(ENVIRONMENT) private readonly environment: Environment,
  ) {}

  /** Of the readings that were just kept, tells of those that stopped for damage: one letter for each who is told. */
  async tell(
    tx: Tx,
    actor: Actor,
    { sheet, part }: SheetInHand,
    protocol: Protocol,
    kept: readonly StoredReading[],
  ): Promise<void> {
    const stopped = kept.filter(({ reason }) => reason === 'stopped-damage-seen');
    const [first] = stopped;
    if (!first) return;
    const { ownNumber } = await tx.findOneByOrFail(GarmentRow, { id: part.garmentId });
    const number = numberOfPart(ownNumber, part);
    const places = stopped.map(({ pointId, note }) => ({
      point: pointIn(protocol, pointId)?.name ?? pointId,
      note,
    }));
    const reader = await tx.findOneBy(UserRow, { id: first.readBy });
    const told = await damageReportedTo(tx);
    const facts = {
      museum: await museumName(tx),
      number,
      part: part.wornTogether ? 'laid together as worn' : lowerKind(part.kind),
      places,
      readBy: reader?.name ?? actor.name,
      keyedBy: actor.name,
      at: this.clock.now(),
      link: `${this.environment.publicUrl}/workroom/sheets/${sheet.id}`,
    };
    for (const { email, name } of told)
      await this.mail.send(tx, damageSeenLetter({ ...facts, to: email, name }));
    await this.audit.note(tx, actor, {
      verb: 'report-damage',
      subjectKind: 'sheet',
      subjectId: sheet.id,
      summary: `${facts.readBy} stopped measuring ${number} at ${places.map(({ point }) => point.toLowerCase()).join(', ')}: damage was seen`,
      facts: { points: stopped.map(({ pointId }) => pointId), told: told.map(({ id }) => id) },
    });
  }
}
