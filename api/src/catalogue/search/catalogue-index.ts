import { groupLabels, isPointGroup, type PointGroup } from '@ellwand/shared/points/groups';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { TypedFastBitSet } from 'typedfastbitset';
import type { IndexedGarment, IndexedMeasurement } from './indexed-garment';
import { ValueColumn } from './value-column';
import { WordIndex } from './word-index';

export interface FacetValue {
  readonly label: string;
  readonly holders: TypedFastBitSet;
}

type Order = Exclude<SearchQuery['sort'], 'relevance'>;

const byTitle = new Intl.Collator('en', { numeric: true });

/** Days as ISO text sort as days. */
const compareText = (a: string, b: string) => (a === b ? 0 : a < b ? -1 : 1);

const comparisons: Readonly<Record<Order, (a: IndexedGarment, b: IndexedGarment) => number>> = {
  date: (a, b) => a.fromYear - b.fromYear || a.toYear - b.toYear,
  'date-desc': (a, b) => b.toYear - a.toYear || b.fromYear - a.fromYear,
  title: (a, b) => byTitle.compare(a.title, b.title),
  newest: (a, b) => compareText(b.measuredOn, a.measuredOn) || b.publishedAt - a.publishedAt,
};

/**
 * All published garments in memory, each at a place (a small whole number), so that sets of garments are sets of
 * bits. Everything here follows from the published tables and can be made anew from them.
 */
export class CatalogueIndex {
  /** The places that are taken. */
  readonly all = new TypedFastBitSet();
  readonly titles = new WordIndex();
  readonly texts = new WordIndex();
  private readonly garments: (IndexedGarment | undefined)[] = [];
  private readonly placeOf = new Map<string, number>();
  private readonly free: number[] = [];
  private readonly facets = new Map<string, Map<string, FacetValue>>();
  private readonly points = new Map<string, ValueColumn>();
  private readonly groups = new Map<PointGroup, ValueColumn>();
  private readonly labels = new Map<string, string>();
  private orders = new Map<Order, readonly number[]>();

  /** Puts a garment in, in the place of what was there under its number. */
  put(garment: IndexedGarment): void {
    this.remove(garment.number);
    const place = this.free.pop() ?? this.garments.length;
    this.garments[place] = garment;
    this.placeOf.set(garment.number, place);
    this.all.add(place);
    this.titles.add(place, garment.title);
    this.texts.add(place, searchable(garment));
    for (const { facet, value, label } of garment.facets)
      this.facetValue(facet, value, label).holders.add(place);
    for (const measured of garment.measurements) {
      for (const column of this.columnsOf(measured)) column.add(place, measured.value);
      this.labels.set(measured.pointId, measured.label);
    }
  }

  remove(number: string): void {
    // A cached order is only good for the garments it was made of.
    this.orders = new Map();
    const place = this.placeOf.get(number);
    const garment = place === undefined ? undefined : this.garments[place];
    if (place === undefined || !garment) return;
    this.garments[place] = undefined;
    this.placeOf.delete(number);
    this.free.push(place);
    this.all.remove(place);
    this.titles.remove(place, garment.title);
    this.texts.remove(place, searchable(garment));
    for (const { facet, value, label } of garment.facets)
      this.facetValue(facet, value, label).holders.remove(place);
    const columns = new Set(garment.measurements.flatMap((measured) => this.columnsOf(measured)));
    for (const column of columns) column.remove(place);
  }

  /** How many places there are, taken and free: one more than the highest. */
  get places(): number {
    return this.garments.length;
  }

  garment(place: number): IndexedGarment {
    const garment = this.garments[place];
    if (!garment) throw new RangeError(`No garment at place ${place}`);
    return garment;
  }

  /** Value → label and holders of one facet. */
  values(facet: string): ReadonlyMap<string, FacetValue> {
    return this.facets.get(facet) ?? new Map<string, FacetValue>();
  }

  /** The values meant by an id: where it names both a group and a point, the group's. */
  column(id: string): ValueColumn | undefined {
    return isPointGroup(id) ? this.groups.get(id) : this.points.get(id);
  }

  /** What a point or group is called; an id that names neither stands for itself. */
  label(id: string): string {
    return isPointGroup(id) ? groupLabels[id] : (findMeasuringPoint(id)?.name ?? this.labels.get(id) ?? id);
  }

  /** Every place, in an order; equal ones by number, so that pages never overlap. */
  inOrder(order: Order): readonly number[] {
    const known = this.orders.get(order);
    if (known) return known;
    const compare = comparisons[order];
    const places = this.all
      .array()
      .map((place) => ({ place, garment: this.garment(place) }))
      .sort((a, b) => compare(a.garment, b.garment) || (a.garment.number < b.garment.number ? -1 : 1))
      .map(({ place }) => place);
    this.orders.set(order, places);
    return places;
  }

  private facetValue(facet: string, value: string, label: string): FacetValue {
    const values = this.facets.get(facet) ?? new Map<string, FacetValue>();
    this.facets.set(facet, values);
    const known = values.get(value) ?? { label, holders: new TypedFastBitSet() };
    values.set(value, known);
    return known;
  }

  private columnsOf({ pointId, group }: IndexedMeasurement): ValueColumn[] {
    return [columnIn(this.points, pointId), ...(group ? [columnIn(this.groups, group)] : [])];
  }
}

const searchable = ({ text, title, number }: IndexedGarment) => `${title}\n${number}\n${text}`;

function columnIn<K>(columns: Map<K, ValueColumn>, key: K): ValueColumn {
  const column = columns.get(key) ?? new ValueColumn();
  columns.set(key, column);
  return column;
}
