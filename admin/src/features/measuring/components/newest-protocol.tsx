import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button } from '../../../components/ui/button.js';
import { Refused } from '../../../components/ui/states.js';
import { useMay } from '../../../lib/session.js';
import { takeNewestProtocol } from '../api/newest-protocol.js';
import { sheetQuery } from '../api/sheet.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

/** Offered while nothing has been read: once there is a reading, the sheet keeps the version it is taken by. */
export function NewestProtocol({ desk }: { readonly desk: SheetDesk }) {
  const { sheet, rows, locked } = desk;
  const queries = useQueryClient();
  const writes = useMay('sheet:write');
  const { queryKey } = sheetQuery(sheet.id);
  const take = useMutation({
    mutationFn: () => takeNewestProtocol(sheet.id, sheet.version),
    onSuccess: (moved) => queries.setQueryData(queryKey, moved),
    onError: () => queries.invalidateQueries({ queryKey }),
  });
  const newest = sheet.newestProtocolVersion;
  const isRead = sheet.readings.length > 0 || rows.some(({ reading }) => reading !== null);
  if (locked || !writes || isRead || newest <= sheet.protocolVersion) return null;
  return (
    <div className="space-y-2 border-b border-hair bg-sheet px-4 py-3">
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <p className="text-table">
          Opened with version {sheet.protocolVersion} of its protocol; there is a version {newest}. Nothing
          has been read yet.
        </p>
        <Button height="table" disabled={take.isPending} onClick={() => take.mutate()}>
          Take version {newest}
        </Button>
      </div>
      <Refused error={take.error} />
    </div>
  );
}
