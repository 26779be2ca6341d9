import { lengthUnits } from '@ellwand/shared/units/format-length';
import fc from 'fast-check';
import { expect, it } from 'vitest';
import { tapeMarks } from './tape-marks';

const figures = (start: number, end: number, unit: 'mm' | 'in') =>
  tapeMarks(start, end, unit, 240)
    .filter(({ reach }) => reach === 2)
    .map(({ mm }) => mm);

it('bears a figure at every tenth mark of a metric stretch', () => {
  expect(figures(560, 860, 'mm')).toEqual([600, 650, 700, 750, 800, 850]);
});

it('counts whole inches where there is room, then tens', () => {
  expect(figures(560, 660, 'in').map((mm) => Math.round(mm / 2.54) / 10)).toEqual([23, 24, 25]);
  expect(figures(2000, 4400, 'in').map((mm) => Math.round(mm / 2.54) / 10)).toEqual([80, 100, 120, 140, 160]);
});

it('never sets its marks so close that they run into a grey, nor outside the stretch', () => {
  const stretch = fc.tuple(fc.integer({ min: 0, max: 3000 }), fc.integer({ min: 20, max: 5000 }));
  fc.assert(
    fc.property(stretch, fc.constantFrom(...lengthUnits), ([start, long], unit) => {
      const marks = tapeMarks(start, start + long, unit, 240);
      const gaps = marks.slice(1).map(({ mm }, index) => ((mm - (marks[index]?.mm ?? 0)) / long) * 240);
      expect(Math.min(...gaps, 240)).toBeGreaterThanOrEqual(3.39);
      expect(marks.every(({ mm }) => mm >= start - 0.001 && mm <= start + long + 0.001)).toBe(true);
    }),
  );
});
