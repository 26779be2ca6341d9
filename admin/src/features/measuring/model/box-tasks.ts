import type { FindingView } from '@ellwand/shared/records/sheet';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import { formatLength } from '@ellwand/shared/units/format-length';
import type { OutboxEntry } from './outbox.js';
import { type SheetRow, spreadOf } from './rows.js';

export interface BoxTask {
  readonly sentence: string;
  /** A sheet is not complete without it. */
  readonly must: boolean;
  readonly pointId?: string;
  readonly finding?: boolean;
  readonly describe?: boolean;
}

export interface BoxAsked {
  readonly rows: readonly SheetRow[];
  readonly entries: readonly OutboxEntry[];
  readonly findings: readonly FindingView[];
  /** Views of the garment's pictures; null while they are not known. */
  readonly views: readonly string[] | null;
  /** What was described at the table so far. */
  readonly described: readonly string[];
}

/** Everything that must, and all that should, be done before the garment goes back. */
export function boxTasks({ rows, entries, findings, views, described }: BoxAsked): readonly BoxTask[] {
  const toTake = rows
    .filter(({ reading }) => reading === null)
    .map((row): BoxTask => ({
      sentence:
        row.round === 1 ? `${nameOf(row)}: take it, or say why not` : `${nameOf(row)}: read it again, blind`,
      must: row.point.required || row.round > 1,
      pointId: row.point.id,
    }));
  const toDecide = entries
    .filter(({ state }) => state === 'decision')
    .map(({ reading }): BoxTask => ({
      sentence: `${nameIn(rows, reading.pointId)}: decide which reading stands`,
      must: true,
      pointId: reading.pointId,
    }));
  const firstRounds = rows.filter(({ round }) => round === 1);
  const toReread = firstRounds.flatMap((row): BoxTask[] => {
    const { point } = row;
    const spread = spreadOf(rows, row);
    if (!spread || spread.within) return [];
    return [
      {
        sentence: `${nameOf(row)}: ${formatLength(spread.apart, 'mm')} apart, read it once more`,
        must: false,
        pointId: point.id,
      },
    ];
  });
  const noLevel = firstRounds
    .filter(
      ({ point, reading }) =>
        point.point.levelRecorded && reading !== null && reading.value !== null && reading.level === null,
    )
    .map(({ point }): BoxTask => ({
      sentence: `${point.point.name}: say how the level was found`,
      must: false,
      pointId: point.id,
    }));
  const toAnswer = findings
    .filter(({ severity, answer }) => severity !== 'note' && answer === null)
    // That a point is missing is on the list already.
    .filter(
      ({ pointIds }) =>
        pointIds.length === 0 ||
        pointIds.some((id) => firstRounds.some(({ point, reading }) => point.id === id && reading !== null)),
    )
    .map(({ sentence, severity }): BoxTask => ({ sentence, must: severity === 'stop', finding: true }));
  return [
    ...toDecide,
    ...toTake,
    ...toAnswer,
    ...toReread,
    ...noLevel,
    ...toPhotograph(views),
    ...toDescribe(described),
  ];
}

const nameOf = ({ point, worn }: SheetRow): string =>
  worn ? `${point.point.name}, ${wornSideLabels[worn]}` : point.point.name;

function toDescribe(described: readonly string[]): BoxTask[] {
  const wanted: readonly (readonly [string, string])[] = [
    ['label', 'Say what the label says, or that there is none'],
    ['fastenings', 'Say how it fastens'],
    ['condition', 'Say what condition it is in'],
  ];
  return wanted
    .filter(([thing]) => !described.includes(thing))
    .map(([, sentence]) => ({ sentence, must: false, describe: true }));
}

function toPhotograph(views: readonly string[] | null): BoxTask[] {
  if (views === null) return [];
  const wanted: readonly (readonly [string, string])[] = [
    ['front', 'Photograph the front'],
    ['back', 'Photograph the back'],
    ['tape', 'Photograph the tape where it lay'],
  ];
  return wanted.filter(([view]) => !views.includes(view)).map(([, sentence]) => ({ sentence, must: false }));
}

const nameIn = (rows: readonly SheetRow[], pointId: string): string =>
  rows.find(({ point }) => point.id === pointId)?.point.point.name ?? pointId;
