import type { NewReading, StoredReading } from '@ellwand/shared/records/sheet';
import { isProblem } from '../../../lib/problem-error.js';
import type { ReadingResult } from '../api/send-readings.js';
import type { Shelf } from './shelf.js';

/** A committed reading that the API has not kept yet. It leaves only when it is kept or when a person decides. */
export interface OutboxEntry {
  readonly reading: NewReading;
  readonly state: 'waiting' | 'decision';
  /** Why a person must decide, in a sentence. */
  readonly why?: string;
  /** The reading that stands at this point and round instead. */
  readonly standing?: StoredReading;
}

export interface OutboxView {
  readonly entries: readonly OutboxEntry[];
  /** How many are under way just now. */
  readonly sending: number;
  /** When the last one was kept by the API; null before any. */
  readonly sentAt: number | null;
}

export interface OutboxWays {
  readonly shelf: Shelf<readonly OutboxEntry[]>;
  readonly deliver: (
    readings: readonly NewReading[],
  ) => Promise<{ sheetVersion: number; results: readonly ReadingResult[] }>;
  /** Told before the kept readings leave the outbox, so that they are never nowhere. */
  readonly onKept: (results: readonly ReadingResult[], sheetVersion: number) => void;
  /** Runs the work while no other tab sends from this outbox. */
  readonly alone: (work: () => Promise<void>) => Promise<void>;
}

const LARGEST_BATCH = 100;

/**
 * Readings on their way to the API, append-only and in order. A reading is on the shelf before this says that it is
 * kept; its id makes a repeated delivery harmless, so whenever it is unclear what arrived, it is sent again.
 */
export class Outbox {
  private view: OutboxView;
  private readonly listeners = new Set<() => void>();
  private running: Promise<void> | null = null;
  private askedAgain = false;

  constructor(private readonly ways: OutboxWays) {
    this.view = { entries: ways.shelf.read() ?? [], sending: 0, sentAt: null };
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly snapshot = (): OutboxView => this.view;

  add(reading: NewReading): void {
    this.change((entries) => [...entries, { reading, state: 'waiting' }]);
    void this.send();
  }

  /** A person decided: the reading is dropped, or another takes its place. */
  decide(id: string, instead?: NewReading): void {
    this.change((entries) =>
      entries.flatMap((entry): OutboxEntry[] => {
        if (entry.reading.id !== id) return [entry];
        return instead ? [{ reading: instead, state: 'waiting' }] : [];
      }),
    );
    void this.send();
  }

  /** Another tab changed the shelf. */
  reread(): void {
    this.show({ entries: this.ways.shelf.read() ?? [] });
  }

  /** Sends all that waits. Never throws: what could not be sent stays where it is. */
  send(): Promise<void> {
    this.askedAgain = true;
    this.running ??= this.ways
      .alone(() => this.sendWhileAsked())
      .finally(() => {
        this.running = null;
        this.show({ sending: 0 });
      });
    return this.running;
  }

  private async sendWhileAsked(): Promise<void> {
    // Whoever asks while a sending is about to fail (the network has just come back) gets one of their own.
    while (this.askedAgain) {
      this.askedAgain = false;
      await this.sendAll();
    }
  }

  /** Returns when nothing waits any more, or when the API cannot be reached and it is better to wait. */
  private async sendAll(): Promise<void> {
    let batch = LARGEST_BATCH;
    for (;;) {
      const waiting = this.entries()
        .filter(({ state }) => state === 'waiting')
        .slice(0, batch);
      if (waiting.length === 0) return;
      this.show({ sending: waiting.length });
      try {
        this.settle(await this.ways.deliver(waiting.map(({ reading }) => reading)));
      } catch (error) {
        if (!isFinal(error)) return;
        // One that cannot be read must not hold up the others: they are sent singly, and it shows itself.
        if (waiting.length > 1) batch = 1;
        else this.mark(waiting[0]?.reading.id, error instanceof Error ? error.message : 'Refused');
      }
    }
  }

  private settle({
    sheetVersion,
    results,
  }: {
    sheetVersion: number;
    results: readonly ReadingResult[];
  }): void {
    const byId = new Map(results.map((result) => [result.id, result]));
    const kept = results.filter(({ outcome }) => outcome === 'kept' || outcome === 'already-kept');
    if (kept.length > 0) this.ways.onKept(kept, sheetVersion);
    this.change((entries) =>
      entries.flatMap((entry): OutboxEntry[] => {
        const result = byId.get(entry.reading.id);
        if (!result) return [entry];
        if (result.outcome === 'kept' || result.outcome === 'already-kept') return [];
        const why = result.detail ?? 'Another reading stands at this point.';
        return [
          { ...entry, state: 'decision', why, ...(result.standing ? { standing: result.standing } : {}) },
        ];
      }),
    );
    if (kept.length > 0) this.show({ sentAt: Date.now() });
  }

  private mark(id: string | undefined, why: string): void {
    this.change((entries) =>
      entries.map((entry) => (entry.reading.id === id ? { ...entry, state: 'decision', why } : entry)),
    );
  }

  /** The shelf is the truth, for another tab may have written to it since. */
  private entries(): readonly OutboxEntry[] {
    return this.ways.shelf.read() ?? [];
  }

  private change(next: (entries: readonly OutboxEntry[]) => readonly OutboxEntry[]): void {
    const entries = next(this.entries());
    this.ways.shelf.write(entries);
    this.show({ entries });
  }

  private show(part: Partial<OutboxView>): void {
    this.view = { ...this.view, ...part };
    for (const listener of this.listeners) listener();
  }
}

/** A refusal that the same request would meet again; silence, overload and a fault of the server may pass. */
function isFinal(error: unknown): boolean {
  return (
    isProblem(error) &&
    error.status >= 400 &&
    error.status < 500 &&
    ![401, 408, 425, 429].includes(error.status)
  );
}
