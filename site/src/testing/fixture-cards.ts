import { measuringPoint, type PointId } from '@ellwand/shared/points/measuring-points';
import type { CatalogueCard } from '@ellwand/shared/records/published-garment';
import { picture } from './fixture-dress';

export interface FixtureGarment {
  readonly card: CatalogueCard;
  readonly year: number;
  readonly colour: string;
}

type Row = readonly [
  number: string,
  title: string,
  kind: string,
  date: string,
  year: number,
  colour: string,
  measures: Partial<Record<PointId, string>>,
];

const rows: readonly Row[] = [
  [
    'lh-1966-30',
    'Visiting dress in teal silk and velvet',
    'dress',
    'about 1885',
    1885,
    'teal',
    { bust: '862', waist: '612', hem: '2742' },
  ],
  [
    'lh-1954-17',
    'White muslin gown with whitework',
    'dress',
    '1810 to 1815',
    1812,
    'white',
    { bust: '780', 'under-bust': '705', hem: '2210' },
  ],
  [
    'lh-1962-8',
    'Day dress in printed cotton with great sleeves',
    'dress',
    'about 1834',
    1834,
    'cream',
    { bust: '820', waist: '585', hem: '3120' },
  ],
  [
    'lh-1938-22',
    'Day dress in shot green silk',
    'dress',
    '1842 to 1846',
    1844,
    'green',
    { bust: '804', waist: '571.5', hem: '3610' },
  ],
  [
    'lh-1971-3',
    'Day dress in checked silk with pagoda sleeves',
    'dress',
    '1858 to 1861',
    1860,
    'brown',
    { bust: '846', waist: '608', hem: '4380' },
  ],
  [
    'lh-1949-11',
    'Dress in violet faille with a low puff',
    'dress',
    '1872 to 1874',
    1873,
    'violet',
    { bust: '835', waist: '598', hem: '3290' },
  ],
  [
    'lh-1990-2',
    'Summer dress in ivory lawn and lace',
    'dress',
    '1905 to 1907',
    1906,
    'ivory',
    { bust: '910', waist: '640', hem: '3480' },
  ],
  [
    'lh-1958-6',
    'Cuirass bodice in dark red wool',
    'bodice',
    '1881 to 1883',
    1882,
    'red',
    { bust: '848', waist: '604', 'neck-to-hem-back': '560' },
  ],
  [
    'lh-1958-7',
    'Trained skirt in olive wool',
    'skirt',
    '1876 to 1879',
    1877,
    'green',
    { waistband: '615', hem: '2680', 'waist-to-hem-back': '1490' },
  ],
  [
    'lh-1944-1',
    'Tailcoat in dark blue broadcloth',
    'coat',
    '1825 to 1830',
    1827,
    'blue',
    { 'coat-chest': '965', 'coat-waist': '820', 'coat-full-back': '1010' },
  ],
  [
    'lh-1944-2',
    'Waistcoat in cream silk with a woven sprig',
    'waistcoat',
    '1845 to 1850',
    1847,
    'cream',
    { 'waistcoat-chest': '930', 'waistcoat-back': '520', 'waistcoat-front': '605' },
  ],
  [
    'lh-1944-3',
    'Fall-front trousers in fawn wool',
    'trousers',
    '1830 to 1835',
    1832,
    'brown',
    { 'trouser-waistband': '790', 'outside-leg': '1075', 'inside-leg': '760' },
  ],
  [
    'lh-1969-12',
    'Cape in black wool with beads',
    'cape',
    '1890 to 1895',
    1892,
    'black',
    { 'cape-neck': '412', 'cape-back-length': '610', 'cape-sweep': '2960' },
  ],
  [
    'lh-1952-5',
    'Man’s shirt in white linen',
    'shirt',
    'about 1820',
    1820,
    'white',
    { neckband: '395', 'shirt-body': '1580', 'shirt-back': '1090' },
  ],
  [
    'lh-1987-19',
    'Corset in rust sateen, flossed',
    'corset',
    '1880 to 1885',
    1883,
    'brown',
    { 'corset-waist-closed': '546', 'corset-top': '812', busk: '330' },
  ],
  [
    'lh-1987-20',
    'Petticoat in white cotton with tucks',
    'petticoat',
    '1860 to 1865',
    1862,
    'white',
    { waistband: '630', hem: '3940', 'waist-to-hem-front': '960' },
  ],
  [
    'lh-1995-8',
    'Child’s dress in pale blue challis',
    'child-dress',
    '1855 to 1860',
    1857,
    'blue',
    { 'child-chest': '585', 'child-waist': '560', 'child-length': '640' },
  ],
  [
    'lh-2011-3',
    'Top hat in black silk plush',
    'hat',
    '1840 to 1850',
    1845,
    'black',
    { 'head-opening': '572', 'crown-height': '172', 'brim-front': '41' },
  ],
  [
    'lh-2011-4',
    'Shoes in yellow-green silk',
    'shoe',
    '1790 to 1800',
    1795,
    'green',
    { sole: '238', tread: '71', heel: '38' },
  ],
];

/** Invented garments, as cards of a catalogue, newest measured first. */
export const fixtureGarments: readonly FixtureGarment[] = rows.map(
  ([number, title, kind, dateDisplay, year, colour, measures], index) => ({
    year,
    colour,
    card: {
      number,
      title,
      kind,
      dateDisplay,
      image: number === 'lh-1952-5' ? null : picture(index * 10 + 1, 'front', `${title}, from the front.`),
      measurements: Object.entries(measures).map(([id, valueMm]) => {
        const { name } = measuringPoint(id as PointId);
        return { pointId: id, label: name, partName: 'Whole', valueMm };
      }),
    },
  }),
);
