import { type PanelledSheet, panelSum, panelWidths } from '../cut-sheet/panel-sum.js';
import { levelNames, type PanelLevel, panelLevels } from '../cut-sheet/words.js';
import { kindIds } from '../points/kinds.js';
import { readMm } from '../units/format-length.js';
import type { Derivation, DerivedValue } from './derivation.js';

const FORMULA = 'panel + panel + …';

/**
 * The round that the panels of the cut sheet make at a level. Their uncertainties are added one after the other: read
 * by one hand they may all be out the same way. A level at which a panel was left out says nothing.
 */
export const sumOfPanels: Derivation = {
  id: 'sum-of-panels',
  label: 'Sum of panels',
  formula: FORMULA,
  kinds: kindIds,
  needs: 'A cut sheet with the width of every panel at that level',
  workOut: ({ cutSheet }) => (cutSheet ? panelLevels.flatMap((level) => sumAt(cutSheet, level) ?? []) : []),
};

function sumAt(sheet: PanelledSheet, level: PanelLevel): DerivedValue | undefined {
  const sum = panelSum(sheet, level);
  if (!sum || sum.panels < 2 || sum.missing.length > 0) return undefined;
  const widths = panelWidths(sheet, level);
  return {
    id: `sum-of-panels:${level}`,
    label: `Sum of ${sum.panels} panels, ${levelNames[level].toLowerCase()}`,
    formula: FORMULA,
    figure: { type: 'length', length: sum.sum, uncertaintyMm: sum.uncertaintyMm },
    trace: widths.map(({ name, width, uncertaintyMm }) => ({
      pointId: 'panel',
      label: name,
      value: width,
      uncertaintyMm,
      elsewhere: true,
    })),
    worked: `${widths.map(({ width }) => readMm(width)).join(' + ')} = ${readMm(sum.sum)}`,
  };
}
