import { describe, expect, it } from 'vitest';
import { pointsPage } from '../testing/measuring-pages.js';
import { isLonger, mm, subtract } from '../units/length.js';
import { groups, isPointGroup } from './groups.js';
import { isGarmentKind, kindIds, kindLabels, lowerKind } from './kinds.js';
import {
  findMeasuringPoint,
  isPointId,
  measuringPoint,
  measuringPoints,
  pointsForKind,
  pointsInGroup,
  softRangeFor,
} from './measuring-points.js';
import { allowedSpread, allowedSpreadAt, houseTolerance } from './tolerance.js';

describe.each(measuringPoints.map((point) => [point.id, point] as const))('the point %s', (id, point) => {
  it('has a kebab-case id, a name and a group with a label', () => {
    expect(id).toMatch(/^[a-z]+(-[a-z]+)*$/);
    expect(point.name).toMatch(/^[A-Z]/);
    expect(isPointGroup(point.group)).toBe(true);
    expect(measuringPoint(id)).toBe(point);
  });

  it('is defined in a sentence, from one place to another, with what to watch for', () => {
    expect(point.definition).toMatch(/^[A-Z].{20,}\.$/);
    expect(point.watchFor).toMatch(/^[A-Z].{10,}\.$/);
    expect(point.from).not.toBe('');
    expect(point.to).not.toBe(point.from);
  });

  it('has a range with a basis for every kind it applies to', () => {
    expect(point.kinds.length).toBeGreaterThan(0);
    for (const kind of point.kinds) {
      const { from, to, basis } = softRangeFor(point, kind);
      expect(isLonger(to, from), kind).toBe(true);
      expect(basis.length).toBeGreaterThan(10);
    }
    for (const kind of Object.keys(point.softRangeByKind)) expect(point.kinds).toContain(kind);
  });

  it('lies inside only in the opened garment', () => {
    expect(point.side === 'inside').toBe(point.handlingStep === 'opened-inside');
  });

  it('says that the reading is doubled where it is', () => {
    expect(/twice the reading/.test(point.definition)).toBe(point.how === 'flat-doubled');
  });
});

describe('the catalogue of points', () => {
  it('has no id and no name twice', () => {
    expect(new Set(measuringPoints.map(({ id }) => id)).size).toBe(measuringPoints.length);
    expect(new Set(measuringPoints.map(({ name }) => name)).size).toBe(measuringPoints.length);
  });

  it('has a page that says what the code does', async () => {
    await expect(pointsPage()).toMatchFileSnapshot('../../../docs/measuring/points.md');
  });

  it('leaves no group and no kind without a point', () => {
    for (const group of groups) expect(pointsInGroup(group.id).length, group.id).toBeGreaterThan(0);
    for (const kind of kindIds) expect(pointsForKind(kind).length, kind).toBeGreaterThan(0);
  });

  it('records how the level of bust, waist and hip was found', () => {
    for (const id of ['bust', 'waist', 'waistband', 'hip', 'high-hip', 'coat-chest', 'coat-waist'] as const) {
      expect(measuringPoint(id).levelRecorded, id).toBe(true);
    }
  });

  it('counts a hem and a train in tape lengths, and a waist never', () => {
    expect(measuringPoint('hem').takesTapeLengths).toBe(true);
    expect(measuringPoint('waist-to-hem-back').takesTapeLengths).toBe(true);
    expect(measuringPoint('waist').takesTapeLengths).toBe(false);
  });

  it('knows a bodice’s length from a dress’s', () => {
    const length = measuringPoint('neck-to-hem-back');
    expect(softRangeFor(length, 'bodice').to).toBe(mm(800));
    expect(softRangeFor(length, 'dress').to).toBe(mm(3500));
  });

  it('answers nothing to an id it does not have', () => {
    expect(isPointId('toString')).toBe(false);
    expect(findMeasuringPoint('__proto__')).toBeUndefined();
    expect(isGarmentKind('set')).toBe(false);
    expect(isPointGroup('constructor')).toBe(false);
  });

  it('labels every kind in the singular and the plural', () => {
    for (const kind of kindIds) expect(kindLabels[kind].plural.length).toBeGreaterThan(2);
    expect(lowerKind('child-dress')).toBe('child’s dress');
  });
});

describe('the tolerance between rounds', () => {
  it('is 3 mm, 5 mm above a metre, and 2 mm more for each tape join', () => {
    expect(allowedSpread(houseTolerance, mm(1000))).toBe(mm(3));
    expect(allowedSpread(houseTolerance, mm('1000.0001'))).toBe(mm(5));
    expect(subtract(allowedSpread(houseTolerance, mm(5242), 3), mm(5))).toBe(mm(6));
    expect(allowedSpreadAt(measuringPoint('waist'), mm(612))).toBe(mm(3));
    expect(allowedSpreadAt(measuringPoint('elbow'), mm(290))).toBe(mm(6));
  });
});
