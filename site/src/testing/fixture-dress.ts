import { bodiceCutSheet } from './fixture-cut-sheet';
import type { PublishedGarment, PublishedMeasurement } from '@ellwand/shared/records/published-garment';
import { measuringPoint, type PointId } from '@ellwand/shared/points/measuring-points';

type Extra = Partial<Omit<PublishedMeasurement, 'pointId' | 'label' | 'valueMm'>>;

/** One published figure; what is not said is usual: two readings, 1 mm apart. */
export function measured(pointId: PointId, valueMm: string, extra: Extra = {}): PublishedMeasurement {
  return {
    pointId,
    label: measuringPoint(pointId).name,
    valueMm,
    uncertaintyMm: '1.5',
    rounds: 2,
    spreadMm: '1',
    levelFoundBy: null,
    tapeLengths: null,
    halfMm: null,
    worn: null,
    method: null,
    gapMm: null,
    depthMm: null,
    imageId: null,
    ...extra,
  };
}

export function picture(number: number, view: 'front' | 'back' | 'detail', alt: string) {
  return {
    id: `01930000-0000-7000-8000-${String(number).padStart(12, '0')}`,
    view,
    alt,
    caption: `${alt} Rendered; invented garment.`,
    credit: 'Larkmoor House Museum of Dress',
    widthPx: 2240,
    heightPx: 2800,
    widths: [320, 640, 1280, 1920],
  };
}

const traced = (pointId: PointId, valueMm: string) => ({
  pointId,
  label: measuringPoint(pointId).name,
  valueMm,
});

/** An invented dress in two parts with something of everything that a page can show. */
export const dressInTwoParts: PublishedGarment = {
  number: 'lh-1966-30',
  version: 3,
  state: 'current',
  versions: [
    { version: 1, publishedAt: '2026-02-02T10:00:00.000Z', state: 'superseded' },
    { version: 2, publishedAt: '2026-02-20T10:00:00.000Z', state: 'superseded' },
    { version: 3, publishedAt: '2026-03-14T10:00:00.000Z', state: 'current' },
  ],
  ownNumber: 'LH.1966.30',
  title: 'Visiting dress in teal silk and velvet',
  kind: 'dress',
  wornBy: 'woman',
  description:
    'A boned bodice with velvet revers and twenty-two brass buttons, over a skirt draped high at the back.\n\nThe striped panel of the front was woven for the dress.',
  date: { edtf: '1885~', display: 'about 1885', fromYear: 1883, toYear: 1887 },
  maker: 'Mrs Isolde Farrant',
  label: {
    transcription: 'Mrs FARRANT, Court Dress Maker\n12 Quarry Street, Larkmoor',
    where: 'woven tape at the inner waist band',
  },
  place: 'Larkmoor',
  materials: ['silk faille', 'silk velvet', 'cotton lining', 'brass'],
  techniques: ['machine sewn', 'hand finished'],
  colours: ['teal', 'cream'],
  fastenings: 'Centre front, twenty-two brass buttons; the skirt with three hooks and a tape.',
  lining: 'Twilled cotton, eleven bones.',
  alterations: 'The side seams of the bodice were let out by 8 mm each.',
  condition: 'Sound. The silk is split at the left underarm for 40 mm.',
  hazards: [{ id: 'weighted-silk', standing: 'suspected', note: 'Rustles and splits along the folds.' }],
  wearer: 'Worn to the opening of the Larkmoor waterworks.',
  references: '',
  otherNumbers: [{ kind: 'former', number: 'D.114' }],
  creditLine: 'Given by the Farrant family, 1966',
  rights: { uri: 'http://creativecommons.org/publicdomain/zero/1.0/', label: 'CC0 1.0' },
  images: [
    picture(1, 'front', 'The dress from the front, the bodice closed to the throat.'),
    picture(2, 'back', 'The dress from the back, the skirt draped over a shelf bustle.'),
    picture(3, 'detail', 'Three brass buttons on velvet, close.'),
  ],
  museum: 'Larkmoor House Museum of Dress',
  publishedAt: '2026-03-14T10:00:00.000Z',
  parts: [
    {
      number: 'LH.1966.30.1',
      kind: 'bodice',
      name: 'Bodice',
      wornTogether: false,
      measuredOn: '2026-01-21',
      support: 'flat-tissue',
      tape: 'Fibreglass, 1500 mm',
      fasteningPair: 'third button from the top and its hole',
      measuredBy: [],
      peopleCount: 2,
      measurements: [
        measured('bust', '862', { levelFoundBy: 'dart-tips' }),
        measured('waist', '612', { levelFoundBy: 'seam', uncertaintyMm: '1.2' }),
        measured('inner-waist-band', '596', { spreadMm: '2' }),
        measured('neck', '352'),
        measured('side-seam', '196', { uncertaintyMm: '0.9' }),
        measured('armscye', '414', { uncertaintyMm: '2.1' }),
        measured('cuff', '192'),
        measured('neck-to-hem-front', '466'),
        measured('waist-to-hem-front', '128'),
        measured('point-depth', '128', { rounds: 1, spreadMm: '0' }),
        measured('shoulder-seam', '108'),
        measured('across-front', '338'),
        measured('sleeve-outer', '584'),
        measured('sleeve-under', '428'),
        measured('elbow', '292', { halfMm: '146', uncertaintyMm: '2.4' }),
        measured('across-back', '322'),
        measured('underarm-to-underarm-back', '408'),
        measured('neck-to-hem-back', '498'),
        measured('waist-to-hem-back', '100'),
      ],
      notTaken: [
        {
          pointId: 'sleeve-widest',
          label: measuringPoint('sleeve-widest').name,
          worn: null,
          reason: 'too-fragile',
        },
      ],
      derived: [
        {
          id: 'neck-to-waist-back',
          label: 'Neck to waist, back',
          formula: 'neck to hem, back − waist to hem, back',
          worked: '498 mm − 100 mm = 398 mm',
          valueMm: '398',
          ratio: null,
          uncertaintyMm: '2.1',
          trace: [traced('neck-to-hem-back', '498'), traced('waist-to-hem-back', '100')],
        },
      ],
      protocol: null,
      ownPoints: [],
      cutSheet: bodiceCutSheet,
    },
    {
      number: 'LH.1966.30.2',
      kind: 'skirt',
      name: 'Skirt',
      wornTogether: false,
      measuredOn: '2026-01-21',
      support: 'flat',
      tape: 'Fibreglass, 1500 mm',
      fasteningPair: 'upper hook and its bar',
      measuredBy: ['Odile Brand', 'Tamsin Oke'],
      peopleCount: 2,
      measurements: [
        measured('waistband', '620'),
        measured('hem', '2742', {
          tapeLengths: { count: 1, tapeMm: '1500', restMm: '1242' },
          uncertaintyMm: '2.5',
        }),
        measured('hem-depth', '62'),
        measured('waist-to-hem-front', '1015'),
        measured('waist-to-hem-back', '1168.4'),
      ],
      notTaken: [{ pointId: 'hip', label: measuringPoint('hip').name, worn: null, reason: 'not-applicable' }],
      derived: [
        {
          id: 'hem-to-waist-ratio',
          label: 'Hem to waist',
          formula: 'hem ÷ waist',
          worked: '2742 mm ÷ 620 mm = 4.42',
          valueMm: null,
          ratio: '4.42',
          uncertaintyMm: null,
          trace: [traced('hem', '2742'), traced('waistband', '620')],
        },
      ],
      protocol: null,
      ownPoints: [],
      cutSheet: null,
    },
  ],
};

/** A garment that was public once. */
export const withdrawnNotice = {
  number: 'lh-1958-8',
  notice: 'Withdrawn at the request of the lender, to whom the garment has gone back.',
  withdrawnOn: '2026-05-04',
};
