/** What the panels of a cut sheet say beside the rounds that were read on the part's measuring sheet. */
import type { PointId } from '../points/measuring-points.js';
import { allowedSpread, houseTolerance } from '../points/tolerance.js';
import { decimalText } from '../units/format-length.js';
import { absolute, add, isLonger, subtract, UNITS_PER_MM, mm, type Length } from '../units/length.js';
import { allowedByPanels, panelSum, type PanelledSheet, type PanelSum } from './panel-sum.js';
import { levelNames, panelLevels, type PanelLevel } from './words.js';

/** The round that answers for each level: the first of these that was read. */
export const levelPoints: Readonly<Record<PanelLevel, readonly PointId[]>> = {
  bust: ['bust', 'coat-chest', 'waistcoat-chest', 'child-chest'],
  waist: ['waist', 'waistband', 'coat-waist', 'trouser-waistband', 'child-waist', 'corset-waist-closed'],
  hip: ['hip', 'seat'],
  hem: ['hem', 'coat-skirt-sweep', 'cape-sweep'],
};

/** A round of the measuring sheet. */
export interface LevelRead {
  readonly level: PanelLevel;
  /** The measuring point's name. */
  readonly label: string;
  readonly value: Length;
}

export interface PanelNote {
  readonly level: PanelLevel;
  /** `apart`: more than is allowed; `agrees`: within it; `open`: there is nothing to hold the sum against yet. */
  readonly says: 'agrees' | 'apart' | 'open';
  readonly sentence: string;
}

/** A house setting without a published source: each panel may be a millimetre out, all of them the same way. */
const EACH_PANEL = mm(1);

/** The most that a sum of panels and a round may lie apart: a millimetre a panel, and the tolerance of the round. */
export function allowedApart({ panels }: PanelSum, read: Length): Length {
  return add(allowedByPanels(panels, EACH_PANEL), allowedSpread(houseTolerance, read));
}

/** A note for every level at which a panel was read, from the top down. */
export function panelNotes(sheet: PanelledSheet, rounds: readonly LevelRead[]): readonly PanelNote[] {
  return panelLevels.flatMap((level) => {
    const sum = panelSum(sheet, level);
    return sum
      ? [
          noteOf(
            sum,
            rounds.find((round) => round.level === level),
          ),
        ]
      : [];
  });
}

function noteOf(sum: PanelSum, read: LevelRead | undefined): PanelNote {
  const { level, panels, missing } = sum;
  const counted = `${panels} ${panels === 1 ? 'panel' : 'panels'}, ${inMm(sum.sum)}`;
  const where = `at the ${levelNames[level].toLowerCase()}`;
  if (missing.length > 0) {
    const words = `${counted} so far ${where}. Not read there: ${missing.join(', ')}.`;
    return { level, says: 'open', sentence: words };
  }
  if (!read) return { level, says: 'open', sentence: `${counted} ${where}. No round was read to compare.` };
  const allowed = allowedApart(sum, read.value);
  const apart = subtract(sum.sum, read.value);
  const figures = `${counted}, against ${inMm(read.value)}`;
  if (!isLonger(absolute(apart), allowed)) {
    const words = `The panels’ sum ${where} agrees with the ${read.label.toLowerCase()} that was read: ${figures}.`;
    return { level, says: 'agrees', sentence: words };
  }
  const by = `${inMm(absolute(apart))} ${apart > 0 ? 'more' : 'less'} than`;
  const words = `The panels’ sum ${where} is ${by} the ${read.label.toLowerCase()} that was read: ${figures}; ${inMm(allowed)} is allowed.`;
  return { level, says: 'apart', sentence: words };
}

/** Whole millimetres, with a tenth where there is more to it. */
function inMm(length: Length): string {
  return `${decimalText(length, 'mm', length % UNITS_PER_MM === 0 ? 0 : 1)} mm`;
}
