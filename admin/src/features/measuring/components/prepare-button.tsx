import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Button } from '../../../components/ui/button.js';
import { Refused } from '../../../components/ui/states.js';
import { momentText } from '../../../lib/moments.js';
import { useOffline } from '../../../offline/context.js';
import { referenceKeys } from '../../../offline/reference.js';
import { Prepared, prepareSheet } from '../model/prepare.js';

const count = (many: number, one: string, more = `${one}s`) => `${many} ${many === 1 ? one : more}`;

function readyWords({ points, readings, hazards, picture }: Prepared): string {
  const things = [
    count(points, 'point'),
    count(readings, 'earlier reading'),
    count(hazards, 'caution'),
    ...(picture ? ['a picture'] : []),
  ];
  return `${things.slice(0, -1).join(', ')} and ${things.at(-1)}`;
}

function roomWords({ promised, freeMegabytes }: Prepared): string {
  const room = freeMegabytes === null ? '' : ` ${freeMegabytes.toLocaleString('en-GB')} MB are free.`;
  return promised
    ? `This browser has promised to keep it.${room}`
    : `This browser may clear it when room is short: send what you keyed before you close it.${room}`;
}

/** Puts on this device all that the sheet needs where there is no network, and says what is ready. */
export function PrepareButton({ sheetId }: { readonly sheetId: string }) {
  const offline = useOffline();
  const queries = useQueryClient();
  const key = ['prepared', sheetId];
  const ready = useQuery({
    queryKey: key,
    queryFn: () => offline.reference.find(referenceKeys.prepared(sheetId), Prepared),
  });
  const prepare = useMutation({
    mutationFn: () => prepareSheet(queries, offline, sheetId),
    onSuccess: () => queries.invalidateQueries({ queryKey: key }),
  });
  return (
    <div className="space-y-2 text-table">
      <Button height="table" disabled={prepare.isPending} onClick={() => prepare.mutate()}>
        {prepare.isPending ? 'Preparing' : ready.data ? 'Prepare again' : 'Prepare for the table'}
      </Button>
      <Refused error={prepare.error} />
      <div role="status" className="text-ink-2">
        {ready.data && (
          <>
            <p>
              Ready on this tablet since {momentText(ready.data.keptAt)}: {readyWords(ready.data.value)}.
            </p>
            <p>{roomWords(ready.data.value)}</p>
          </>
        )}
      </div>
    </div>
  );
}
