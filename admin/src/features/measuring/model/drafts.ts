import { LevelFoundBy, TypedUnit } from '@ellwand/shared/records/sheet';
import { z } from 'zod';
import type { Shelf } from './shelf.js';

/** What stands in a row's boxes and was not committed yet, with its unit: never converted. */
export const Draft = z.object({
  text: z.string(),
  unit: TypedUnit,
  count: z.string(),
  level: LevelFoundBy.nullable(),
});
export type Draft = z.infer<typeof Draft>;

export const DraftsKept = z.record(z.string(), Draft);
export type DraftsKept = z.infer<typeof DraftsKept>;

/** Typed text by row, on the shelf with every keystroke. */
export class Drafts {
  private kept: DraftsKept;
  private readonly listeners = new Set<() => void>();

  constructor(private readonly shelf: Shelf<DraftsKept>) {
    this.kept = shelf.read() ?? {};
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly snapshot = (): DraftsKept => this.kept;

  set(row: string, draft: Draft): void {
    this.change({ ...this.kept, [row]: draft });
  }

  clear(row: string): void {
    if (!(row in this.kept)) return;
    const others = Object.fromEntries(Object.entries(this.kept).filter(([key]) => key !== row));
    this.change(others);
  }

  private change(kept: DraftsKept): void {
    this.kept = kept;
    this.shelf.write(kept);
    for (const listener of this.listeners) listener();
  }
}
