import type { Length } from '@ellwand/shared/units/length';
import { TypedFastBitSet } from 'typedfastbitset';

interface Entry {
  readonly value: Length;
  readonly place: number;
}

/** All values of one measuring point, or of one group, in order of length. A garment may have several. */
export class ValueColumn {
  /** Garments that have any value here. */
  readonly holders = new TypedFastBitSet();
  private entries: Entry[] = [];
  private inOrder = true;

  add(place: number, value: Length): void {
    this.entries.push({ value, place });
    this.holders.add(place);
    this.inOrder = false;
  }

  remove(place: number): void {
    this.entries = this.entries.filter((entry) => entry.place !== place);
    this.holders.remove(place);
  }

  /** Garments with a value between the two, both included; null leaves an end open. */
  between(least: Length | null, most: Length | null): TypedFastBitSet {
    const found = new TypedFastBitSet();
    const entries = this.sorted();
    for (let at = least === null ? 0 : firstNotBelow(entries, least); at < entries.length; at++) {
      const entry = entries[at];
      if (!entry || (most !== null && entry.value > most)) break;
      found.add(entry.place);
    }
    return found;
  }

  /** The values of some garments, shortest first. */
  of(garments: TypedFastBitSet): readonly Entry[] {
    return this.sorted().filter((entry) => garments.has(entry.place));
  }

  private sorted(): readonly Entry[] {
    if (!this.inOrder) this.entries.sort((a, b) => a.value - b.value);
    this.inOrder = true;
    return this.entries;
  }
}

function firstNotBelow(entries: readonly Entry[], least: Length): number {
  let low = 0;
  let high = entries.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    const entry = entries[middle];
    if (entry && entry.value < least) low = middle + 1;
    else high = middle;
  }
  return low;
}
