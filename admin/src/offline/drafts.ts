import type { KeptDraft } from './database.js';
import type { OfflineStore } from './store.js';

const SETTLES_MS = 150;

const keyOf = (sheetId: string, row: string) => `${sheetId} ${row}`;

/** Typed text by sheet and row: on the screen with every key, on the disk when the hand rests for a moment. */
export class DeviceDrafts {
  private readonly kept = new Map<string, KeptDraft>();
  private readonly unsaved = new Set<string>();
  private readonly listeners = new Set<() => void>();
  private timer: ReturnType<typeof setTimeout> | null = null;
  private snapshots = new Map<string, Readonly<Record<string, unknown>>>();

  /** Empty until `reread` has looked at what an earlier visit left. */
  constructor(
    private readonly store: OfflineStore,
    private readonly tell: () => void,
  ) {}

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** The drafts of a sheet by row; the same object until one of them changes. */
  ofSheet(sheetId: string): Readonly<Record<string, unknown>> {
    const known = this.snapshots.get(sheetId);
    if (known) return known;
    const own = [...this.kept.values()].filter((one) => one.sheetId === sheetId);
    const made = Object.fromEntries(own.map(({ row, draft }) => [row, draft]));
    this.snapshots.set(sheetId, made);
    return made;
  }

  all(): readonly KeptDraft[] {
    return [...this.kept.values()];
  }

  set(sheetId: string, row: string, draft: unknown): void {
    const key = keyOf(sheetId, row);
    this.kept.set(key, { sheetId, row, draft });
    this.unsaved.add(key);
    this.changed(sheetId);
    this.timer ??= setTimeout(() => void this.flush(), SETTLES_MS);
  }

  clear(sheetId: string, row: string): void {
    const key = keyOf(sheetId, row);
    if (!this.kept.delete(key)) return;
    this.unsaved.add(key);
    this.changed(sheetId);
    void this.flush();
  }

  /** Takes a draft off the screen whose removal from the disk belongs to somebody else's transaction. */
  handOver(sheetId: string, row: string): string {
    const key = keyOf(sheetId, row);
    this.kept.delete(key);
    this.unsaved.delete(key);
    this.changed(sheetId);
    return key;
  }

  /** Writes what was typed since the last time. Asked when the hand rests, a box is left, the page is hidden. */
  async flush(): Promise<void> {
    if (this.timer) clearTimeout(this.timer);
    this.timer = null;
    const keys = [...this.unsaved];
    this.unsaved.clear();
    if (keys.length === 0) return;
    await Promise.all(keys.map((key) => this.store.setDraft(key, this.kept.get(key) ?? null)));
    this.tell();
  }

  /** Another tab typed; what was typed here and is not written yet stays. */
  async reread(): Promise<void> {
    const found = await this.store.drafts();
    const own = new Map([...this.unsaved].map((key) => [key, this.kept.get(key)]));
    this.kept.clear();
    for (const draft of found) this.kept.set(keyOf(draft.sheetId, draft.row), draft);
    for (const [key, draft] of own) {
      if (draft) this.kept.set(key, draft);
      else this.kept.delete(key);
    }
    this.snapshots = new Map();
    this.say();
  }

  private changed(sheetId: string): void {
    this.snapshots.delete(sheetId);
    this.say();
  }

  private say(): void {
    for (const listener of this.listeners) listener();
  }
}
