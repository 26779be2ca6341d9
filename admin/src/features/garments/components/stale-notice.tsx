import { useEffect, useRef } from 'react';
import { Button } from '../../../components/ui/button.js';
import { momentText } from '../../../lib/moments.js';
import type { BoxChange } from '../record-changes.js';
import type { RecordTyped } from '../record-form.js';

/** What another person saved while this form was open. */
export interface Meanwhile {
  readonly by: string | null;
  readonly at: string;
  readonly changes: readonly BoxChange[];
  readonly typed: RecordTyped;
}

/** Says who saved in between and lays both texts side by side; one's own stands until one decides otherwise. */
export function StaleNotice({
  meanwhile,
  onTake,
}: {
  readonly meanwhile: Meanwhile;
  readonly onTake: (box: keyof RecordTyped) => void;
}) {
  const notice = useRef<HTMLDivElement>(null);
  useEffect(() => notice.current?.focus(), []);
  const { by, at, changes } = meanwhile;
  return (
    <div
      ref={notice}
      tabIndex={-1}
      role="group"
      aria-labelledby="stale-title"
      className="rounded-sm border-2 border-logwood bg-sheet p-4"
    >
      <h3 id="stale-title" className="text-body font-semibold text-logwood">
        {by ?? 'Somebody'} saved this record while you were writing
      </h3>
      <p className="mt-1 text-table text-ink-2">
        {momentText(at)}. What you typed is kept; boxes that only they changed now show their text. Look it
        over and save again.
      </p>
      {changes.length > 0 && (
        <table className="mt-3 w-full text-table">
          <caption className="sr-only">Boxes that you both changed</caption>
          <thead className="border-b border-ink text-left text-label text-ink-2">
            <tr>
              <th scope="col" className="py-1 pr-3 font-medium">
                Box
              </th>
              <th scope="col" className="py-1 pr-3 font-medium">
                Theirs
              </th>
              <th scope="col" className="py-1 pr-3 font-medium">
                Yours
              </th>
              <th scope="col">
                <span className="sr-only">Decide</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {changes.map(({ box, label, theirs, mine }) => (
              <tr key={box} className="border-b border-hair align-top">
                <th scope="row" className="py-2 pr-3 text-left font-medium">
                  {label}
                </th>
                <td className="break-words py-2 pr-3">{theirs}</td>
                <td className="break-words py-2 pr-3">{mine}</td>
                <td className="py-2 text-right">
                  <Button height="dense" onClick={() => onTake(box)}>
                    Take theirs <span className="sr-only">for {label}</span>
                  </Button>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </div>
  );
}
