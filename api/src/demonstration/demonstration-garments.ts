import { join } from 'node:path';
import { Injectable } from '@nestjs/common';
import type { Garment } from '@ellwand/shared/records/garment';
import type { Actor } from '../common/actor';
import { GarmentsService } from '../garments/garments.service';
import { WornTogetherService } from '../garments/worn-together.service';
import { CutSheetsService } from '../measuring/cut-sheets/cut-sheets.service';
import { ImageIntake } from '../media/intake/image-intake';
import { PublishingService } from '../publishing/publishing.service';
import type { Demonstration, DemonstrationGarment, DemonstrationSheet } from './demonstration-data';
import { DemonstrationSheets, type Staff, staffMember } from './demonstration-sheets';

/** A garment whose record, pictures and sheets are in the house, not yet reviewed. */
export interface FilledGarment {
  readonly id: string;
  readonly data: DemonstrationGarment;
}

/** Puts the demonstration's garments into the house, each through the verbs that people use. */
@Injectable()
export class DemonstrationGarments {
  constructor(
    private readonly garments: GarmentsService,
    private readonly together: WornTogetherService,
    private readonly sheets: DemonstrationSheets,
    private readonly cutSheets: CutSheetsService,
    private readonly intake: ImageIntake,
    private readonly publishing: PublishingService,
  ) {}

  async fill(data: DemonstrationGarment, demonstration: Demonstration, staff: Staff): Promise<FilledGarment> {
    const maker = staffMember(staff, data.madeBy);
    const parts = data.parts.map(({ kind, name, suffix }) => ({ kind, name, suffix }));
    const garment = await this.garments.make({ record: data.record, parts }, maker);
    for (const picture of demonstration.pictures.filter(({ number }) => number === data.record.ownNumber)) {
      const file = { path: join(demonstration.picturesFolder, picture.file), name: picture.file };
      const { view, alt, caption } = picture;
      await this.intake.acceptFile(maker, garment.id, file, {
        view,
        alt,
        caption,
        credit: demonstration.museum,
        pointId: null,
        takenOn: null,
      });
    }
    for (const [index, part] of data.parts.entries()) {
      const made = garment.parts[index];
      if (!made) continue;
      for (const earlier of part.earlierSheets) await this.sheets.fill(made.id, earlier, staff);
      if (part.sheet) await this.sheets.fill(made.id, part.sheet, staff);
      if (part.cutSheet) await this.cutSheets.write(made.id, 0, part.cutSheet, maker);
    }
    if (data.wornTogether) await this.layTogether(garment.id, data.wornTogether, maker, staff);
    return { id: garment.id, data };
  }

  private async layTogether(
    garmentId: string,
    sheet: DemonstrationSheet,
    maker: Actor,
    staff: Staff,
  ): Promise<void> {
    const { version } = await this.garments.read(garmentId);
    const { parts } = await this.together.make(garmentId, version, maker);
    const part = parts.find(({ wornTogether }) => wornTogether);
    if (part) await this.sheets.fill(part.id, sheet, staff);
  }

  /** Takes a filled garment to the stage that the demonstration shows it in. */
  async stage({ id, data }: FilledGarment, staff: Staff): Promise<void> {
    const maker = staffMember(staff, data.madeBy);
    const curator = staffMember(staff, data.approvedBy);
    if (data.stage === 'draft' && !data.returnReason && !data.draftBeside) return;
    let garment = await this.publishing.submit(id, (await this.garments.read(id)).version, maker);
    if (data.returnReason) {
      await this.publishing.return(id, garment.version, data.returnReason, curator);
      return;
    }
    if (data.stage === 'in-review') return;
    garment = await this.publishing.approve(id, garment.version, curator);
    if (data.stage === 'approved') return;
    garment = await this.publishing.publish(id, garment.version, curator);
    await this.after(garment, data, maker, curator);
  }

  private async after(
    garment: Garment,
    data: DemonstrationGarment,
    maker: Actor,
    curator: Actor,
  ): Promise<void> {
    if (data.draftBeside)
      await this.garments.rewrite(
        garment.id,
        garment.version,
        { ...data.record, ...data.draftBeside },
        maker,
      );
    if (data.withdrawal)
      await this.publishing.withdraw(garment.id, garment.version, data.withdrawal, curator);
  }
}
