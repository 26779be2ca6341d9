import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { GarmentRecord, numberOfPart } from '@ellwand/shared/records/garment';
import { readDate } from '@ellwand/shared/records/edtf-date';
import type { Sheet } from '@ellwand/shared/records/sheet';
import { Inject, Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { ENVIRONMENT } from '../../common/environment.token';
import { notFound } from '../../common/refusal';
import { Work } from '../../common/work';
import type { Environment } from '../../config/environment';
import { GarmentRow } from '../../garments/garment.entity';
import { PartRow } from '../../garments/part.entity';
import { museumName } from '../../users/museum';
import { FindingsService } from '../findings/findings.service';
import { ProtocolBook } from '../protocols/protocol-book';
import { SheetsService } from '../sheets/sheets.service';
import { type Print, printBlank } from './blank-sheet';
import type { GarmentOnPaper } from './blocks/garment-on-paper';
import { printFilled } from './filled-sheet';
import { readFaces } from './paper/faces';
import type { Paper } from './paper/paper-size';

export interface PrintedSheet {
  readonly pdf: Buffer;
  /** Without a folder or a sign that a file system would not take. */
  readonly fileName: string;
}

/** Measuring sheets on paper: blank to write on, or filled with what was measured. */
@Injectable()
export class PrintedSheetsService {
  constructor(
    private readonly work: Work,
    private readonly protocols: ProtocolBook,
    private readonly sheets: SheetsService,
    private readonly findings: FindingsService,
    private readonly clock: Clock,
    @Inject(ENVIRONMENT) private readonly environment: Environment,
  ) {}

  /** @throws Refusal 404 */
  async filled(sheetId: string, paper: Paper): Promise<PrintedSheet> {
    const sheet = await this.sheets.read(sheetId);
    const garment = this.onPaper(sheet);
    const findings = await this.findings.read(sheetId);
    const museum = await museumName(this.work.reader);
    const pdf = await printFilled({ museum, sheet, findings, garment }, await this.print(paper));
    return { pdf, fileName: fileName(garment.number, sheet.facts.measuredOn) };
  }

  /** For any garment of the kind, by the points that the kind is measured by now. */
  async blank(kind: GarmentKind, paper: Paper): Promise<PrintedSheet> {
    const protocol = await this.protocols.current(this.work.reader, { kind, wornTogether: false });
    const museum = await museumName(this.work.reader);
    const pdf = await printBlank({ museum, protocol, garment: null }, await this.print(paper));
    return { pdf, fileName: fileName(kind, 'blank') };
  }

  /** For one part of one garment. @throws Refusal 404 */
  async blankFor(partId: string, paper: Paper): Promise<PrintedSheet> {
    const { reader } = this.work;
    const part = await reader.findOneBy(PartRow, { id: partId });
    if (!part) throw notFound('part.unknown', 'part');
    const row = await reader.findOneByOrFail(GarmentRow, { id: part.garmentId });
    const record = GarmentRecord.parse(row.record);
    const garment = this.onPaper({
      garmentId: row.id,
      wornTogether: part.wornTogether,
      garment: { ...record, partName: part.name, partSuffix: part.suffix },
    });
    const protocol = await this.protocols.current(reader, part);
    const pdf = await printBlank(
      { museum: await museumName(reader), protocol, garment },
      await this.print(paper),
    );
    return { pdf, fileName: fileName(garment.number, 'blank') };
  }

  private async print(paper: Paper): Promise<Print> {
    return { paper, faces: await readFaces(), madeAt: this.clock.now() };
  }

  private onPaper({
    garmentId,
    wornTogether,
    garment,
  }: Pick<Sheet, 'garmentId' | 'wornTogether'> & {
    readonly garment: Omit<Sheet['garment'], 'firstImageId'>;
  }): GarmentOnPaper {
    const { ownNumber, partSuffix, partName, title, date, maker, handling, hazards } = garment;
    return {
      number: numberOfPart(ownNumber, { suffix: partSuffix, wornTogether }),
      part: wornTogether ? 'Parts laid together as worn' : partName,
      date: readDate(date)?.display ?? date,
      ...{ title, maker, handling, hazards },
      link: `${this.environment.publicUrl}/workroom/garments/${garmentId}`,
    };
  }
}

const fileName = (...words: readonly string[]): string =>
  `${['measuring-sheet', ...words].join('-').replace(/[^A-Za-z0-9.-]+/g, '-')}.pdf`;
