import { measuringPoints } from '@ellwand/shared/points/measuring-points';
import { pointIn, type Protocol } from '@ellwand/shared/protocols/protocol';
import {
  type PointRepeatability,
  pointRepeatability,
} from '@ellwand/shared/repeatability/point-repeatability';
import type {
  Repeatability,
  RepeatabilityPoint,
  RepeatabilitySource,
} from '@ellwand/shared/records/repeatability';
import { fromMmString, toMm } from '@ellwand/shared/units/length';
import { Injectable } from '@nestjs/common';
import { grouped } from '../../common/grouped';
import { type Tx, Work } from '../../common/work';
import { ProtocolBook } from '../protocols/protocol-book';
import {
  MOST_SHEETS,
  type RepeatedRow,
  repeatedSheets,
  type RepeatedSheet,
  rowsOf,
} from './repeated-readings';

/** A reading of a point that was to be read again, and what it was a reading of. */
interface Repeated {
  readonly pointId: string;
  readonly label: string;
  /** The same for all readings that are held against one another. */
  readonly thing: string;
  readonly row: RepeatedRow;
}

/**
 * How well the house's readings repeat, point by point. A point counts where it was chosen to be read again before
 * anybody saw its figure: a reading that was asked for because the first looked wrong would make all look worse.
 */
@Injectable()
export class RepeatabilityService {
  constructor(
    private readonly work: Work,
    private readonly protocols: ProtocolBook,
  ) {}

  async read(from: RepeatabilitySource): Promise<Repeatability> {
    const tx = this.work.reader;
    const found = await repeatedSheets(tx, from);
    const sheets = found.slice(0, MOST_SHEETS);
    const rows = grouped(
      await rowsOf(
        tx,
        sheets.map(({ id }) => id),
      ),
      ({ sheetId }) => sheetId,
    );
    const known = new Map<string, Protocol>();
    const repeated: Repeated[] = [];
    // The oldest first: what was read first is what later readings are held against.
    for (const sheet of [...sheets].reverse()) {
      const protocol = await this.protocolOf(tx, sheet, known);
      repeated.push(...chosenOn(sheet, protocol, rows.get(sheet.id) ?? []));
    }
    return { from, points: pointsIn(repeated), more: found.length > sheets.length };
  }

  /** A house of a thousand sheets has a few dozen protocols. */
  private async protocolOf(tx: Tx, sheet: RepeatedSheet, known: Map<string, Protocol>): Promise<Protocol> {
    const key = `${sheet.kind} ${sheet.wornTogether} ${sheet.protocolVersion}`;
    const protocol = known.get(key) ?? (await this.protocols.at(tx, sheet, sheet.protocolVersion));
    known.set(key, protocol);
    return protocol;
  }
}

function chosenOn(sheet: RepeatedSheet, protocol: Protocol, rows: readonly RepeatedRow[]): Repeated[] {
  const asked = protocol.points.filter(({ rounds }) => rounds > 1).map(({ pointId }) => pointId);
  const chosen = new Set([...sheet.repeatPoints, ...asked]);
  // A study piece is the same thing on every study sheet; a garment may have changed from one record to the next.
  const piece = sheet.purpose === 'study' ? sheet.partId : sheet.id;
  return rows
    .filter(({ pointId }) => sheet.purpose === 'study' || chosen.has(pointId))
    .map((row) => ({
      pointId: row.pointId,
      label: pointIn(protocol, row.pointId)?.name ?? row.pointId,
      thing: `${sheet.purpose} ${piece} ${row.worn ?? ''}`,
      row,
    }));
}

const order: ReadonlyMap<string, number> = new Map(measuringPoints.map(({ id }, index) => [id, index]));

/** In the order of the catalogue, the house's own points last. */
function pointsIn(repeated: readonly Repeated[]): RepeatabilityPoint[] {
  const place = (pointId: string): number => order.get(pointId) ?? order.size;
  return [...grouped(repeated, ({ pointId }) => pointId)]
    .sort(([first], [second]) => place(first) - place(second) || first.localeCompare(second))
    .flatMap(([pointId, readings]) => {
      const things = [...grouped(readings, ({ thing }) => thing).values()];
      const figures = pointRepeatability(things.map((each) => each.map(({ row }) => readingOf(row))));
      return figures.n === 0 ? [] : [rounded(pointId, readings[0]?.label ?? pointId, figures)];
    });
}

function readingOf({ valueMm, readBy }: RepeatedRow) {
  return { valueMm: toMm(fromMmString(valueMm)), reader: readBy };
}

/** The most pairs that travel for a plot: the newest of them. */
const MOST_PAIRS = 500;

function rounded(pointId: string, label: string, figures: PointRepeatability): RepeatabilityPoint {
  const { n, k, byAnother, temMm, percentTem, r, meanDifferenceMm, limitsMm, pairs, says } = figures;
  return {
    ...{ pointId, label, n, k, byAnother, says },
    temMm: toThousandths(temMm),
    percentTem: toThousandths(percentTem),
    r: toThousandths(r),
    meanDifferenceMm: toThousandths(meanDifferenceMm),
    limitsMm: limitsMm && {
      lower: Math.round(limitsMm.lower * 1000) / 1000,
      upper: Math.round(limitsMm.upper * 1000) / 1000,
    },
    pairs: pairs.slice(-MOST_PAIRS).map((pair) => ({ ...pair })),
  };
}

function toThousandths(figure: number | null): number | null {
  return figure === null ? null : Math.round(figure * 1000) / 1000;
}
