import { Injectable } from '@nestjs/common';
import type { Garment } from '@ellwand/shared/records/garment';
import type { RecordStage } from '@ellwand/shared/records/record-moves';
import type { Withdrawal } from '@ellwand/shared/records/publishing';
import { v7 as uuidv7 } from 'uuid';
import { type AuditNote, AuditService } from '../audit/audit.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { conflict } from '../common/refusal';
import { isDuplicate, type Tx, Work } from '../common/work';
import { GarmentEditor } from '../garments/garment-editor.entity';
import { GarmentEdits } from '../garments/garment-edits';
import { GarmentView } from '../garments/garment-view';
import type { GarmentRow } from '../garments/garment.entity';
import { ProtocolBook } from '../measuring/protocols/protocol-book';
import { museumName } from '../users/museum';
import { CatalogueWriter } from './projection/catalogue-writer';
import { projectGarment } from './projection/project-garment';
import { freePublicNumber } from './public-number';
import { RevisionRow } from './revision.entity';
import { mayNotApprove } from './review/approval';
import { withLateHands } from './review/late-hands';
import { ReviewService } from './review/review.service';
import { takeSnapshot } from './snapshot-taker';

/** What the audit trail tells of a verb: the rest of a sentence that begins with the person's name, and facts. */
type Told = string | { readonly told: string; readonly facts: AuditNote['facts'] };

/** The way of a record to the public and back: each verb is one transaction, and counts at once or not at all. */
@Injectable()
export class PublishingService {
  constructor(
    private readonly work: Work,
    private readonly garments: GarmentEdits,
    private readonly view: GarmentView,
    private readonly reviews: ReviewService,
    private readonly protocols: ProtocolBook,
    private readonly writer: CatalogueWriter,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  /** Freezes the draft and sends it to review. */
  submit(id: string, seen: number, actor: Actor): Promise<Garment> {
    return this.verb(id, seen, actor, 'submit', async (tx, garment) => {
      const moved = await this.garments.move(tx, actor, garment, 'in-review');
      await this.refuseUnready(tx, id, ['submit']);
      const last = await tx.findOne(RevisionRow, { where: { garmentId: id }, order: { number: 'DESC' } });
      await tx.insert(RevisionRow, {
        id: uuidv7(),
        garmentId: id,
        number: (last?.number ?? 0) + 1,
        outcome: 'in-review',
        snapshot: await takeSnapshot(tx, moved, this.protocols),
        submittedBy: actor.id,
        submittedAt: this.clock.now(),
      });
      return `sent ${garment.ownNumber} to review`;
    });
  }

  /** Sends a record back to draft with a reason, from review or after approval. */
  return(id: string, seen: number, reason: string, actor: Actor): Promise<Garment> {
    return this.verb(id, seen, actor, 'return', async (tx, garment) => {
      refuseUnless(
        garment,
        ['in-review', 'approved'],
        'Only a record in review, or approved, can be returned.',
      );
      const revision = await openRevision(tx, id);
      await this.garments.move(tx, actor, garment, 'draft');
      await this.decide(tx, actor, revision, { outcome: 'returned', reason });
      return `returned ${garment.ownNumber}: ${reason}`;
    });
  }

  /** Approves what was frozen; refused to whoever measured or edited it, and while a question is open. */
  approve(id: string, seen: number, actor: Actor): Promise<Garment> {
    return this.verb(id, seen, actor, 'approve', async (tx, garment) => {
      refuseUnless(garment, ['in-review'], 'Only a record in review can be approved.');
      const revision = await openRevision(tx, id);
      const refusal = mayNotApprove(await withLateHands(tx, id, revision.snapshot), actor.id);
      if (refusal) throw refusal;
      await this.refuseUnready(tx, id, ['submit', 'approve']);
      await this.garments.move(tx, actor, garment, 'approved');
      await this.decide(tx, actor, revision, { outcome: 'approved' });
      return `approved ${garment.ownNumber}`;
    });
  }

  /** Puts the approved copy before the public as its next version. */
  async publish(id: string, seen: number, actor: Actor): Promise<Garment> {
    try {
      return await this.publishOnce(id, seen, actor);
    } catch (fault) {
      // Another garment took the public number while this one was being written: the next one is free.
      if (!isDuplicate(fault)) throw fault;
      return this.publishOnce(id, seen, actor);
    }
  }

  private publishOnce(id: string, seen: number, actor: Actor): Promise<Garment> {
    return this.verb(id, seen, actor, 'publish', async (tx, garment) => {
      refuseUnless(garment, ['approved'], 'Only an approved record can be published.');
      const revision = await openRevision(tx, id);
      const number = garment.publicNumber ?? (await freePublicNumber(tx, garment.ownNumber));
      const version = (garment.publishedVersion ?? 0) + 1;
      const imprint = {
        number,
        version,
        publishedAt: this.clock.now().toISOString(),
        museum: await museumName(tx),
      };
      await this.writer.publish(tx, id, projectGarment(revision.snapshot, imprint));
      const changes = { isPublic: true, publicNumber: number, publishedVersion: version };
      await this.garments.move(tx, actor, garment, 'published', changes);
      await tx.update(RevisionRow, { id: revision.id }, { outcome: 'published', publishedVersion: version });
      await tx.delete(GarmentEditor, { garmentId: id });
      return `published version ${version} of ${garment.ownNumber}`;
    });
  }

  /** Takes every version, page and picture of the garment out of public view at once. */
  withdraw(id: string, seen: number, { notice, innerReason }: Withdrawal, actor: Actor): Promise<Garment> {
    return this.verb(id, seen, actor, 'withdraw', async (tx, garment) => {
      if (!garment.isPublic || garment.publicNumber === null) {
        throw conflict('record.not-public', 'Only a garment that is public can be withdrawn.', {
          stage: garment.stage,
        });
      }
      await this.writer.withdraw(tx, garment.publicNumber, {
        notice,
        withdrawnOn: this.clock.now().toISOString().slice(0, 10),
      });
      if (garment.stage === 'in-review' || garment.stage === 'approved') {
        await this.decide(tx, actor, await openRevision(tx, id), { outcome: 'set-aside', reason: notice });
      }
      await this.garments.move(tx, actor, garment, 'withdrawn', { isPublic: false });
      const told = `withdrew ${garment.ownNumber}${innerReason ? `: ${innerReason}` : ''}`;
      // Whole, for a summary is short, and a notice is gone from the catalogue once the garment is published anew.
      return { told, facts: { notice, innerReason } };
    });
  }

  /** Takes a published or withdrawn record up again as a draft; what is public stays as it is. */
  revise(id: string, seen: number, actor: Actor): Promise<Garment> {
    return this.verb(id, seen, actor, 'revise', async (tx, garment) => {
      refuseUnless(
        garment,
        ['published', 'withdrawn'],
        'Only a published or withdrawn record can be taken up again.',
      );
      await this.garments.move(tx, actor, garment, 'draft');
      return `took ${garment.ownNumber} up again`;
    });
  }

  private verb(
    id: string,
    seen: number,
    actor: Actor,
    verb: string,
    story: (tx: Tx, garment: GarmentRow) => Promise<Told>,
  ): Promise<Garment> {
    return this.work.run(async (tx) => {
      const told = await story(tx, await this.garments.lockAt(tx, id, seen));
      const { told: rest, facts = {} } = typeof told === 'string' ? { told } : told;
      const summary = `${actor.name} ${rest}`;
      await this.audit.note(tx, actor, { verb, subjectKind: 'garment', subjectId: id, summary, facts });
      return this.view.of(tx, id);
    });
  }

  private async refuseUnready(tx: Tx, id: string, steps: readonly string[]): Promise<void> {
    const open = (await this.reviews.readiness(tx, id)).filter((entry) => steps.includes(entry.blocks));
    const first = open[0];
    if (!first) return;
    const code = first.blocks === 'approve' ? 'review.open-questions' : 'record.not-ready';
    throw conflict(code, open.map((entry) => entry.sentence).join(' '), { readiness: open });
  }

  private async decide(
    tx: Tx,
    actor: Actor,
    revision: RevisionRow,
    decision: Pick<RevisionRow, 'outcome'> & Partial<Pick<RevisionRow, 'reason'>>,
  ): Promise<void> {
    await tx.update(
      RevisionRow,
      { id: revision.id },
      { ...decision, decidedBy: actor.id, decidedAt: this.clock.now() },
    );
  }
}

function refuseUnless(garment: GarmentRow, stages: readonly RecordStage[], message: string): void {
  if (!stages.includes(garment.stage))
    throw conflict('record.no-such-move', message, { stage: garment.stage });
}

/** The revision under way: the newest one. */
async function openRevision(tx: Tx, garmentId: string): Promise<RevisionRow> {
  return tx.findOneOrFail(RevisionRow, { where: { garmentId }, order: { number: 'DESC' } });
}
