import { isPointGroup, type PointGroup } from '@ellwand/shared/points/groups';
import type { MeasureFilter } from '@ellwand/shared/records/measure-filter';
import type { CatalogueCard } from '@ellwand/shared/records/published-garment';
import { toMmString } from '@ellwand/shared/units/length';
import { bound } from './filters';
import type { IndexedGarment, IndexedMeasurement } from './indexed-garment';

const wanted = 3;

/** Which measures tell most about a garment, whatever its kind: girths, then lengths, then what only some have. */
const telling: readonly PointGroup[] = [
  'bust',
  'waist',
  'hem',
  'hip',
  'back-length',
  'skirt-length',
  'leg',
  'sleeve',
  'head',
  'crown',
  'brim',
  'sole',
  'tread',
  'heel',
  'palm',
  'glove-length',
  'busk',
  'crinoline-base',
  'bustle',
  'front-length',
  'neck',
];

/** The three measurements on a garment's card: those searched by first, then one for each telling group. */
export function tellingMeasurements(
  garment: IndexedGarment,
  searched: readonly MeasureFilter[],
): CatalogueCard['measurements'] {
  const chosen = new Set<IndexedMeasurement>();
  for (const filter of searched) {
    const answering = garment.measurements.find((each) => answers(each, filter));
    if (answering) chosen.add(answering);
  }
  const shown = new Set([...chosen].map((each) => each.group));
  for (const group of telling) {
    const found = shown.has(group) ? undefined : garment.measurements.find((each) => each.group === group);
    if (found) chosen.add(found);
  }
  return [...chosen].slice(0, wanted).map(({ pointId, label, partName, value }) => ({
    pointId,
    label,
    partName,
    valueMm: toMmString(value),
  }));
}

function answers(measurement: IndexedMeasurement, { point, minMm, maxMm }: MeasureFilter): boolean {
  const meant = isPointGroup(point) ? measurement.group === point : measurement.pointId === point;
  return meant && measurement.value >= (bound(minMm) ?? 0) && measurement.value <= (bound(maxMm) ?? Infinity);
}
