import { findMeasuringPoint } from '../points/measuring-points.js';
import { acceptedValue } from '../readings/accepted-value.js';
import type { Reading } from '../readings/reading.js';
import { levelPoints, type LevelRead } from './panel-notes.js';
import { panelLevels } from './words.js';

/** The rounds of a measuring sheet that a cut sheet's panels are held against: at most one a level, from the top down. */
export function roundsRead(readings: readonly Reading[]): readonly LevelRead[] {
  return panelLevels.flatMap((level) => {
    for (const pointId of levelPoints[level]) {
      const accepted = acceptedValue(readings, pointId);
      const label = findMeasuringPoint(pointId)?.name ?? pointId;
      if (accepted) return [{ level, label, value: accepted.value }];
    }
    return [];
  });
}
