import { type GarmentKind, lowerKind } from '../points/kinds.js';
import { measuringPoint, type PointId } from '../points/measuring-points.js';
import { readMm } from '../units/format-length.js';
import { compareLengths } from '../units/length.js';
import { type Derivation, type TraceEntry, traceEntry } from './derivation.js';
import type { OtherPartFigures } from './part-figures.js';

const worn: readonly GarmentKind[] = ['bodice', 'jacket', 'dress', 'skirt'];
const girths: readonly PointId[] = ['waist', 'inner-waist-band', 'waistband'];

/**
 * Which girth a figure must pass: the smallest of all that close round the waist, over the parts that are shown on one
 * figure. It says which one that is. Whether a figure may go in is judged by people, with room to spare.
 */
export const smallestGirth: Derivation = {
  id: 'smallest-girth',
  label: 'Smallest girth, which governs mounting',
  formula: 'the smallest of waist, inner waist band and waistband, over all parts',
  kinds: worn,
  needs: 'Two or more of waist, inner waist band and waistband, in this part or the others of the garment',
  workOut: (part) => {
    const own = girthsOf(part);
    const others = part.otherParts
      .filter(({ kind }) => worn.includes(kind))
      .flatMap((other) => girthsOf(other, other.name?.toLowerCase() ?? lowerKind(other.kind)));
    const trace = [...own, ...others];
    const [smallest] = [...trace].sort((first, second) => compareLengths(first.value, second.value));
    if (!smallest || trace.length < 2) return [];
    const { id, label, formula } = smallestGirth;
    const { value: length, uncertaintyMm } = smallest;
    const worked = `smallest of ${trace.map(({ value }) => readMm(value)).join(', ')} = ${readMm(length)}: ${smallest.label}`;
    return [{ id, label, formula, figure: { type: 'length', length, uncertaintyMm }, trace, worked }];
  },
};

function girthsOf({ values }: Pick<OtherPartFigures, 'values'>, partName?: string): readonly TraceEntry[] {
  return girths.flatMap((pointId) => {
    const accepted = values.get(pointId);
    const { name } = measuringPoint(pointId);
    if (!accepted) return [];
    return [
      partName
        ? { ...traceEntry(accepted, `${name}, ${partName}`), elsewhere: true }
        : traceEntry(accepted, name),
    ];
  });
}
