import { Fragment, type ReactNode } from 'react';
import type { PublishedMeasurement, PublishedPart } from '@ellwand/shared/records/published-garment';
import type { LitPoints } from '../../components/diagram/lit-points';
import { Length, Spread, Uncertainty, UnitName } from '../../components/units/length';
import { howHeld, levelText, roundsText, sidedKey, sidedLabel } from './measuring-words';
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
        {measurements.map((measurement, index) => {
          const { pointId } = measurement;
          // Of a point read on both sides the first row is the one that its line leads to.
          const leads = measurements.findIndex((other) => other.pointId === pointId) === index;
          return (
            <MeasurementRow
              key={sidedKey(measurement)}
              part={part}
              measurement={measurement}
              letter={letters.get(pointId)}
              lit={lit}
              id={rowId(leads ? pointId : sidedKey(measurement))}
            />
          );
        })}
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
  const { pointId, valueMm, uncertaintyMm } = measurement;
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
            aria-label={`${letter}: show ${sidedLabel(measurement).toLowerCase()} on the diagram`}
            onClick={() => lit.chooseRow(pointId)}
          >
            {letter}
          </button>
        )}
      </td>
      <th scope="row">
        <PointName part={part} point={measurement} />
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
 * The small print of a row. A half, a gap and whole tapes are told, so that the figure can be followed;
 * tapes are counted in the millimetres they are marked in.
 */
function HowMeasured({ part, measurement }: Pick<MeasurementRowProps, 'part' | 'measurement'>) {
  const { halfMm, tapeLengths, gapMm, depthMm } = measurement;
  const told: readonly (ReactNode | null)[] = [
    howHeld(measurement, part),
    levelText(measurement),
    depthMm && (
      <>
        <Length mm={depthMm} /> below the waist
      </>
    ),
    halfMm && (
      <>
        half <Length mm={halfMm} />
      </>
    ),
    tapeLengths && `${tapeLengths.count} × ${tapeLengths.tapeMm} mm + ${tapeLengths.restMm} mm`,
    gapMm && (
      <>
        the tape crossed a gap of <Length mm={gapMm} />, taken off
      </>
    ),
    <Rounds key="rounds" measurement={measurement} />,
  ];
  return (
    <span className="measures-how">
      {told.filter(Boolean).map((words, index) => (
        <Fragment key={index}>
          {index > 0 && '; '}
          {words}
        </Fragment>
      ))}
    </span>
  );
}

function Rounds({ measurement }: Pick<MeasurementRowProps, 'measurement'>) {
  const { rounds, spreadMm } = measurement;
  return (
    <>
      {roundsText(measurement)}
      {rounds > 1 && Number(spreadMm) === 0 && ', the same'}
      {rounds > 1 && Number(spreadMm) > 0 && (
        <>
          , <Spread mm={spreadMm} /> apart
        </>
      )}
    </>
  );
}
