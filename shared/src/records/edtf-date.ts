/** Dates of garments in EDTF (ISO 8601-2), read by a library and said in words. */
import { isEDTFInterval, parse } from '@edtf-ts/core';

export interface ReadDate {
  readonly edtf: string;
  /** For people: "1885", "about 1885", "1858–1861", "1880s". */
  readonly display: string;
  readonly fromYear: number;
  readonly toYear: number;
}

const earliestYear = 1000;
const latestYear = 2100;

/** Nothing where the text is not EDTF, or where one end is left open: a garment was made within some span. */
export function readDate(text: string): ReadDate | undefined {
  const edtf = text.trim();
  const parsed = parse(edtf);
  if (!parsed.success) return undefined;
  const { min, max } = parsed.value;
  if (!(min instanceof Date) || !(max instanceof Date)) return undefined;
  const fromYear = min.getUTCFullYear();
  const toYear = max.getUTCFullYear();
  if (!(fromYear >= earliestYear) || !(toYear <= latestYear) || fromYear > toYear) return undefined;
  const display = isEDTFInterval(parsed.value) ? spanInWords(edtf) : inWords(edtf, fromYear, toYear);
  return { edtf, display, fromYear, toYear };
}

function spanInWords(edtf: string): string {
  const [from = '', to = ''] = edtf.split('/');
  const qualified = /[~?%X]/.test(edtf);
  return `${inWords(from)}${qualified ? ' to ' : '–'}${inWords(to)}`;
}

/** "1885~" is "about 1885", "1885?" "perhaps 1885", "188X" "1880s"; anything rarer is given by its years. */
function inWords(edtf: string, fromYear?: number, toYear?: number): string {
  const found = /^(\d{3})(\d|X)([~?%]?)$/.exec(edtf);
  if (found) {
    const year = found[2] === 'X' ? `${found[1]}0s` : `${found[1]}${found[2]}`;
    return `${qualifiers[found[3] ?? ''] ?? ''}${year}`;
  }
  if (fromYear === undefined || toYear === undefined) return edtf;
  return fromYear === toYear ? String(fromYear) : `${fromYear}–${toYear}`;
}

const qualifiers: Readonly<Record<string, string>> = {
  '~': 'about ',
  '?': 'perhaps ',
  '%': 'perhaps about ',
};
