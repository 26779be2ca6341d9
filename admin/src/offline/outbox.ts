import { isProblem } from '../lib/problem-error.js';
import type { Operation, Placed } from './operation.js';
import type { Commit, OfflineStore } from './store.js';

/** What became of one operation that was sent. */
export interface Outcome {
  readonly id: string;
  readonly kept: boolean;
  /** Why a person must decide, where it was not kept. */
  readonly why?: string;
  readonly standing?: Operation['standing'];
}

/** Sends operations of one kind and one sheet, in order. Rejects with a ProblemError or with NoAnswer. */
export type Deliver = (batch: readonly Operation[]) => Promise<readonly Outcome[]>;

export interface OutboxWays {
  readonly store: OfflineStore;
  readonly deliver: Deliver;
  /** Runs the work while no other tab sends from this device. */
  readonly alone: (work: () => Promise<void>) => Promise<void>;
  /** Tells other tabs of this device that the outbox has changed. */
  readonly tell: () => void;
  /** Asks for another attempt after so many milliseconds. */
  readonly later: (attempt: () => void, ms: number) => void;
}

export interface OutboxState {
  readonly operations: readonly Operation[];
  /** How many are under way just now. */
  readonly sending: number;
  /** When the API last kept something; null before anything was sent. */
  readonly sentAt: number | null;
  /** Ids that are on no disk yet: keyed a moment ago, or this browser keeps nothing. */
  readonly unkept: ReadonlySet<string>;
}

const LARGEST_BATCH = 100;
const FIRST_WAIT_MS = 1_000;
const LONGEST_WAIT_MS = 60_000;
const KEEP_AGAIN_MS = 2_000;

/**
 * Everything keyed on this device that the API has not kept yet, append-only and in order. An operation is on the
 * disk before this says that it is kept; its id makes a repeated delivery harmless, so whenever it is unclear what
 * arrived, it is sent again. One leaves only when the API has kept it, or when a person decides.
 */
export class DeviceOutbox {
  private state: OutboxState = { operations: [], sending: 0, sentAt: null, unkept: new Set() };
  private readonly listeners = new Set<() => void>();
  private running: Promise<void> | null = null;
  private askedAgain = false;
  private failures = 0;
  private user: string | null = null;

  /** Empty until `reread` has looked at what an earlier visit left. */
  constructor(private readonly ways: OutboxWays) {}

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly snapshot = (): OutboxState => this.state;

  /** Whose operations may be sent: nothing goes in another person's name. Null while nobody is signed in. */
  signedIn(user: string | null): void {
    this.user = user;
    if (user) void this.send();
  }

  /** Resolves once it is on the disk; the screen has it at once. */
  async add(commit: Commit): Promise<void> {
    const { operation } = commit;
    this.show({
      operations: [...this.state.operations, operation],
      unkept: new Set([...this.state.unkept, operation.id]),
    });
    await this.keep(commit);
  }

  /** Where the disk refuses, it stays on the screen as not kept, and the disk is asked again. */
  private async keep(commit: Commit): Promise<void> {
    try {
      await this.ways.store.append(commit);
    } catch {
      this.ways.later(() => void this.keep(commit), KEEP_AGAIN_MS);
      return;
    }
    const unkept = new Set(this.state.unkept);
    unkept.delete(commit.operation.id);
    this.show({ unkept });
    this.ways.tell();
    void this.send();
  }

  /** A person decided: the operation is dropped, or another takes its place. */
  async decide(id: string, instead?: Operation): Promise<void> {
    const placed = (await this.ways.store.operations()).find(({ operation }) => operation.id === id);
    if (!placed) return;
    if (instead) await this.ways.store.replace(placed.place, instead);
    else await this.ways.store.remove([placed.place], [id]);
    await this.reread();
    this.ways.tell();
    void this.send();
  }

  /** Looks at the disk again: another tab may have added, sent or decided. */
  async reread(): Promise<void> {
    const placed = await this.ways.store.operations();
    const kept = placed.map(({ operation }) => operation);
    const known = new Set(kept.map(({ id }) => id));
    const onTheWay = this.state.operations.filter(({ id }) => this.state.unkept.has(id) && !known.has(id));
    this.show({ operations: [...kept, ...onTheWay] });
  }

  /** Sends all that waits. Never throws: what could not be sent stays where it is, and is tried again later. */
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
      if (await this.sendAll()) this.failures = 0;
      else if (!this.askedAgain) this.tryLater();
    }
  }

  /** Each time longer, up to a minute, and never all tablets at the same moment. */
  private tryLater(): void {
    const ms = Math.min(LONGEST_WAIT_MS, FIRST_WAIT_MS * 2 ** this.failures);
    this.failures += 1;
    this.ways.later(() => void this.send(), ms * (0.5 + Math.random() / 2));
  }

  /** @returns false where the API could not be reached and it is better to wait */
  private async sendAll(): Promise<boolean> {
    let largest = LARGEST_BATCH;
    for (;;) {
      const batch = await this.nextBatch(largest);
      if (batch.length === 0) return true;
      this.show({ sending: batch.length });
      try {
        await this.settle(batch, await this.ways.deliver(batch.map(({ operation }) => operation)));
        largest = LARGEST_BATCH;
      } catch (error) {
        if (!isFinal(error)) return false;
        // One that cannot be taken must not hold up the others: they are sent singly, and it shows itself.
        if (batch.length > 1) largest = 1;
        else await this.mark(batch[0]!, error instanceof Error ? error.message : 'Refused');
      }
    }
  }

  /** The oldest waiting operation with all that follow it on its sheet and are of its kind. The disk is the truth. */
  private async nextBatch(largest: number): Promise<readonly Placed[]> {
    const waiting = (await this.ways.store.operations()).filter(
      ({ operation }) => operation.state === 'waiting' && operation.by === this.user,
    );
    const first = waiting[0]?.operation;
    if (!first) return [];
    const ofSheet = waiting.filter(({ operation }) => operation.sheetId === first.sheetId);
    const other = ofSheet.findIndex(({ operation }) => operation.kind !== first.kind);
    const most = first.kind === 'picture' ? 1 : largest;
    return ofSheet.slice(0, other === -1 ? most : Math.min(other, most));
  }

  private async settle(batch: readonly Placed[], outcomes: readonly Outcome[]): Promise<void> {
    const byId = new Map(outcomes.map((outcome) => [outcome.id, outcome]));
    const kept = batch.filter(({ operation }) => byId.get(operation.id)?.kept);
    await this.ways.store.remove(
      kept.map(({ place }) => place),
      kept.map(({ operation }) => operation.id),
    );
    for (const { place, operation } of batch) {
      const outcome = byId.get(operation.id);
      if (!outcome || outcome.kept) continue;
      const { why = 'It was not kept, and nobody said why.', standing } = outcome;
      await this.ways.store.replace(place, {
        ...operation,
        state: 'decision',
        why,
        ...(standing ? { standing } : {}),
      });
    }
    await this.reread();
    if (kept.length > 0) this.show({ sentAt: Date.now() });
    this.ways.tell();
  }

  private async mark({ place, operation }: Placed, why: string): Promise<void> {
    await this.ways.store.replace(place, { ...operation, state: 'decision', why });
    await this.reread();
    this.ways.tell();
  }

  private show(part: Partial<OutboxState>): void {
    this.state = { ...this.state, ...part };
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
