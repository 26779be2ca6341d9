import { type PublishedMeasurement, type PublishedPart } from '@ellwand/shared/records/published-garment';
import { type LitPoints } from '../../components/diagram/lit-points';
import { Length, Spread, Uncertainty, UnitName } from '../../components/units/length';
import { howHeld, levelText, roundsText } from './measuring-words';
import { PointName } from './point-name';

interface MeasurementTableProps {
  readonly part: PublishedPart;
  readonly letters: ReadonlyMap<string, string>;
  readonly lit: LitPoints;
  readonly rowId: (pointId: string) => string;
}

/** Every published number of a part: where, how held, how found, and how far it can be trusted. */
export function MeasurementTable({ part, letters, lit, rowId }: MeasurementTableProps) {
  const order = [...letters.keys()];
  const place = ({ pointId }: PublishedMeasurement) =>
    (order.indexOf(pointId) + order.length + 1) % (order.length + 1);
  const measurements = [...part.measurements].sort((a, b) => place(a) - place(b));
  return (
    <table className="measures">
      <caption className="sr-only">
        Measurements of the {part.name.toLowerCase()}, each with its uncertainty
      </caption>
      <thead>
        <tr>
          <th scope="col">
            <span className="sr-only">Letter on the diagram</span>
          </th>
          <th scope="col">Point</th>
          <th scope="col" className="text-end">
            <UnitName />
          </th>
          <th scope="col" className="text-end whitespace-nowrap">
            ± <UnitName />
          </th>
        </tr>
      </thead>
      <tbody>
        {measurements.map((measurement) => (
          <MeasurementRow
            key={measurement.pointId}
            part={part}
            measurement={measurement}
            letter={letters.get(measurement.pointId)}
            lit={lit}
            id={rowId(measurement.pointId)}
          />
        ))}
      </tbody>
    </table>
  );
}

interface MeasurementRowProps {
  readonly part: PublishedPart;
  readonly measurement: PublishedMeasurement;
  readonly letter: string | undefined;
  readonly lit: LitPoints;
  readonly id: string;
}

function MeasurementRow({ part, measurement, letter, lit, id }: MeasurementRowProps) {
  const { pointId, label, valueMm, uncertaintyMm } = measurement;
  return (
    <tr
      data-lit={lit.lit === pointId ? '' : undefined}
      onPointerEnter={() => lit.light(pointId)}
      onPointerLeave={() => lit.light(null)}
      onFocus={() => lit.light(pointId)}
      onBlur={() => lit.light(null)}
    >
      <td>
        {letter && (
          <button
            type="button"
            id={id}
            className="letter"
            aria-pressed={lit.chosen === pointId}
            aria-label={`${letter}: show ${label.toLowerCase()} on the diagram`}
            onClick={() => lit.chooseRow(pointId)}
          >
            {letter}
          </button>
        )}
      </td>
      <th scope="row">
        <PointName part={part} pointId={pointId} label={label} />
        <HowMeasured part={part} measurement={measurement} />
      </th>
      <td className="measures-value">
        <Length mm={valueMm} uncertaintyMm={uncertaintyMm} bare />
      </td>
      <td className="measures-uncertainty">
        <Uncertainty mm={uncertaintyMm} />
      </td>
    </tr>
  );
}

/**
 * The small print of a row. A half and whole tapes are told, so that the figure can be followed;
 * tapes are counted in the millimetres they are marked in.
 */
function HowMeasured({ part, measurement }: Pick<MeasurementRowProps, 'part' | 'measurement'>) {
  const { pointId, halfMm, tapeLengths, rounds, spreadMm } = measurement;
  const words = [howHeld(pointId, part), levelText(measurement)].filter((text) => text !== null).join('; ');
  return (
    <span className="measures-how">
      {words && `${words}; `}
      {halfMm && (
        <>
          half <Length mm={halfMm} />;{' '}
        </>
      )}
      {tapeLengths && (
        <>
          {tapeLengths.count} × {tapeLengths.tapeMm} mm + {tapeLengths.restMm} mm;{' '}
        </>
      )}
      {roundsText(measurement)}
      {rounds > 1 && Number(spreadMm) === 0 && ', the same'}
      {rounds > 1 && Number(spreadMm) > 0 && (
        <>
          , <Spread mm={spreadMm} /> apart
        </>
      )}
    </span>
  );
}
