import { runsOf } from './faces';

describe('text in stretches of one typeface', () => {
  it('is one stretch where one typeface has it all', () => {
    expect(runsOf('Waist, 612 mm ± 2.1 mm − ½ × 3 → “ß”', 'sans')).toEqual([
      { face: 'sans-latin', text: 'Waist, 612 mm ± 2.1 mm − ½ × 3 → “ß”' },
    ]);
  });

  it('changes typeface for another alphabet and back, however the accents were typed', () => {
    expect(runsOf('Z\u0307o\u0301łta Ёлка x', 'sans-semibold')).toEqual([
      { face: 'sans-semibold-latin-ext', text: 'Ż' },
      { face: 'sans-semibold-latin', text: 'ó' },
      { face: 'sans-semibold-latin-ext', text: 'ł' },
      { face: 'sans-semibold-latin', text: 'ta ' },
      { face: 'sans-semibold-cyrillic', text: 'Ёлка ' },
      { face: 'sans-semibold-latin', text: 'x' },
    ]);
  });

  it('sets in the plain typeface what the title’s has not', () => {
    expect(runsOf('Łódź', 'title').map(({ face }) => face)).toEqual([
      'sans-semibold-latin-ext',
      'title',
      'sans-semibold-latin-ext',
    ]);
  });

  it('writes a sign that no typeface has as its number, and a line’s end as a space', () => {
    expect(runsOf('a\n測', 'sans')).toEqual([{ face: 'sans-latin', text: 'a [U+6E2C]' }]);
  });
});
