import type { Garment } from '@ellwand/shared/records/garment';
import type { Sheet, StoredReading } from '@ellwand/shared/records/sheet';
import { idOf, staff } from './people.js';
import { reading, sheetFor } from './sheets.js';

const muslin: Readonly<Record<string, string>> = {
  bust: '842',
  'under-bust': '796',
  waist: '788',
  neck: '612',
  armscye: '402',
  hem: '2186',
  'neck-to-hem-front': '1246',
  'shoulder-seam': '62',
  'across-front': '298',
  'sleeve-outer': '312',
  'across-back': '182',
  'neck-to-hem-back': '1388',
};

const doubled = ['sleeve-widest', 'elbow'];

interface Year {
  readonly day: string;
  readonly read: Readonly<Record<string, string>>;
  readonly more?: Partial<Sheet['facts']>;
  readonly remark?: string;
}

const years: readonly Year[] = [
  {
    day: '2009-04-22',
    read: { ...muslin, 'neck-to-hem-front': '1229', 'neck-to-hem-back': '1370', hem: '2184' },
    more: { note: 'The hem is turned up by some 18 mm and tacked, later than the dress.' },
  },
  {
    day: '2021-09-14',
    read: { ...muslin, 'sleeve-widest': '352', elbow: '268' },
    remark:
      'Tacking of the hem taken out in the treatment of spring 2021. A tear of 22 mm at the left underarm, stable.',
  },
  {
    day: '2026-10-06',
    read: { bust: '844', waist: '789', 'across-back': '183' },
    more: { purpose: 'study' },
  },
];

function readingsOf(year: number, { day, read }: Year): StoredReading[] {
  const at = `${day}T09:30:00.000Z`;
  const taken = Object.entries(read).map(([pointId, valueMm], index) =>
    reading(3100 + year * 100 + index, pointId, valueMm, {
      keyedAt: at,
      receivedAt: at,
      ...(pointId === 'sleeve-outer' ? { worn: 'right' as const } : {}),
    }),
  );
  const left = { worn: 'left' as const, keyedAt: at, receivedAt: at };
  const other = 'sleeve-outer' in read ? [reading(3190 + year * 100, 'sleeve-outer', '309', left)] : [];
  const nothing = {
    state: 'not-taken',
    valueMm: null,
    typed: null,
    unit: null,
    reason: 'too-fragile',
  } as const;
  const fragile =
    year === 0 ? doubled.map((pointId, index) => reading(3195 + index, pointId, '0', nothing)) : [];
  return [...taken, ...other, ...fragile];
}

/** The muslin dress, measured before and after its treatment, and once more as a study piece. */
export function sheetsOverTheYears(garments: readonly Garment[]): Sheet[] {
  const dress = garments.find(({ record }) => record.ownNumber === 'LH.1954.17');
  if (!dress) return [];
  return years.map((year, index): Sheet => {
    const sheet = sheetFor(dress, 0, idOf(2100 + index));
    const said = { id: idOf(2150 + index), device: 'Tablet 7c1d', saidAt: `${year.day}T11:00:00.000Z` };
    const kept = { by: staff.curator.id, byName: staff.curator.name, receivedAt: said.saidAt };
    return {
      ...sheet,
      state: 'complete',
      facts: { ...sheet.facts, measuredOn: year.day, ...year.more },
      readings: readingsOf(index, year),
      tableNotes: year.remark
        ? [{ ...said, ...kept, about: 'described', thing: 'condition', text: year.remark }]
        : [],
    };
  });
}

export const overTheYears = {
  garmentNumber: 'LH.1954.17',
  first: idOf(2100),
  second: idOf(2101),
  study: idOf(2102),
};
