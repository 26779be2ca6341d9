import { Sheet, type StoredReading } from '@ellwand/shared/records/sheet';
import { type QueryClient, queryOptions } from '@tanstack/react-query';
import type { StoredTableNote } from '@ellwand/shared/records/table-note';
import { api } from '../../../lib/api-client.js';
import { referenceOf } from '../../../lib/query-client.js';
import { referenceKeys } from '../../../offline/reference.js';

export const sheetQuery = (id: string) =>
  queryOptions({
    queryKey: ['sheet', id],
    queryFn: ({ signal, client }) =>
      referenceOf(client).through(referenceKeys.sheet(id), Sheet, () =>
        api.get(`/workroom/sheets/${id}`, Sheet, { signal }),
      ),
  });

/** What the API has kept just now, of one sheet. */
export interface Kept {
  readonly sheetId: string;
  readonly sheetVersion: number;
  readonly readings: readonly StoredReading[];
  readonly notes: readonly StoredTableNote[];
}

/** Lays what the API has kept into the sheet at hand, strikes the readings that were replaced, and keeps the sheet. */
export function layIn(queries: QueryClient, kept: Kept): void {
  const { queryKey } = sheetQuery(kept.sheetId);
  queries.setQueryData(queryKey, (sheet) => {
    if (!sheet) return sheet;
    return {
      ...sheet,
      version: Math.max(sheet.version, kept.sheetVersion),
      readings: withReadings(sheet.readings, kept.readings),
      tableNotes: withNotes(sheet.tableNotes, kept.notes),
    };
  });
  const laidIn = queries.getQueryData(queryKey);
  if (laidIn)
    void referenceOf(queries)
      .keep(referenceKeys.sheet(kept.sheetId), laidIn)
      .catch(() => undefined);
}

function withReadings(before: readonly StoredReading[], kept: readonly StoredReading[]): StoredReading[] {
  const ids = new Set(kept.map(({ id }) => id));
  const replaced = new Set(kept.map(({ replaces }) => replaces));
  const others = before
    .filter(({ id }) => !ids.has(id))
    .map((reading) => (replaced.has(reading.id) ? { ...reading, stands: false } : reading));
  // A reading may come back after the one that replaced it: what is struck stays struck.
  const struck = new Set(others.map(({ replaces }) => replaces));
  const fresh = kept.map((reading) =>
    replaced.has(reading.id) || struck.has(reading.id) ? { ...reading, stands: false } : reading,
  );
  return [...others, ...fresh];
}

function withNotes(before: readonly StoredTableNote[], kept: readonly StoredTableNote[]): StoredTableNote[] {
  const ids = new Set(kept.map(({ id }) => id));
  return [...before.filter(({ id }) => !ids.has(id)), ...kept].toSorted((one, other) =>
    one.saidAt.localeCompare(other.saidAt),
  );
}
