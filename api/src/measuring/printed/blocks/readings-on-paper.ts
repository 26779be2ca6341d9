import type { MeasuringPoint } from '@ellwand/shared/points/point';
import { lettersFor, pointIn } from '@ellwand/shared/protocols/protocol';
import { levelLabels, notTakenReasons } from '@ellwand/shared/readings/reading';
import { type SideValue, valuesBySide } from '@ellwand/shared/readings/values-by-side';
import { shownUncertainty } from '@ellwand/shared/readings/uncertainty';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import { toReading } from '@ellwand/shared/records/measured';
import { toProtocol } from '@ellwand/shared/records/protocol';
import type { Sheet, StoredReading } from '@ellwand/shared/records/sheet';
import { formatBoth } from '@ellwand/shared/units/format-length';
import { toMmString } from '@ellwand/shared/units/length';

/** "612 mm (24 1/8 in)", and how far it can be trusted: "± 2.1 mm, mean of 2". */
export interface ValueOnPaper {
  readonly value: string;
  readonly trust: string;
}

/** What a filled sheet says of one point. */
export interface PointOnPaper {
  readonly letter: string;
  readonly point: MeasuringPoint;
  readonly required: boolean;
  /** Each reading as it was keyed, corrected ones among them, in the order in which they were keyed. */
  readonly keyed: readonly string[];
  /** The value, or that of each side; empty where there is none. */
  readonly values: readonly ValueOnPaper[];
  /** How the level was found, and what was remarked. */
  readonly remarks: readonly string[];
}

/** Every point of the sheet's protocol in handling order, with all that was read at it. */
export function pointsOnPaper(sheet: Sheet): readonly PointOnPaper[] {
  const protocol = toProtocol(sheet.protocol);
  const letters = lettersFor(protocol);
  const readings = sheet.readings.map(toReading);
  const names = new Map(sheet.facts.people.map(({ userId, name }) => [userId, name]));
  const severalRead = new Set(sheet.readings.map(({ readBy }) => readBy)).size > 1;
  return protocol.points.flatMap(({ pointId, required }) => {
    const point = pointIn(protocol, pointId);
    if (!point) return [];
    const own = sheet.readings.filter((reading) => reading.pointId === pointId);
    return [
      {
        letter: letters.get(pointId) ?? '',
        point,
        required,
        keyed: own.map((reading) =>
          keyedText(reading, point, severalRead ? names.get(reading.readBy) : undefined),
        ),
        values: valuesBySide(readings, pointId, protocol.ownPoints).map(valueOnPaper),
        remarks: remarksOf(own.filter(({ stands }) => stands)),
      },
    ];
  });
}

/** A reading as it was keyed: "2nd: 3 × 1500 mm + 742 mm", "612 mm (corrected)", "not taken: a fastening is stuck". */
export function keyedText(
  reading: StoredReading,
  { how }: Pick<MeasuringPoint, 'how'>,
  readBy?: string,
): string {
  const side = reading.worn ? `${wornSideLabels[reading.worn]}: ` : '';
  const round = reading.round > 1 ? `reading ${reading.round}: ` : '';
  const by = readBy === undefined ? '' : `, ${readBy}`;
  const corrected = reading.stands ? '' : ' (corrected since)';
  return `${side}${round}${figureOf(reading, how)}${by}${corrected}`;
}

function figureOf(reading: StoredReading, how: MeasuringPoint['how']): string {
  if (reading.state === 'not-taken') {
    return reading.reason ? `not taken: ${notTakenReasons[reading.reason].toLowerCase()}` : 'not taken';
  }
  const { typed, unit, tapeCount, tapeLengthMm, gapTyped, depthTyped } = reading;
  const tapes = tapeCount > 0 ? `${tapeCount} × ${tapeLengthMm} mm + ` : '';
  const half = (reading.method ?? how) === 'flat-doubled' ? ', the half' : '';
  const gap = gapTyped ? `, less a gap of ${gapTyped} ${unit}` : '';
  const depth = depthTyped ? `, ${depthTyped} ${unit} below the waist` : '';
  return `${tapes}${typed} ${unit}${half}${gap}${depth}`;
}

function valueOnPaper({ worn, accepted }: SideValue): ValueOnPaper {
  const side = worn ? `${wornSideLabels[worn]}: ` : '';
  const mean = accepted.n > 1 ? `, mean of ${accepted.n}` : '';
  return {
    value: `${side}${formatBoth(accepted.value)}`,
    trust: `± ${toMmString(shownUncertainty(accepted.uncertaintyMm))} mm${mean}`,
  };
}

function remarksOf(standing: readonly StoredReading[]): readonly string[] {
  const said = standing.flatMap(({ levelFoundBy, note }) => [
    levelFoundBy ? levelLabels[levelFoundBy] : '',
    note.trim(),
  ]);
  return [...new Set(said)].filter((text) => text !== '');
}
