import { findMeasuringPoint } from '../points/measuring-points.js';
import { allowedSpreadAt, houseTolerance } from '../points/tolerance.js';
import type { NotTakenReason } from '../readings/reading.js';
import { sidesInOrder } from '../readings/values-by-side.js';
import type { WornSide } from '../readings/worn-side.js';
import { absolute, fromMmString, isLonger, type Length, longestOf, subtract } from '../units/length.js';
import type { PartSheets, SheetOfPart, SheetValue } from './part-sheets.js';

/** What one sheet says of a point, or of one side of it. */
export interface SheetCell {
  readonly sheetId: string;
  readonly value: SheetValue | null;
  readonly notTaken: NotTakenReason | null;
  /** How much longer (or, below nothing, shorter) than the sheet before; null within what careful readings differ. */
  readonly change: Length | null;
}

export interface SheetRowOfPoint {
  readonly pointId: string;
  readonly label: string;
  readonly worn: WornSide | null;
  readonly cells: readonly SheetCell[];
}

type Point = PartSheets['points'][number];

/** Sheets beside one another, point by point and side by side, each value held against the one before it. */
export function sheetRows({ points, sheets }: Pick<PartSheets, 'points' | 'sheets'>): SheetRowOfPoint[] {
  return points.flatMap((point) =>
    sidesInOrder
      .filter((worn) => sheets.some((sheet) => says(sheet, point, worn)))
      .map((worn) => ({
        pointId: point.pointId,
        label: point.label,
        worn,
        cells: cellsOf(point, worn, sheets),
      })),
  );
}

function cellsOf(point: Point, worn: WornSide | null, sheets: readonly SheetOfPart[]): SheetCell[] {
  let before: SheetValue | null = null;
  return sheets.map((sheet) => {
    const value = valueOf(sheet, point, worn);
    const cell = {
      sheetId: sheet.id,
      value,
      notTaken: sheet.notTaken.find((left) => isOf(left, point, worn))?.reason ?? null,
      change: value && before ? changeBeyondTolerance(point, before, value) : null,
    };
    before = value ?? before;
    return cell;
  });
}

const isOf = (told: Pick<SheetValue, 'pointId' | 'worn'>, { pointId }: Point, worn: WornSide | null) =>
  told.pointId === pointId && told.worn === worn;

const valueOf = (sheet: SheetOfPart, point: Point, worn: WornSide | null): SheetValue | null =>
  sheet.values.find((value) => isOf(value, point, worn)) ?? null;

const says = (sheet: SheetOfPart, point: Point, worn: WornSide | null): boolean =>
  valueOf(sheet, point, worn) !== null || sheet.notTaken.some((left) => isOf(left, point, worn));

/** Two rounds of one point may lie as far apart as its tolerance says, whoever read them: nothing has changed then. */
function changeBeyondTolerance(point: Point, before: SheetValue, now: SheetValue): Length | null {
  const [was, is] = [fromMmString(before.valueMm), fromMmString(now.valueMm)];
  const joins = Math.max(before.tapeJoins, now.tapeJoins);
  const tolerance = findMeasuringPoint(point.pointId)?.tolerance ?? houseTolerance;
  const how = before.method ?? now.method ?? point.how;
  const allowed = allowedSpreadAt({ tolerance, how }, longestOf(was, is), joins);
  const difference = subtract(is, was);
  return isLonger(absolute(difference), allowed) ? difference : null;
}
