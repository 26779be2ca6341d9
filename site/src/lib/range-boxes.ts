import { formatMeasure, type MeasureFilter, parseMeasure } from '@ellwand/shared/records/measure-filter';
import { figureText, type LengthUnit, lengthUnits } from '@ellwand/shared/units/format-length';
import { compareLengths, fromMmString, isMmString, toMmString } from '@ellwand/shared/units/length';
import { fromTyped } from '@ellwand/shared/units/parse-length';

/*
 * The two number boxes of a measuring range, as a plain form sends them: `min.waist=22 1/2`, `max.waist=24`,
 * `typed=in`; a range not yet in the search names itself in `new.point`. The address that follows holds
 * millimetres only. `was=waist:560..620` says what the boxes stood for: text that was not touched keeps its
 * exact bound, so that a range never drifts by being shown in another unit and sent again.
 */

/** Something typed that cannot be a length: where, what was typed, and how to mend it. */
export interface BoxProblem {
  readonly field: string;
  readonly typed: string;
  readonly sentence: string;
}

export interface BoxesRead {
  readonly filters: readonly MeasureFilter[];
  readonly problems: readonly BoxProblem[];
}

export function isUnit(text: string | null | undefined): text is LengthUnit {
  return lengthUnits.some((unit) => unit === text);
}

/** Which boxes an address holds, whatever is in them; `new` takes the place of a point until one is chosen. */
export function boxPoints(params: URLSearchParams): string[] {
  const named = [...params.keys()].map((key) => /^(?:min|max)\.([a-z0-9-]{1,60})$/.exec(key)?.[1]);
  return [...new Set(named.filter((point) => point !== undefined))];
}

export function readBoxes(params: URLSearchParams): BoxesRead {
  const typedUnit = params.get('typed');
  const unit = isUnit(typedUnit) ? typedUnit : 'mm';
  const before = params.getAll('was').map(parseMeasure);
  const filters: MeasureFilter[] = [];
  const problems: BoxProblem[] = [];
  for (const name of boxPoints(params)) {
    const point = name === 'new' ? (params.get('new.point') ?? '').trim() : name;
    const was = before.find((filter) => filter?.point === name) ?? null;
    const read = (field: string, bound: string | null) => {
      const typed = (params.get(field) ?? '').trim();
      return typed === boxText(bound, unit) ? bound : readBox(field, typed, unit, problems);
    };
    const min = read(`min.${name}`, was?.minMm ?? null);
    const max = read(`max.${name}`, was?.maxMm ?? null);
    if (point !== '' && (min !== null || max !== null)) filters.push(ordered(point, min, max));
    if (point === '' && (min !== null || max !== null)) {
      problems.push({
        field: 'new.point',
        typed: '',
        sentence: 'Choose which measurement the figures are of.',
      });
    }
  }
  return { filters, problems };
}

function readBox(field: string, typed: string, unit: LengthUnit, problems: BoxProblem[]): string | null {
  if (typed === '') return null;
  const read = fromTyped({ text: typed, unit });
  const mm = read.ok ? toMmString(read.value.length) : '';
  if (parseMeasure(formatMeasure({ point: 'any', minMm: mm, maxMm: null }))) return mm;
  problems.push({ field, typed, sentence: `“${typed}” is not a length. Write ${examples[unit]}.` });
  return null;
}

const examples: Readonly<Record<LengthUnit, string>> = {
  mm: 'millimetres, for example 560',
  cm: 'centimetres, for example 56 or 56.5',
  in: 'inches, for example 22, 22 1/2 or 22.5',
};

/** Typed the wrong way round, the two still mean the same range. */
function ordered(point: string, min: string | null, max: string | null): MeasureFilter {
  const swapped = min !== null && max !== null && compareLengths(fromMmString(min), fromMmString(max)) > 0;
  return swapped ? { point, minMm: max, maxMm: min } : { point, minMm: min, maxMm: max };
}

/** What a box shows for a bound of the search, in the visitor's unit. */
export function boxText(boundMm: string | null, unit: LengthUnit): string {
  if (boundMm === null || !isMmString(boundMm)) return '';
  const length = fromMmString(boundMm);
  const text =
    unit === 'in' ? figureText(length, 'in', { denominator: 16 }) : figureText(length, unit, { places: 5 });
  return unit === 'in' ? text : text.replace(/\.?0+$/, '');
}
