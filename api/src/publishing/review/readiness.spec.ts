import { GarmentRecord } from '@ellwand/shared/records/garment';
import type { Image } from '@ellwand/shared/records/image';
import { readiness, type ReadinessFacts } from './readiness';

const record = GarmentRecord.parse({
  ownNumber: 'LH.1962.8',
  title: 'Printed cotton dress',
  kind: 'dress',
  date: '1834~',
  creditLine: 'Larkmoor House Museum of Dress',
});

const picture: Image = {
  id: '01930000-0000-7000-8000-000000000001',
  garmentId: '01930000-0000-7000-8000-000000000002',
  version: 1,
  position: 0,
  view: 'front',
  alt: 'The dress from the front.',
  caption: '',
  credit: '',
  hidden: false,
  fileName: 'front.jpg',
  state: 'ready',
  formsMade: 8,
  formsWanted: 8,
  refusal: null,
  widthPx: 2000,
  heightPx: 2800,
  widths: [320, 640, 1280, 1920],
  pointId: null,
  takenOn: null,
  createdAt: '2026-11-20T09:00:00.000Z',
};

const sound: ReadinessFacts = {
  garmentId: 'g1',
  record,
  parts: [{ name: 'Dress', sheets: [{ id: 's1', state: 'complete', purpose: 'record' }] }],
  images: [picture],
  openQuestions: [{ sheetId: 's1', partName: 'Dress', count: 0 }],
};

const says = (facts: Partial<ReadinessFacts>) =>
  readiness({ ...sound, ...facts }).map(({ blocks, sentence }) => `${blocks}: ${sentence}`);

describe('what keeps a record from its next step', () => {
  it('is nothing where it is measured, described and answered', () => {
    expect(readiness(sound)).toEqual([]);
  });

  it.each<[string, Partial<ReadinessFacts>, string]>([
    ['no sheet at all', { parts: [{ name: 'Dress', sheets: [] }] }, 'submit: Nothing has been measured yet.'],
    [
      'study sheets alone',
      { parts: [{ name: 'Dress', sheets: [{ id: 's1', state: 'complete', purpose: 'study' }] }] },
      'submit: Nothing has been measured yet.',
    ],
    [
      'an open sheet',
      { parts: [{ name: 'Dress', sheets: [{ id: 's1', state: 'open', purpose: 'record' }] }] },
      'submit: Dress: the measuring sheet is still open.',
    ],
    [
      'a date that cannot be read',
      { record: { ...record, date: '1885-13' } },
      'submit: The date “1885-13” cannot be read. Write a year or a span, such as 1885~ or 1858/1861.',
    ],
    [
      'a picture that is still being made',
      { images: [{ ...picture, state: 'making' }] },
      'submit: One picture is still being made ready.',
    ],
    [
      'pictures without words',
      {
        images: [
          { ...picture, alt: ' ' },
          { ...picture, alt: '' },
        ],
      },
      'submit: 2 pictures are without an alternative text.',
    ],
    [
      'a question without an answer',
      { openQuestions: [{ sheetId: 's1', partName: 'Dress', count: 1 }] },
      'approve: Dress: one question is open.',
    ],
  ])('is %s', (_what, facts, sentence) => {
    expect(says(facts)).toEqual([sentence]);
  });

  it('is no picture that the public will not see', () => {
    const unseen = [
      { ...picture, alt: '', hidden: true },
      { ...picture, alt: '', state: 'refused' as const },
    ];
    expect(says({ images: unseen })).toEqual([]);
  });
});
