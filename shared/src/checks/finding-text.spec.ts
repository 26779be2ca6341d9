import { describe, expect, it } from 'vitest';
import { protocolFor } from '../protocols/standard-protocols.js';
import type { OwnPoint } from '../protocols/protocol.js';
import { measuringPoint } from '../points/measuring-points.js';
import { read } from '../testing/sample-readings.js';
import { sheetOf } from '../testing/test-check.js';
import { mm } from '../units/length.js';
import { type Figures, findingOf } from './finding-text.js';
import { runChecks } from './registry.js';

const sash: OwnPoint = {
  ...measuringPoint('across-back'),
  id: 'own-sash',
  name: 'Sash at the bow',
  softRange: { from: mm(100), to: mm(200), basis: 'For this test.' },
  line: {
    view: 'front',
    along: [
      [0, 0],
      [10, 0],
    ],
  },
};
const protocol = { ...protocolFor('bodice'), ownPoints: [sash] };

const found = (wording: string, given: Figures) =>
  findingOf({ checkId: 'a-check', message: 'said', severity: 'note', wording, given }, protocol);
const value = (pointId: string, valueMm: number, worn?: 'left' | 'right') => ({
  ...{ pointId, value: mm(valueMm), n: 1, spread: mm(0), uncertaintyMm: 1, tapeJoins: 0 },
  ...(worn ? { worn } : {}),
});

describe('the sentence of a finding', () => {
  it('names points, also the museum’s own, and the side where one was said', () => {
    expect(found('{point} is wide.', { point: { mentioned: 'own-sash' } }).sentence).toBe(
      'Sash at the bow is wide.',
    );
    expect(found('{point} is wide.', { point: { mentioned: 'cuff', worn: 'left' } }).sentence).toBe(
      'Left cuff is wide.',
    );
  });

  it('says on which side its values were read, where they were read on one', () => {
    const given = { cuff: value('cuff', 290, 'left'), back: value('across-back', 260) };
    expect(found('The cuff, {cuff}, exceeds {back}.', given).sentence).toBe(
      'Left, as worn: the cuff, 290 mm, exceeds 260 mm.',
    );
    const sides = { left: value('cuff', 290, 'left'), right: value('cuff', 310, 'right') };
    expect(found('{left} and {right}.', sides).sentence).toBe('290 mm and 310 mm.');
  });

  it('lists points in words, and keeps their figures', () => {
    const listed = [value('elbow', 320), value('sleeve-widest', 620), value('own-sash', 150)];
    const finding = found('Read over tissue: {points}.', { points: { listed } });
    expect(finding.sentence).toBe(
      'Read over tissue: elbow (320 mm), sleeve at its widest (620 mm) and sash at the bow (150 mm).',
    );
    expect(finding.figures).toEqual({ points1: mm(320), points2: mm(620), points3: mm(150) });
  });
});

describe('the key of a finding', () => {
  it('tells left from right where their figures are alike', () => {
    const left = found('{cuff}.', { cuff: value('cuff', 290, 'left') });
    const right = found('{cuff}.', { cuff: value('cuff', 290, 'right') });
    expect(left.key).toBe('a-check:said:cuff@left:290');
    expect(right.key).not.toBe(left.key);
    expect(left.pointIds).toEqual(['cuff']);
  });

  it('fits the column that answers are kept in, and still changes with any figure', () => {
    const many = (lastMm: number) =>
      found('{points}.', {
        points: {
          listed: [...protocol.points.map(({ pointId }) => value(pointId, 100)), value('hem', lastMm)],
        },
      }).key;
    expect(many(101)).toHaveLength(200);
    expect(many(101)).not.toBe(many(102));
    expect(many(101)).toBe(many(101));
  });
});

describe('a point that the museum made for itself', () => {
  const sheet = (valueMm: number) => sheetOf({ protocol, readings: [read('own-sash', valueMm)] });
  const sentences = (valueMm: number) =>
    runChecks(sheet(valueMm)).flatMap(({ pointIds, sentence }) =>
      pointIds.includes('own-sash') ? [sentence] : [],
    );

  it('is held against its own range', () => {
    expect(sentences(150)).toEqual([]);
    expect(sentences(290)).toEqual([
      'Sash at the bow reads 290 mm; 200 mm or less is usual. Read it again, or say why it is so large.',
    ]);
    expect(sentences(15)).toEqual([
      'Sash at the bow reads 15 mm; 150 mm would be usual. Were centimetres read, or did the decimal point slip?',
    ]);
  });
});
