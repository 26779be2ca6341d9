import type { TypedFastBitSet } from 'typedfastbitset';
import type { Filter } from './filters';

/**
 * What several filters let through together, and what all but one of them do. Each is worked out once, from
 * what the filters before and after it let through, however many there are.
 */
export class Narrowed {
  /** Garments that pass every filter. */
  readonly found: TypedFastBitSet;
  private readonly allBut: ReadonlyMap<string, TypedFastBitSet>;

  constructor(all: TypedFastBitSet, filters: readonly Filter[]) {
    const before = [all];
    for (const { passing } of filters) before.push((before.at(-1) ?? all).new_intersection(passing));
    this.found = before.at(-1) ?? all;
    const allBut = new Map<string, TypedFastBitSet>();
    let after = all;
    for (const [at, filter] of [...filters.entries()].reverse()) {
      allBut.set(filter.key, (before[at] ?? all).new_intersection(after));
      after = after.new_intersection(filter.passing);
    }
    this.allBut = allBut;
  }

  /** Garments that pass every filter but this one; a filter that is not set leaves what was found. */
  without(key: string): TypedFastBitSet {
    return this.allBut.get(key) ?? this.found;
  }
}
