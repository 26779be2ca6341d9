import { describe, expect, it } from 'vitest';
import { directionOn } from './cubic.js';
import { pathLength, pathData, startOf, endOf } from './path.js';
import { pathFrom } from './path-language.js';

const anchors = { tip: [150, -370], underarm: [184, -206] } as const;

describe('the path language', () => {
  it('finds anchors, and their fellows on the other half', () => {
    const line = pathFrom('~tip--underarm', anchors);
    expect(startOf(line)).toEqual([-150, -370]);
    expect(endOf(line)).toEqual([184, -206]);
  });

  it('draws straight pieces straight and curves by their directions', () => {
    expect(pathLength(pathFrom('0,0--30,40'))).toBeCloseTo(50, 9);
    expect(pathLength(pathFrom('100,0{90}..{180}0,100'))).toBeCloseTo(50 * Math.PI, 1);
  });

  it('keeps a knot smooth by one direction, and breaks it at a corner', () => {
    const bendAt = (text: string) => {
      const [before, after] = pathFrom(text);
      const [a, b] = [directionOn(before!, 1), directionOn(after!, 0)];
      return (Math.acos(Math.min(1, a[0] * b[0] + a[1] * b[1])) * 180) / Math.PI;
    };
    expect(bendAt('0,0..{45}60,20..100,90')).toBeLessThan(0.2);
    expect(bendAt('0,0..60,20..100,90')).toBeLessThan(0.2);
    expect(bendAt('0,0..60,20!..100,90')).toBeGreaterThan(10);
  });

  it('takes decimals and spaces', () => {
    expect(pathData(pathFrom('0,-1.5 -- 3,-1.5'))).toBe('M0 -1.5C1 -1.5 2 -1.5 3 -1.5');
  });

  it('names the path it cannot read', () => {
    expect(() => pathFrom('tip--waist', anchors)).toThrow('No anchor "waist" for the path "tip--waist"');
    expect(() => pathFrom('0,0--5,5?')).toThrow('Stray sign');
    expect(() => pathFrom('0,0 5,5')).toThrow('do not alternate');
    expect(() => pathFrom('0,0')).toThrow('do not alternate');
  });
});
