import type { PublishedDocument, PublishedMeasurement } from '@ellwand/shared/records/published-garment';
import { cutSheet, piece } from '@ellwand/shared/testing/sample-cut-sheets';
import { projectCutSheet } from '../projection/project-cut-sheet';
import { changesBetween } from './changes';

const waist: PublishedMeasurement = {
  pointId: 'waist',
  label: 'Waist',
  valueMm: '612',
  uncertaintyMm: '2.1',
  rounds: 1,
  spreadMm: '0',
  levelFoundBy: 'seam',
  tapeLengths: null,
  halfMm: null,
  worn: null,
  method: null,
  gapMm: null,
  depthMm: null,
  imageId: null,
};

const bodice: PublishedDocument['parts'][number] = {
  number: 'LH.1958.6',
  kind: 'bodice',
  name: 'Bodice',
  wornTogether: false,
  measuredOn: '2026-11-20',
  support: null,
  tape: null,
  fasteningPair: null,
  measuredBy: [],
  peopleCount: 2,
  measurements: [waist],
  notTaken: [],
  derived: [],
  protocol: null,
  ownPoints: [],
  cutSheet: null,
};

const published: PublishedDocument = {
  number: 'lh-1958-6',
  version: 1,
  ownNumber: 'LH.1958.6',
  title: 'Bodice of red wool',
  kind: 'bodice',
  wornBy: 'woman',
  description: '',
  date: { edtf: '1881/1883', display: '1881–1883', fromYear: 1881, toYear: 1883 },
  maker: null,
  label: null,
  place: null,
  materials: ['wool'],
  techniques: [],
  colours: [],
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
  parts: [bodice],
  images: [],
  museum: 'Larkmoor House Museum of Dress',
  publishedAt: '2026-11-20T09:00:00.000Z',
};

const withPart = (part: Partial<typeof bodice>): PublishedDocument => ({
  ...published,
  parts: [{ ...bodice, ...part }],
});

describe('what a new version changes', () => {
  it('is nothing where the public sees the same', () => {
    expect(
      changesBetween(published, { ...published, version: 2, publishedAt: '2026-12-01T09:00:00.000Z' }),
    ).toEqual([]);
  });

  it('is everything that is said, in a first version', () => {
    const added = changesBetween(null, published);
    expect(new Set(added.map((change) => change.kind))).toEqual(new Set(['added']));
    expect(added.map((change) => change.label)).toEqual(
      expect.arrayContaining(['Title', 'Materials', 'Waist (Bodice)']),
    );
    expect(added.map((change) => change.label)).not.toContain('Maker');
  });

  it('is told in the words of the field', () => {
    expect(changesBetween(published, { ...published, maker: 'Harbin & Lisle', materials: [] })).toEqual([
      { kind: 'added', area: 'record', label: 'Maker', before: null, after: 'Harbin & Lisle' },
      { kind: 'removed', area: 'record', label: 'Materials', before: 'wool', after: null },
    ]);
  });

  it('is a measurement that was read again, exactly', () => {
    expect(
      changesBetween(published, withPart({ measurements: [{ ...waist, valueMm: '613.5', rounds: 2 }] })),
    ).toEqual([
      {
        kind: 'changed',
        area: 'measurement',
        label: 'Waist (Bodice)',
        before: '612 mm ± 2.1 mm, at the seam',
        after: '613.5 mm ± 2.1 mm, at the seam, 2 rounds',
      },
    ]);
  });

  it('is a sixteenth of an inch, and how a level was found', () => {
    const finer = withPart({ measurements: [{ ...waist, valueMm: '612.0625', levelFoundBy: 'nicks' }] });
    expect(changesBetween(published, finer)).toMatchObject([
      { label: 'Waist (Bodice)', after: '612.0625 mm ± 2.1 mm, at the nicks in the seam' },
    ]);
  });

  it('is that people are named from now on', () => {
    const named = withPart({ measuredBy: ['Odile Marsh', 'Ines Thorne'] });
    expect(changesBetween(published, named)).toEqual([
      {
        kind: 'changed',
        area: 'record',
        label: 'Measured by (Bodice)',
        before: '2 in all',
        after: 'Odile Marsh, Ines Thorne, 2 in all',
      },
    ]);
  });

  it('is a measurement that can no longer be taken', () => {
    const frail = withPart({
      measurements: [],
      notTaken: [{ pointId: 'waist', label: 'Waist', worn: null, reason: 'too-fragile' }],
    });
    expect(changesBetween(published, frail)).toEqual([
      {
        kind: 'changed',
        area: 'measurement',
        label: 'Waist (Bodice)',
        before: '612 mm ± 2.1 mm, at the seam',
        after: 'Not taken. Too fragile to handle',
      },
    ]);
  });

  it('is a picture that comes, and its place', () => {
    const image = {
      id: 'a',
      view: 'front' as const,
      alt: 'Front.',
      caption: '',
      credit: '',
      widthPx: 9,
      heightPx: 9,
      widths: [],
    };
    expect(changesBetween(published, { ...published, images: [image] })).toEqual([
      { kind: 'added', area: 'picture', label: 'Picture, front', before: null, after: '1. Front.' },
    ]);
  });

  it('tells left and right apart, also beside a version from before they were', () => {
    const sleeve = { ...waist, pointId: 'sleeve-outer', label: 'Sleeve, outer', levelFoundBy: null };
    const right = { ...sleeve, worn: 'right', valueMm: '588' } as const;
    const left = { ...sleeve, worn: 'left', valueMm: '584', gapMm: '12' } as const;
    const both = withPart({ measurements: [right, left] });
    expect(changesBetween(both, both)).toEqual([]);
    const before = JSON.parse(
      JSON.stringify(
        withPart({ measurements: [{ ...sleeve, valueMm: '588' }] }),
        (name: string, value: unknown) =>
          ['worn', 'method', 'gapMm', 'depthMm'].includes(name) ? undefined : value,
      ),
    ) as PublishedDocument;
    expect(changesBetween(before, both).map(({ kind, label, after }) => [kind, label, after])).toEqual([
      ['removed', 'Sleeve, outer (Bodice)', null],
      ['added', 'Sleeve, outer, right, as worn (Bodice)', '588 mm ± 2.1 mm'],
      ['added', 'Sleeve, outer, left, as worn (Bodice)', '584 mm ± 2.1 mm, gap of 12 mm taken off'],
    ]);
  });

  it('tells of the cut field by field, also beside a version from before cut sheets', () => {
    const cut = (sheet: Parameters<typeof cutSheet>[0]) =>
      withPart({ cutSheet: projectCutSheet(cutSheet(sheet), [], []) });
    const front = piece('Front', { count: 2, widths: { waist: '152' } });
    const darts = [{ key: 'd1', piece: 'front', count: 2, tip: { typed: '92', unit: 'mm' as const } }];
    const before = cut({ pieces: [front], darts });
    expect(changesBetween(before, before)).toEqual([]);
    expect(
      changesBetween(
        before,
        cut({ pieces: [piece('Front', { count: 2, grain: 'bias', widths: { waist: '152.5' } })], darts: [] }),
      ).map(({ kind, area, label, before: was, after: is }) => [kind, area, label, was, is]),
    ).toEqual([
      ['changed', 'cut-sheet', 'Piece Front, grain (Bodice)', 'Not known', 'Bias'],
      ['changed', 'cut-sheet', 'Piece Front, waist width (Bodice)', '152 mm', '152.5 mm'],
      ['removed', 'cut-sheet', 'Dart 1, piece (Bodice)', 'Front', null],
      ['removed', 'cut-sheet', 'Dart 1, how many (Bodice)', '2', null],
      ['removed', 'cut-sheet', 'Dart 1, tip (Bodice)', '92 mm above the waist', null],
    ]);
    const without = (name: string, value: unknown) => (name === 'cutSheet' ? undefined : value);
    const old = JSON.parse(JSON.stringify(published, without)) as PublishedDocument;
    expect(changesBetween(old, before).map(({ kind }) => kind)).toEqual(Array(7).fill('added'));
  });
});
