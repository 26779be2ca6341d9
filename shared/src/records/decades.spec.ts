import { describe, expect, it } from 'vitest';
import { decadesOf, shareDecade } from './decades.js';
import { readDate } from './edtf-date.js';

const date = (edtf: string) => {
  const read = readDate(edtf);
  if (!read) throw new Error(`${edtf} cannot be read`);
  return read;
};
const share = (first: string, second: string): boolean => shareDecade(date(first), date(second));

describe('decades', () => {
  it('are all that a date touches', () => {
    expect(decadesOf(date('1858/1861'))).toEqual([1850, 1860]);
    expect(decadesOf(date('1885~'))).toEqual([1880]);
    expect(decadesOf(date('188X'))).toEqual([1880]);
  });

  it('are shared where two dates touch the same one', () => {
    expect(share('1885~', '1881')).toBe(true);
    expect(share('1858/1861', '1869')).toBe(true);
    expect(share('1879', '1880')).toBe(false);
  });

  it('are nobody’s where a date is too wide to say', () => {
    expect(share('1840/1865', '1850')).toBe(false);
    expect(share('1850', '1840/1865')).toBe(false);
    expect(share('1845/1865', '1850')).toBe(true);
  });
});
