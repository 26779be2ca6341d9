import { Sheet } from '@ellwand/shared/records/sheet';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/ui/button.js';
import { paths } from '../../../config/paths.js';
import { useSession } from '../../../lib/session.js';
import { useOffline } from '../../../offline/context.js';
import type { Operation } from '../../../offline/operation.js';
import { referenceKeys } from '../../../offline/reference.js';
import { operationWords } from '../tray-words.js';

interface OfSheet {
  readonly sheetId: string;
  readonly operations: readonly Operation[];
  readonly unkept: ReadonlySet<string>;
}

/** All that waits of one sheet, in the order in which it was keyed. */
export function SheetTray({ sheetId, operations, unkept }: OfSheet) {
  const name = useSheetName(sheetId);
  return (
    <section aria-labelledby={`tray-${sheetId}`}>
      <h2 id={`tray-${sheetId}`} className="title text-title-25">
        <Link to={paths.sheet(sheetId)} className="underline underline-offset-4">
          {name}
        </Link>
      </h2>
      <ul className="mt-2 divide-y divide-hair border-y border-hair">
        {operations.map((operation) => (
          <Waiting key={operation.id} operation={operation} kept={!unkept.has(operation.id)} />
        ))}
      </ul>
    </section>
  );
}

/** The sheet's garment and part as this device knows them. */
function useSheetName(sheetId: string): string {
  const { reference } = useOffline();
  const known = useQuery({
    queryKey: ['tray-sheet', sheetId],
    queryFn: async () => (await reference.find(referenceKeys.sheet(sheetId), Sheet))?.value ?? null,
  });
  if (!known.data) return 'A sheet of this device';
  const { garment } = known.data;
  return `${garment.partName}, ${garment.ownNumber}${garment.partSuffix}`;
}

function Waiting({ operation, kept }: { readonly operation: Operation; readonly kept: boolean }) {
  return (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-2 py-2 text-table">
      <span className="figures min-w-0 grow basis-64">{operationWords(operation)}</span>
      <span className="basis-64 text-ink-2">
        <StateOf operation={operation} kept={kept} />
      </span>
      {operation.state === 'decision' && <Decide operation={operation} />}
    </li>
  );
}

function StateOf({ operation, kept }: { readonly operation: Operation; readonly kept: boolean }) {
  const { user } = useSession();
  if (operation.state === 'decision')
    return <span className="text-madder">Needs your decision: {operation.why}</span>;
  if (!kept) return <span className="text-madder">Not kept yet: leave this page open</span>;
  if (operation.by !== user.id) return `Waits until ${operation.byName || 'whoever keyed it'} signs in here`;
  return 'Kept on this tablet, waits to be sent';
}

/** A conflict is decided on the sheet, where both readings are seen; anything else is sent again or dropped here. */
function Decide({ operation }: { readonly operation: Operation }) {
  const { outbox } = useOffline();
  if (operation.standing)
    return (
      <Link to={paths.sheet(operation.sheetId)} className="text-indigo underline underline-offset-4">
        Compare both readings
      </Link>
    );
  const again = (): Operation => ({ ...operation, state: 'waiting', why: undefined });
  return (
    <span className="flex gap-2">
      <Button onClick={() => void outbox.decide(operation.id, again())}>Send it again</Button>
      <Button tone="danger" onClick={() => void outbox.decide(operation.id)}>
        Drop it
      </Button>
    </span>
  );
}
