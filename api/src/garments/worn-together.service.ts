import { Injectable } from '@nestjs/common';
import type { Garment } from '@ellwand/shared/records/garment';
import { wornTogetherProtocol } from '@ellwand/shared/protocols/standard-protocols';
import { v7 as uuidv7 } from 'uuid';
import { AuditService } from '../audit/audit.service';
import type { Actor } from '../common/actor';
import { conflict } from '../common/refusal';
import { Work } from '../common/work';
import { GarmentEdits } from './garment-edits';
import { GarmentView } from './garment-view';
import { PartRow } from './part.entity';

/** After every part that a garment can have. */
const LAST = 999;

/** What stands for a garment's parts laid together as worn, so that what only they have together can be measured. */
@Injectable()
export class WornTogetherService {
  constructor(
    private readonly work: Work,
    private readonly edits: GarmentEdits,
    private readonly view: GarmentView,
    private readonly audit: AuditService,
  ) {}

  /**
   * Makes it once; asked again, answers with the garment as it is.
   * @throws Refusal 409 `part.alone` for a garment of one part, `part.number-used` where a part is numbered so already
   */
  make(garmentId: string, seen: number, actor: Actor): Promise<Garment> {
    return this.work.run(async (tx) => {
      await this.edits.lock(tx, garmentId);
      const parts = await tx.find(PartRow, { where: { garmentId } });
      if (parts.some(({ wornTogether }) => wornTogether)) return this.view.of(tx, garmentId);
      const garment = await this.edits.edit(tx, actor, await this.edits.lockAt(tx, garmentId, seen), {});
      if (parts.length < 2)
        throw conflict('part.alone', 'Only a garment of two parts or more is laid together as worn.');
      if (parts.some(({ suffix }) => suffix.toLowerCase() === 'worn'))
        throw conflict('part.number-used', 'A part of this garment has the number “worn” already.');
      const id = uuidv7();
      await tx.insert(PartRow, {
        id,
        garmentId,
        suffix: 'worn',
        kind: wornTogetherProtocol.kind,
        name: 'Laid together as worn',
        position: LAST,
        wornTogether: true,
      });
      await this.audit.note(tx, actor, {
        verb: 'add',
        subjectKind: 'part',
        subjectId: id,
        summary: `${actor.name} will measure the parts of ${garment.ownNumber} laid together as worn`,
      });
      return this.view.of(tx, garmentId);
    });
  }
}
