import { LevelFoundBy, TypedUnit } from '@ellwand/shared/records/sheet';
import { z } from 'zod';
import type { DeviceDrafts } from '../../../offline/drafts.js';

/** What stands in a row's boxes and was not committed yet, with its unit: never converted. */
export const Draft = z.object({
  text: z.string(),
  unit: TypedUnit,
  count: z.string(),
  level: LevelFoundBy.nullable(),
  gap: z.string().default(''),
  depth: z.string().default(''),
  /** Read flat from fold to fold, where the point is a round. */
  doubled: z.boolean().default(false),
});
export type Draft = z.infer<typeof Draft>;
export type DraftsKept = Readonly<Record<string, Draft>>;

/** Typed text of one sheet by row, on this device with every keystroke. */
export class SheetDrafts {
  private seen: Readonly<Record<string, unknown>> | null = null;
  private kept: DraftsKept = {};

  constructor(
    private readonly device: DeviceDrafts,
    private readonly sheetId: string,
  ) {}

  readonly subscribe = (listener: () => void): (() => void) => this.device.subscribe(listener);

  readonly snapshot = (): DraftsKept => {
    const all = this.device.ofSheet(this.sheetId);
    if (all !== this.seen) {
      this.seen = all;
      this.kept = Object.fromEntries(
        Object.entries(all).flatMap(([row, value]) => {
          const draft = Draft.safeParse(value);
          return draft.success ? [[row, draft.data] as const] : [];
        }),
      );
    }
    return this.kept;
  };

  set(row: string, draft: Draft): void {
    this.device.set(this.sheetId, row, draft);
  }

  clear(row: string): void {
    this.device.clear(this.sheetId, row);
  }

  flush(): Promise<void> {
    return this.device.flush();
  }
}
