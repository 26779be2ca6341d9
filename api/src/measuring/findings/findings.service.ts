import { Injectable } from '@nestjs/common';
import type { Finding } from '@ellwand/shared/checks/finding';
import { runChecks } from '@ellwand/shared/checks/registry';
import { derivedViews, type OtherPartStored, toReading } from '@ellwand/shared/records/measured';
import { type FindingView, Sheet, type SheetFindings } from '@ellwand/shared/records/sheet';
import { fromMmString } from '@ellwand/shared/units/length';
import { In, Not } from 'typeorm';
import { v7 as uuidv7 } from 'uuid';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { conflict, notFound } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { PartRow } from '../../garments/part.entity';
import { UserRow } from '../../users/user.entity';
import { bodyOf, cutSheetRow } from '../cut-sheets/cut-sheet-view';
import { ProtocolBook } from '../protocols/protocol-book';
import { toStored } from '../readings/stored-reading';
import { readingsOf } from '../sheets/sheet-view';
import { SheetRow } from '../sheets/sheet.entity';
import { currentSheet } from '../sheets/speaking-sheet';
import { FindingAnswerRow } from './finding-answer.entity';
import { ownGarments } from './own-garments';

/** Raised for a point that is neither read nor given its reason: nothing else settles it. */
const missingPoint = 'required-missing-without-reason';

/** What the checks have to say about a sheet, and what people answered. Findings are never stored: they follow the readings. */
@Injectable()
export class FindingsService {
  constructor(
    private readonly work: Work,
    private readonly protocols: ProtocolBook,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  read(sheetId: string): Promise<SheetFindings> {
    return this.of(this.work.reader, sheetId);
  }

  /**
   * Answers a finding with a reason. The answer holds for these figures: a new reading asks anew. It changes
   * nothing of what was measured, so that a curator may ask and answer while the record is in review.
   */
  answer(sheetId: string, key: string, reason: string, actor: Actor): Promise<SheetFindings> {
    return this.work.run(async (tx) => {
      if (!(await this.answerIfAsked(tx, { sheetId, key, reason }, actor)))
        throw conflict('finding.gone', 'That finding is not there any more; the readings have changed.');
      return this.of(tx, sheetId);
    });
  }

  /**
   * @returns false where nothing asks for it any more
   * @throws Refusal 409 where a point was left out: only reading it, or saying why not, settles that
   */
  async answerIfAsked(
    tx: Tx,
    { sheetId, key, reason }: { readonly sheetId: string; readonly key: string; readonly reason: string },
    actor: Actor,
  ): Promise<boolean> {
    const { findings } = await this.of(tx, sheetId);
    const finding = findings.find((candidate) => candidate.key === key);
    if (!finding) return false;
    // An answer here would leave the point out without a word on the public page.
    if (finding.checkId === missingPoint) throw conflict('finding.unread', finding.sentence);
    const answer = { reason, answeredBy: actor.id, answeredAt: this.clock.now() };
    await tx
      .createQueryBuilder()
      .insert()
      .into(FindingAnswerRow)
      .values({ id: uuidv7(), sheetId, findingKey: key, ...answer })
      .orUpdate(['reason', 'answered_by', 'answered_at'])
      .execute();
    await this.audit.note(tx, actor, {
      verb: 'answer',
      subjectKind: 'sheet',
      subjectId: sheetId,
      summary: `${actor.name} answered “${finding.sentence}”: ${reason}`,
      facts: { key, checkId: finding.checkId },
    });
    return true;
  }

  /** How many questions of a sheet have no answer yet. */
  async openQuestions(tx: Tx, sheetId: string): Promise<number> {
    const { findings } = await this.of(tx, sheetId);
    return findings.filter((finding) => finding.severity === 'question' && finding.answer === null).length;
  }

  /** @throws Refusal 409 with the stops that have no answer, points missing without a reason among them */
  async refuseUnfinished(tx: Tx, sheetId: string): Promise<void> {
    const { findings } = await this.of(tx, sheetId);
    const stops = findings.filter((finding) => finding.severity === 'stop' && finding.answer === null);
    if (stops.length === 0) return;
    const missing = stops.filter((stop) => stop.checkId === missingPoint);
    if (missing.length === stops.length) {
      const points = missing.length === 1 ? 'One point is' : `${missing.length} points are`;
      throw conflict('sheet.points-missing', `${points} still to be read, or given a reason.`, {
        findings: missing,
      });
    }
    throw conflict('sheet.open-stops', stops.map((stop) => stop.sentence).join(' '), { findings: stops });
  }

  private async of(tx: Tx, sheetId: string): Promise<SheetFindings> {
    const sheet = await tx.findOne(SheetRow, { where: { id: sheetId } });
    if (!sheet) throw notFound('sheet.unknown', 'measuring sheet');
    const part = await tx.findOneOrFail(PartRow, { where: { id: sheet.partId } });
    const stored = (await readingsOf(tx, sheetId)).map(toStored);
    const protocol = await this.protocols.at(tx, part, sheet.protocolVersion);
    const otherParts = await this.otherParts(tx, part);
    const findings = runChecks({
      kind: part.kind,
      protocol,
      readings: stored.map(toReading),
      otherPartsOfGarment: otherParts.map((other) => ({
        ...other,
        readings: other.readings.map(toReading),
      })),
      support: Sheet.shape.facts.shape.support.parse(sheet.support),
      tapeLength: fromMmString(sheet.tapeLengthMm),
      peers: await ownGarments(tx, part),
    });
    const answers = await this.answers(tx, sheetId);
    return {
      findings: findings.map((finding) => toView(finding, answers)),
      derived: derivedViews(part.kind, stored, {
        ownPoints: protocol.ownPoints,
        otherParts,
        cutSheet: bodyOf(await cutSheetRow(tx, part.id)),
      }),
    };
  }

  /** What each other part came to: a waist must agree between bodice and skirt. All together are no other part. */
  private async otherParts(tx: Tx, part: PartRow): Promise<OtherPartStored[]> {
    if (part.wornTogether) return [];
    const others = await tx.find(PartRow, {
      where: { garmentId: part.garmentId, id: Not(part.id), wornTogether: false },
    });
    const result: OtherPartStored[] = [];
    for (const other of others) {
      const sheet = await currentSheet(tx, other);
      if (!sheet) continue;
      const readings = (await readingsOf(tx, sheet.id)).map(toStored);
      result.push({ kind: other.kind, name: other.name, readings });
    }
    return result;
  }

  private async answers(tx: Tx, sheetId: string): Promise<Map<string, NonNullable<FindingView['answer']>>> {
    const rows = await tx.find(FindingAnswerRow, { where: { sheetId } });
    const users =
      rows.length > 0 ? await tx.find(UserRow, { where: { id: In(rows.map((row) => row.answeredBy)) } }) : [];
    const names = new Map(users.map((user) => [user.id, user.name]));
    return new Map(
      rows.map((row) => [
        row.findingKey,
        { reason: row.reason, by: names.get(row.answeredBy) ?? '', at: row.answeredAt.toISOString() },
      ]),
    );
  }
}

function toView(
  finding: Finding,
  answers: ReadonlyMap<string, NonNullable<FindingView['answer']>>,
): FindingView {
  const { key, checkId, severity, sentence, pointIds } = finding;
  return { key, checkId, severity, sentence, pointIds: [...pointIds], answer: answers.get(key) ?? null };
}
