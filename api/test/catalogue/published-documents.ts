import type { PublishedDocument, PublishedMeasurement } from '@ellwand/shared/records/published-garment';
import { Work } from '../../src/common/work';
import { CatalogueWriter } from '../../src/publishing/projection/catalogue-writer';
import { v7 as uuidv7 } from 'uuid';
import type { House } from '../harness/house';

/** A measurement of a published document; 1 mm either way, one round. */
export const measured = (pointId: string, valueMm: string): PublishedMeasurement => ({
  pointId,
  label: pointId,
  valueMm,
  uncertaintyMm: '1',
  rounds: 1,
  spreadMm: '0',
  levelFoundBy: null,
  tapeLengths: null,
  halfMm: null,
  worn: null,
  method: null,
  gapMm: null,
  depthMm: null,
  imageId: null,
});

/** A bodice of 1885 as it is published; a spec names what matters to it. */
export function publishedDocument(parts: Partial<PublishedDocument> = {}): PublishedDocument {
  const number = parts.number ?? 'lh-1966-30';
  return {
    number,
    version: 1,
    ownNumber: 'LH.1966.30',
    title: 'Teal bodice',
    kind: 'bodice',
    wornBy: 'woman',
    description: '',
    date: { edtf: '1885~', display: 'about 1885', fromYear: 1884, toYear: 1886 },
    maker: null,
    label: null,
    place: null,
    materials: ['silk'],
    techniques: [],
    colours: ['teal'],
    fastenings: '',
    lining: '',
    alterations: '',
    condition: '',
    hazards: [],
    wearer: '',
    references: '',
    otherNumbers: [],
    creditLine: 'Larkmoor House Museum of Dress',
    rights: { uri: 'http://creativecommons.org/publicdomain/zero/1.0/', label: 'CC0 1.0' },
    parts: [
      {
        number: `${number}.1`,
        kind: 'bodice',
        name: 'Bodice',
        wornTogether: false,
        measuredOn: '2026-03-02',
        support: 'flat',
        tape: 'Linen tape 3',
        fasteningPair: null,
        measuredBy: [],
        peopleCount: 2,
        measurements: [measured('waist', '612'), measured('bust', '850.5')],
        notTaken: [],
        derived: [],
        protocol: null,
        ownPoints: [],
        cutSheet: null,
      },
    ],
    images: [],
    museum: 'Larkmoor House Museum of Dress',
    publishedAt: '2026-04-01T10:00:00.000Z',
    ...parts,
  };
}

/** Publishes and withdraws as the verbs of `publishing` do, without the way there. */
export class Publisher {
  private readonly garments = new Map<string, string>();

  constructor(private readonly house: House) {}

  publish(parts: Partial<PublishedDocument> = {}): Promise<void> {
    const document = publishedDocument(parts);
    const garmentId = this.garments.get(document.number) ?? uuidv7();
    this.garments.set(document.number, garmentId);
    return this.house.app.get(Work).run((tx) => this.writer.publish(tx, garmentId, document));
  }

  withdraw(number: string, notice = 'Withdrawn at the lender’s wish.'): Promise<void> {
    return this.house.app
      .get(Work)
      .run((tx) => this.writer.withdraw(tx, number, { notice, withdrawnOn: '2026-05-06' }));
  }

  private get writer(): CatalogueWriter {
    return this.house.app.get(CatalogueWriter, { strict: false });
  }
}
