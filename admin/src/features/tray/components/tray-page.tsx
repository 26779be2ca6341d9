import { useSyncExternalStore } from 'react';
import { Button } from '../../../components/ui/button.js';
import { Page } from '../../../components/ui/page.js';
import { Empty } from '../../../components/ui/states.js';
import { useOffline, useReachable } from '../../../offline/context.js';
import { FileWays } from './file-ways.js';
import { SheetTray } from './sheet-tray.js';

/** What was keyed on this device and the museum has not got yet: seen, sent, saved, decided, never dropped silently. */
export function TrayPage() {
  const { outbox, store } = useOffline();
  const { operations, sending, unkept } = useSyncExternalStore(outbox.subscribe, outbox.snapshot);
  const reachable = useReachable();
  const sheets = [...new Set(operations.map(({ sheetId }) => sheetId))];
  return (
    <Page
      title="Not yet sent"
      lead={reachable ? 'The museum’s server answers.' : 'The museum’s server does not answer just now.'}
      aside={
        <Button tone="action" disabled={operations.length === 0} onClick={() => void outbox.send()}>
          Try now
        </Button>
      }
    >
      <div className="space-y-8">
        {!store.lasting && (
          <p role="alert" className="rounded-sm border border-madder bg-madder-tint p-3 text-table">
            <span className="font-medium text-madder">This browser keeps nothing: </span>
            leave this page open until everything is sent, or save it to a file.
          </p>
        )}
        <p role="status" className="text-table text-ink-2">
          {sending > 0 ? `Sending ${sending} of ${operations.length}` : `${operations.length} waiting`}
        </p>
        {sheets.length === 0 ? (
          <Empty title="Everything has been sent">
            What you key at the table waits here while there is no network.
          </Empty>
        ) : (
          sheets.map((sheetId) => (
            <SheetTray
              key={sheetId}
              sheetId={sheetId}
              operations={operations.filter((one) => one.sheetId === sheetId)}
              unkept={unkept}
            />
          ))
        )}
        <FileWays />
      </div>
    </Page>
  );
}
