import { Sheet, type StoredReading } from '@ellwand/shared/records/sheet';
import { type QueryClient, queryOptions } from '@tanstack/react-query';
import { api } from '../../../lib/api-client.js';

export const sheetQuery = (id: string) =>
  queryOptions({
    queryKey: ['sheet', id],
    queryFn: ({ signal }) => api.get(`/workroom/sheets/${id}`, Sheet, { signal }),
  });

/** Lays readings that the API has kept into the sheet at hand, and strikes those they replace. */
export function layIn(
  queries: QueryClient,
  sheetId: string,
  kept: readonly StoredReading[],
  version: number,
): void {
  queries.setQueryData(sheetQuery(sheetId).queryKey, (sheet) => {
    if (!sheet) return sheet;
    const ids = new Set(kept.map(({ id }) => id));
    const replaced = new Set(kept.map(({ replaces }) => replaces));
    const others = sheet.readings
      .filter(({ id }) => !ids.has(id))
      .map((reading) => (replaced.has(reading.id) ? { ...reading, stands: false } : reading));
    // A reading may come back after the one that replaced it: what is struck stays struck.
    const struck = new Set(others.map(({ replaces }) => replaces));
    const fresh = kept.map((reading) =>
      replaced.has(reading.id) || struck.has(reading.id) ? { ...reading, stands: false } : reading,
    );
    return { ...sheet, version: Math.max(sheet.version, version), readings: [...others, ...fresh] };
  });
}
