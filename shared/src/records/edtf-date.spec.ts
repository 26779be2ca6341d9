import { describe, expect, it } from 'vitest';
import { readDate } from './edtf-date.js';

describe('a garment’s date', () => {
  // Forms and their bounds: ISO 8601-2:2019 (EDTF), levels 0 to 2.
  it.each([
    ['1885', '1885', 1885, 1885],
    ['1885~', 'about 1885', 1885, 1885],
    ['1885?', 'perhaps 1885', 1885, 1885],
    ['188X', '1880s', 1880, 1889],
    ['1858/1861', '1858–1861', 1858, 1861],
    ['1885~/1890~', 'about 1885 to about 1890', 1885, 1890],
    ['1820-21', '1820', 1820, 1820], // 21 is spring, not a second year
    ['[1820..1830]', '1820–1830', 1820, 1830],
  ])('%s reads as %s', (edtf, display, fromYear, toYear) => {
    expect(readDate(edtf)).toEqual({ edtf, display, fromYear, toYear });
  });

  it.each(['', 'about 1885', '/1830', '../1830', '1861/1858', '12', '1885-13', '{'])(
    '%s is refused',
    (text) => {
      expect(readDate(text)).toBeUndefined();
    },
  );
});
