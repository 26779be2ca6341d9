import { NewReading } from '@ellwand/shared/records/sheet';
import type { OfflineStore } from './store.js';

const OUTBOX = 'ellwand.outbox.';
const DRAFTS = 'ellwand.drafts.';

function readJson(key: string): unknown {
  try {
    return JSON.parse(localStorage.getItem(key) ?? 'null') as unknown;
  } catch {
    return null;
  }
}

/**
 * Earlier Workrooms kept readings and drafts in localStorage. What is still there moves over, once; whose it was is not
 * written there, so it goes in the name of the person who read the tape.
 */
export async function takeOver(store: OfflineStore): Promise<void> {
  const keys = listKeys();
  for (const key of keys.filter((name) => name.startsWith(OUTBOX))) {
    await takeReadings(store, key.slice(OUTBOX.length), readJson(key));
    localStorage.removeItem(key);
  }
  for (const key of keys.filter((name) => name.startsWith(DRAFTS))) {
    await takeDrafts(store, key.slice(DRAFTS.length), readJson(key));
    localStorage.removeItem(key);
  }
}

function listKeys(): readonly string[] {
  try {
    return Object.keys(localStorage);
  } catch {
    return [];
  }
}

async function takeReadings(store: OfflineStore, sheetId: string, kept: unknown): Promise<void> {
  if (!Array.isArray(kept)) return;
  for (const entry of kept) {
    const parsed = NewReading.safeParse((entry as { reading?: unknown } | null)?.reading);
    if (!parsed.success) continue;
    const { data: reading } = parsed;
    const carried = { id: reading.id, sheetId, by: reading.readBy, byName: '', state: 'waiting' } as const;
    await store.append({ operation: { ...carried, kind: 'reading', reading } });
  }
}

async function takeDrafts(store: OfflineStore, sheetId: string, kept: unknown): Promise<void> {
  if (typeof kept !== 'object' || kept === null) return;
  for (const [row, draft] of Object.entries(kept)) {
    await store.setDraft(`${sheetId} ${row}`, { sheetId, row, draft });
  }
}
