import type { z } from 'zod';
import { NoAnswer } from '../lib/problem-error.js';
import type { OfflineStore } from './store.js';

/** What was fetched before, kept for when there is no network. */
export class Reference {
  constructor(
    private readonly store: OfflineStore,
    private readonly now: () => Date = () => new Date(),
  ) {}

  async keep(key: string, value: unknown): Promise<void> {
    await this.store.keep(key, { value, keptAt: this.now().toISOString() });
  }

  /** Nothing where it was never kept, or was kept by an older Workroom in another form. */
  async find<T extends z.ZodType>(
    key: string,
    schema: T,
  ): Promise<{ readonly value: z.output<T>; readonly keptAt: string } | null> {
    const found = await this.store.reference(key).catch(() => undefined);
    const parsed = found && schema.safeParse(found.value);
    return parsed?.success ? { value: parsed.data, keptAt: found!.keptAt } : null;
  }

  forget(key: string): Promise<void> {
    return this.store.forget(key);
  }

  async keys(prefix: string): Promise<readonly string[]> {
    return (await this.store.referenceKeys()).filter((key) => key.startsWith(prefix));
  }

  /** Asks the API and keeps its answer; where none comes, answers with what was kept. */
  async through<T extends z.ZodType>(
    key: string,
    schema: T,
    ask: () => Promise<z.output<T>>,
  ): Promise<z.output<T>> {
    try {
      const fresh = await ask();
      // Keeping it is a precaution: where the device refuses, the answer is good all the same.
      void this.keep(key, fresh).catch(() => undefined);
      return fresh;
    } catch (error) {
      if (!(error instanceof NoAnswer)) throw error;
      const kept = await this.find(key, schema);
      if (!kept) throw error;
      return kept.value;
    }
  }
}

export const referenceKeys = {
  session: 'session',
  colleagues: 'colleagues',
  sheet: (sheetId: string) => `sheet ${sheetId}`,
  findings: (sheetId: string) => `findings ${sheetId}`,
  prepared: (sheetId: string) => `prepared ${sheetId}`,
  picture: (imageId: string) => `picture ${imageId}`,
} as const;
