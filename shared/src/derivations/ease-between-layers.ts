import { type GarmentKind, lowerKind } from '../points/kinds.js';
import { measuringPoint, type PointId } from '../points/measuring-points.js';
import type { AcceptedValue } from '../readings/accepted-value.js';
import { readMm } from '../units/format-length.js';
import { type Derivation, type DerivedValue, difference, type TraceEntry, traceEntry } from './derivation.js';

const tops: readonly GarmentKind[] = ['bodice', 'jacket'];
const FORMULA = 'waist of the top − waistband of the skirt';

interface Layer {
  readonly waist: AcceptedValue | undefined;
  readonly name: string;
  readonly elsewhere?: boolean;
}

/**
 * What a top has at the waist over the band of its skirt. Less than nothing means that the top was worn under the band.
 * The two were read apart, so each brings its own uncertainty.
 */
export const easeBetweenLayers: Derivation = {
  id: 'ease-between-layers',
  label: 'Ease between layers',
  formula: FORMULA,
  kinds: [...tops, 'skirt'],
  needs:
    'The waist of a bodice or jacket, and the waistband of a skirt that is another part of the same garment',
  workOut: (part) => {
    const own = layerOf(part);
    const others = part.otherParts.filter(({ kind }) =>
      part.kind === 'skirt' ? tops.includes(kind) : kind === 'skirt',
    );
    return others.flatMap((other, index) => {
      const theirs = { ...layerOf(other), elsewhere: true };
      const [top, skirt] = part.kind === 'skirt' ? [theirs, own] : [own, theirs];
      return easeOf(top, skirt, index) ?? [];
    });
  },
};

function layerOf(part: {
  readonly kind: GarmentKind;
  readonly name?: string;
  readonly values: ReadonlyMap<string, AcceptedValue>;
}): Layer {
  const waist = part.values.get(part.kind === 'skirt' ? 'waistband' : 'waist');
  return { waist, name: part.name?.toLowerCase() ?? lowerKind(part.kind) };
}

function easeOf(top: Layer, skirt: Layer, index: number): DerivedValue | undefined {
  if (!top.waist || !skirt.waist) return undefined;
  const over = layerEntry(top, top.waist, 'waist');
  const band = layerEntry(skirt, skirt.waist, 'waistband');
  const figure = difference(over, band);
  return {
    id: index === 0 ? 'ease-between-layers' : `ease-between-layers:${index + 1}`,
    label: `Ease, ${top.name} over ${skirt.name}`,
    formula: FORMULA,
    figure,
    trace: [over, band],
    worked: `${readMm(over.value)} − ${readMm(band.value)} = ${readMm(figure.length)}`,
  };
}

function layerEntry({ name, elsewhere }: Layer, waist: AcceptedValue, pointId: PointId): TraceEntry {
  const entry = traceEntry(waist, `${measuringPoint(pointId).name}, ${name}`);
  return elsewhere ? { ...entry, elsewhere } : entry;
}
