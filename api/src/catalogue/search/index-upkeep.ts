import { Injectable, Logger } from '@nestjs/common';
import { CatalogueIndex } from './catalogue-index';
import { PublishedReader } from './published-reader';

/** A search is answered from what was known so long ago at most. */
const freshMs = 250;
/** How often is asked when nobody searches. */
const askEveryMs = 500;
/** Garments read at once when the index is made: some megabytes of rows. */
const batch = 2_000;
/**
 * Transactions take their places in the sequence when they begin to write and commit in any order, so a smaller
 * number may appear after a larger one. So many are asked for again each time; a Galera cluster counts in threes.
 */
const lookBack = 300;

/** Keeps the search's index as new as the published tables, whichever process published or withdrew. */
@Injectable()
export class IndexUpkeep {
  private readonly log = new Logger('search-index');
  private index = new CatalogueIndex();
  private last = 0;
  private seen: ReadonlySet<number> = new Set();
  private askedAt = -Infinity;
  private asking: Promise<void> | null = null;
  private timer: NodeJS.Timeout | undefined;

  constructor(private readonly published: PublishedReader) {}

  async onModuleInit(): Promise<void> {
    await this.rebuild();
    this.timer = setInterval(
      () => void this.ask().catch((fault: unknown) => this.log.warn(String(fault))),
      askEveryMs,
    );
    this.timer.unref();
  }

  async beforeApplicationShutdown(): Promise<void> {
    clearInterval(this.timer);
    await this.asking?.catch(() => undefined);
  }

  /** The index, not older than a quarter of a second. */
  async current(): Promise<CatalogueIndex> {
    if (performance.now() - this.askedAt > freshMs) await this.ask();
    return this.index;
  }

  /** Whoever asks while somebody is asking already waits for the same answer. */
  private async ask(): Promise<void> {
    this.asking ??= this.takeIn().finally(() => (this.asking = null));
    await this.asking;
  }

  private async takeIn(): Promise<void> {
    const begun = performance.now();
    const changes = await this.published.changesAfter(Math.max(0, this.last - lookBack));
    const newest = changes.at(-1)?.sequence ?? 0;
    // The sequence only ever grows. Where a known change is gone, the database was put back to an earlier day.
    const told = new Set(changes.map(({ sequence }) => sequence));
    if ([...this.seen].some((sequence) => !told.has(sequence))) return await this.rebuild();
    const unseen = changes.filter(({ sequence }) => !this.seen.has(sequence));
    if (unseen.length > 0) {
      const numbers = [...new Set(unseen.map(({ number }) => number))];
      const garments = await this.published.read(numbers);
      for (const number of numbers) this.index.remove(number);
      for (const garment of garments) this.index.put(garment);
    }
    const kept = [...told].filter((sequence) => sequence > newest - lookBack);
    this.note(newest, kept, begun);
  }

  private async rebuild(): Promise<void> {
    const begun = performance.now();
    // First the sequence, then the garments: what is published in between is taken in by the next asking.
    const last = await this.published.lastSequence();
    const seen = await this.published.changesAfter(Math.max(0, last - lookBack));
    const numbers = await this.published.numbers();
    const index = new CatalogueIndex();
    for (let from = 0; from < numbers.length; from += batch) {
      for (const garment of await this.published.read(numbers.slice(from, from + batch))) index.put(garment);
    }
    this.index = index;
    this.note(
      last,
      seen.filter(({ sequence }) => sequence <= last).map(({ sequence }) => sequence),
      begun,
    );
  }

  private note(last: number, seen: readonly number[], askedAt: number): void {
    this.last = last;
    this.seen = new Set(seen);
    this.askedAt = askedAt;
  }
}
