import type { ReadDate } from './edtf-date.js';

type Years = Pick<ReadDate, 'fromYear' | 'toYear'>;

/** A date wider than this belongs to no decade in particular. */
const WIDEST_YEARS = 20;

/** Every decade that a span of years touches, by its first year: 1858–1861 is of the 1850s and of the 1860s. */
export function decadesOf({ fromYear, toYear }: Years): readonly number[] {
  const first = Math.floor(fromYear / 10) * 10;
  const count = (Math.floor(toYear / 10) * 10 - first) / 10 + 1;
  return Array.from({ length: Math.max(count, 0) }, (_, index) => first + 10 * index);
}

/** Whether two dates touch one decade; never where either is too wide to say. */
export function shareDecade(first: Years, second: Years): boolean {
  if ([first, second].some(({ fromYear, toYear }) => toYear - fromYear > WIDEST_YEARS)) return false;
  const decades = new Set(decadesOf(second));
  return decadesOf(first).some((decade) => decades.has(decade));
}
