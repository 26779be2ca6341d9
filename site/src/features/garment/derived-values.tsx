import type { PublishedPart } from '@ellwand/shared/records/published-garment';
import { formatLength, type LengthUnit } from '@ellwand/shared/units/format-length';
import { fromMmString } from '@ellwand/shared/units/length';
import { InEachUnit, Length, Uncertainty } from '../../components/units/length';

type Derived = PublishedPart['derived'][number];

/** What was worked out from the readings, with the working. */
export function DerivedValues({ part }: { readonly part: PublishedPart }) {
  if (part.derived.length === 0) return null;
  return (
    <div className="derived">
      <h3>Worked out, not measured</h3>
      <dl>
        {part.derived.map((value) => (
          <div key={value.id}>
            <dt>{value.label}</dt>
            <dd>
              <Value derived={value} />
              <span className="measures-how">
                {value.formula}: <Working derived={value} />
              </span>
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}

function Value({ derived }: { readonly derived: Derived }) {
  if (derived.valueMm === null) return <span className="derived-value figures">{derived.ratio}</span>;
  return (
    <span className="derived-value">
      <Length mm={derived.valueMm} uncertaintyMm={derived.uncertaintyMm ?? undefined} />
      {derived.uncertaintyMm !== null && (
        <span className="derived-uncertainty">
          {' '}
          ± <Uncertainty mm={derived.uncertaintyMm} />
        </span>
      )}
    </span>
  );
}

/** The sum as it was done, in millimetres; in other units the figures that went into it. */
function Working({ derived: { worked, trace } }: { readonly derived: Derived }) {
  const figures = (unit: LengthUnit) =>
    trace.map(({ label, valueMm }) => `${label.toLowerCase()} ${formatLength(fromMmString(valueMm), unit)}`);
  return <InEachUnit wraps write={(unit) => (unit === 'mm' ? worked : figures(unit).join('; '))} />;
}
