import { formatMeasure, type MeasureFilter } from '@ellwand/shared/records/measure-filter';
import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { LengthUnit } from '@ellwand/shared/units/format-length';
import { fromMmString, toMm } from '@ellwand/shared/units/length';
import { groups } from '@ellwand/shared/points/groups';
import { useUnit } from '../../components/units/use-unit';
import { useFollowing } from '../../components/ui/use-following';
import { type BoxProblem, boxText } from '../../lib/range-boxes';
import { counted } from '../../lib/words';
import { RangeChart } from './range-chart';

interface RangeFieldsProps {
  readonly query: SearchQuery;
  readonly ranges: SearchAnswer['ranges'];
  readonly problems: readonly BoxProblem[];
}

/** Measuring ranges: a pair of boxes for each that the search or the answer knows, and one pair for another. */
export function RangeFields({ query, ranges, problems }: RangeFieldsProps) {
  const unit = useUnit();
  const inAnswer = new Set(ranges.map(({ point }) => point));
  const strays = query.measure.filter(({ point }) => !inAnswer.has(point));
  const shown: Range[] = [...ranges, ...strays.map(strayRange)];
  const others = groups.filter(({ id }) => shown.every(({ point }) => point !== id));
  return (
    <fieldset className="facet">
      <legend>Measurements</legend>
      <p className="facet-hint">Inside of the garment, as fastened. One box may stay empty.</p>
      <input type="hidden" name="typed" value={unit} />
      {shown.map((range) => (
        <OneRange
          key={range.point}
          range={range}
          filter={query.measure.find(({ point }) => point === range.point) ?? null}
          unit={unit}
          problems={problems}
        />
      ))}
      <AnotherRange others={others} unit={unit} problems={problems} />
    </fieldset>
  );
}

type Range = SearchAnswer['ranges'][number];

const strayRange = ({ point, minMm, maxMm }: MeasureFilter): Range => ({
  point,
  label: groups.find(({ id }) => id === point)?.label ?? point,
  minMm,
  maxMm,
  missing: 0,
  bins: [],
});

interface OneRangeProps {
  readonly range: Range;
  readonly filter: MeasureFilter | null;
  readonly unit: LengthUnit;
  readonly problems: readonly BoxProblem[];
}

function OneRange({ range, filter, unit, problems }: OneRangeProps) {
  const asNumber = (mm: string | null | undefined) => (mm ? toMm(fromMmString(mm)) : null);
  return (
    <div className="range" role="group" aria-label={range.label}>
      <p className="range-name">{range.label}</p>
      <RangeChart range={range} fromMm={asNumber(filter?.minMm)} toMm={asNumber(filter?.maxMm)} />
      {filter && <input type="hidden" name="was" value={formatMeasure(filter)} />}
      <div className="range-boxes">
        <LengthBox
          name={`min.${range.point}`}
          label="From"
          of={range.label}
          bound={filter?.minMm}
          unit={unit}
          problems={problems}
        />
        <LengthBox
          name={`max.${range.point}`}
          label="To"
          of={range.label}
          bound={filter?.maxMm}
          unit={unit}
          problems={problems}
        />
      </div>
      {range.missing > 0 && (
        <p className="facet-hint">{counted(range.missing, 'garment')} without this measurement.</p>
      )}
    </div>
  );
}

interface LengthBoxProps {
  readonly name: string;
  readonly label: string;
  readonly of: string;
  readonly bound?: string | null | undefined;
  readonly unit: LengthUnit;
  readonly problems: readonly BoxProblem[];
}

/** A box for a length in the visitor's unit. What could not be read stays in it, with the word on how to mend it. */
export function LengthBox({ name, label, of, bound, unit, problems }: LengthBoxProps) {
  const problem = problems.find(({ field }) => field === name);
  const text = problem?.typed ?? boxText(bound ?? null, unit);
  const id = `box-${name.replace('.', '-')}`;
  const field = useFollowing<HTMLInputElement>(text);
  return (
    <div>
      <label htmlFor={id} className="label">
        <span className="sr-only">{of}: </span>
        {label} ({unit})
      </label>
      <input
        ref={field}
        id={id}
        name={name}
        type="text"
        inputMode={unit === 'in' ? 'text' : 'decimal'}
        autoComplete="off"
        defaultValue={text}
        aria-invalid={problem ? true : undefined}
        aria-describedby={problem ? `${id}-problem` : undefined}
        className="input input-small input-figure"
      />
      {problem && (
        <span id={`${id}-problem`} className="field-problem">
          {problem.sentence}
        </span>
      )}
    </div>
  );
}

interface AnotherRangeProps {
  readonly others: typeof groups;
  readonly unit: LengthUnit;
  readonly problems: readonly BoxProblem[];
}

function AnotherRange({ others, unit, problems }: AnotherRangeProps) {
  const problem = problems.find(({ field }) => field === 'new.point');
  return (
    <details className="range-another" open={problems.some(({ field }) => field.includes('new'))}>
      <summary>Another measurement</summary>
      <label htmlFor="box-new-point" className="label">
        Measurement
      </label>
      <select
        id="box-new-point"
        name="new.point"
        className="input input-small"
        defaultValue=""
        key={others.length}
        aria-describedby={problem ? 'box-new-point-problem' : undefined}
      >
        <option value="">Choose one</option>
        {others.map(({ id, label }) => (
          <option key={id} value={id}>
            {label}
          </option>
        ))}
      </select>
      {problem && (
        <span id="box-new-point-problem" className="field-problem">
          {problem.sentence}
        </span>
      )}
      <div className="range-boxes">
        <LengthBox name="min.new" label="From" of="the measurement chosen" unit={unit} problems={problems} />
        <LengthBox name="max.new" label="To" of="the measurement chosen" unit={unit} problems={problems} />
      </div>
    </details>
  );
}
