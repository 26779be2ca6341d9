import { type Garment, GarmentRecord, type Part } from '@ellwand/shared/records/garment';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { Image } from '@ellwand/shared/records/image';
import type { RecordStage } from '@ellwand/shared/records/record-moves';
import { idOf } from './people.js';

interface Sketch {
  readonly number: string;
  readonly title: string;
  readonly kind: GarmentKind;
  readonly date: string;
  readonly stage: RecordStage;
  readonly parts?: readonly GarmentKind[];
  readonly more?: Partial<GarmentRecord>;
}

const sketches: readonly Sketch[] = [
  {
    number: 'LH.1966.30',
    title: 'Dress of teal silk and velvet with a shelf bustle',
    kind: 'dress',
    date: '1885~',
    stage: 'draft',
    parts: ['bodice', 'skirt'],
    more: {
      wornBy: 'woman',
      maker: 'Mesdames Orrin & Pell',
      place: 'Larkmoor',
      description:
        'A promenade dress in two parts. The skirt is drawn back over a deep shelf; one panel is striped. Brass buttons close the front in a single row.',
      label: { transcription: 'Orrin & Pell\nRobes', where: 'woven waist tape, centre back' },
      materials: ['silk faille', 'silk velvet', 'cotton lining'],
      techniques: ['machine stitched', 'hand finished'],
      colours: ['teal', 'ivory'],
      fastenings: 'Fourteen brass buttons, centre front; hooks at the waist tape.',
      hazards: [
        { id: 'arsenic', standing: 'suspected', note: 'Green lining of the pocket.' },
        { id: 'sharp', standing: 'tested-present', note: 'Steel wires in the bustle tapes.' },
      ],
      handling: 'The silk splits at both underarms. Lift on the board, never by the shoulders.',
      condition: 'Splits at the underarms, stable. Velvet crushed at the hem.',
      storeLocation: 'Room 2, bay D, box 114',
      otherNumbers: [{ kind: 'former', number: 'B 214' }],
    },
  },
  {
    number: 'LH.1958.6',
    title: 'Bodice of dark red wool',
    kind: 'bodice',
    date: '1881/1883',
    stage: 'in-review',
  },
  {
    number: 'LH.1980.40',
    title: 'Tailored jacket of brown tweed',
    kind: 'jacket',
    date: '1894/1896',
    stage: 'approved',
  },
  {
    number: 'LH.1954.17',
    title: 'Dress of white muslin with whitework',
    kind: 'dress',
    date: '1810/1815',
    stage: 'published',
  },
  {
    number: 'LH.1969.12',
    title: 'Cape of black wool with beads',
    kind: 'cape',
    date: '1890/1895',
    stage: 'withdrawn',
  },
  {
    number: 'LH.1944.1',
    title: 'Tailcoat of dark blue broadcloth',
    kind: 'coat',
    date: '1825/1830',
    stage: 'published',
  },
  {
    number: 'LH.1987.19',
    title: 'Corset of rust sateen, flossed',
    kind: 'corset',
    date: '1880/1885',
    stage: 'published',
  },
];

const made = '2026-11-20T10:00:00.000Z';

export const kindName = (kind: string) => kind.charAt(0).toUpperCase() + kind.slice(1).replace('-', ' ');

function part(garmentNumber: number, kind: GarmentKind, index: number, of: number): Part {
  return {
    id: idOf(1000 + garmentNumber * 10 + index),
    garmentId: idOf(100 + garmentNumber),
    suffix: of > 1 ? `.${index + 1}` : '',
    kind,
    name: kindName(kind),
    position: index,
    wornTogether: false,
    sheets: [],
  };
}

export function image(id: number, garmentId: string, position: number, more: Partial<Image> = {}): Image {
  return {
    id: idOf(id),
    garmentId,
    version: 1,
    position,
    view: 'front',
    alt: '',
    caption: '',
    credit: 'Larkmoor House Museum of Dress',
    hidden: false,
    fileName: `picture-${id}.jpg`,
    state: 'ready',
    formsMade: 8,
    formsWanted: 8,
    refusal: null,
    widthPx: 2100,
    heightPx: 2800,
    widths: [320, 640, 1280, 1920],
    pointId: null,
    takenOn: null,
    createdAt: made,
    ...more,
  };
}

/** The demonstration's garments as the Workroom holds them, the first with everything filled in. */
export function sampleGarments(): Garment[] {
  return sketches.map(({ number, title, kind, date, stage, parts = [kind], more = {} }, index): Garment => {
    const id = idOf(100 + index);
    const isPublic = stage === 'published';
    const pictures =
      index < 4
        ? [image(500 + index * 10, id, 0, { alt: `${title}, front`, caption: 'Rendered; invented garment' })]
        : [];
    return {
      id,
      version: 3,
      stage,
      publicNumber: isPublic || stage === 'withdrawn' ? number.toLowerCase().replaceAll('.', '-') : null,
      publishedVersion: isPublic ? 1 : null,
      isPublic,
      record: GarmentRecord.parse({
        ownNumber: number,
        title,
        kind,
        date,
        creditLine: 'Given by the Sallow family',
        ...more,
      }),
      parts: parts.map((one, place) => part(index, one, place, parts.length)),
      images: pictures,
      returned: null,
      createdAt: made,
      updatedAt: '2026-11-28T16:20:00.000Z',
    };
  });
}
