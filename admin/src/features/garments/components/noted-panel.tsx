import type { NotedAtTable, Settlement } from '@ellwand/shared/records/noted';
import { describedLabels } from '@ellwand/shared/records/table-note';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/ui/button.js';
import { Failed, Refused } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { dayText } from '../../../lib/moments.js';
import { notedQuery, settleNote } from '../api/noted.js';
import { boxOf, laidIn } from '../lay-in.js';
import { boxLabels, type RecordTyped } from '../record-form.js';

/** What waits to be laid into the record, which of it lies in the form already, and what became of it. */
export function useNoted(garmentId: string) {
  const queries = useQueryClient();
  const noted = useQuery(notedQuery(garmentId));
  const [laid, setLaid] = useState<readonly string[]>([]);
  const settle = useMutation({
    mutationFn: ({ id, how }: { readonly id: string; readonly how: Settlement }) => settleNote(id, how),
    onSuccess: (next) => queries.setQueryData(notedQuery(garmentId).queryKey, next),
  });
  /** Once the record is saved, what was laid into it is done. */
  const saved = async () => {
    for (const id of laid) await settle.mutateAsync({ id, how: 'laid-in' });
    setLaid([]);
  };
  return { noted, laid, lay: (id: string) => setLaid([...laid, id]), settle, saved };
}

/** "Noted at the table, not yet in the record." Inside the record's form, for it writes into its boxes. */
export function NotedPanel({ noted, laid, lay, settle }: ReturnType<typeof useNoted>) {
  if (noted.isError) return <Failed error={noted.error} onRetry={() => void noted.refetch()} />;
  const items = noted.data?.items ?? [];
  if (items.length === 0) return null;
  return (
    <section aria-labelledby="noted-title" className="rounded-sm border border-logwood bg-logwood-tint p-4">
      <h3 id="noted-title" className="text-body font-semibold text-logwood">
        Noted at the table, not yet in the record
      </h3>
      <ul className="mt-2 divide-y divide-hair">
        {items.map((item) => (
          <NotedItem
            key={item.id}
            item={item}
            isLaid={laid.includes(item.id)}
            pending={settle.isPending}
            onLay={() => lay(item.id)}
            onSetAside={() => settle.mutate({ id: item.id, how: 'set-aside' })}
          />
        ))}
      </ul>
      <Refused error={settle.error} />
    </section>
  );
}

interface NotedItemProps {
  readonly item: NotedAtTable;
  readonly isLaid: boolean;
  readonly pending: boolean;
  readonly onLay: () => void;
  readonly onSetAside: () => void;
}

function NotedItem({ item, isLaid, pending, onLay, onSetAside }: NotedItemProps) {
  const { getValues, setValue, setFocus } = useFormContext<RecordTyped>();
  const { thing, text, partName, measuredOn, byName, sheetId } = item;
  const box = boxOf[thing];
  const boxName =
    thing === 'label' ? 'What the label says' : boxLabels[thing === 'remark' ? 'handling' : thing];
  const what = `${describedLabels[thing].toLowerCase()}, ${partName}`;
  return (
    <li className="py-3 text-table first:pt-1">
      <p className="whitespace-pre-line">
        <span className="font-medium">{describedLabels[thing]}: </span>
        {text}
      </p>
      <p className="text-label text-ink-3">
        {byName},{' '}
        <Link to={paths.sheet(sheetId)} className="text-indigo underline underline-offset-4">
          {partName}, {dayText(measuredOn)}
        </Link>
      </p>
      {isLaid ? (
        <p role="status" className="mt-1 text-label font-medium text-logwood">
          Laid into “{boxName}”; save the record to keep it there.
        </p>
      ) : (
        <div className="mt-2 flex flex-wrap gap-2">
          <Button
            height="dense"
            onClick={() => {
              setValue(box, laidIn(getValues(box), text), { shouldDirty: true });
              setFocus(box);
              onLay();
            }}
          >
            Lay into “{boxName}” <span className="sr-only">: {what}</span>
          </Button>
          <Button height="dense" tone="quiet" disabled={pending} onClick={onSetAside}>
            Set aside <span className="sr-only">: {what}</span>
          </Button>
        </div>
      )}
    </li>
  );
}
