import { useEffect, useRef } from 'react';
import { Button } from '../../../components/ui/button.js';
import { momentText } from '../../../lib/moments.js';
import { type OtherWriter, type Section, sectionWords } from '../model/two-writers.js';

/** Says who saved in between; what both have written is for the person to decide. */
export function OtherWriterNotice({
  other,
  onTake,
}: {
  readonly other: OtherWriter;
  readonly onTake: (section: Section) => void;
}) {
  const notice = useRef<HTMLDivElement>(null);
  useEffect(() => notice.current?.focus(), []);
  const { by, at, both } = other;
  return (
    <div
      ref={notice}
      tabIndex={-1}
      role="group"
      aria-labelledby="other-writer-title"
      className="rounded-sm border-2 border-logwood bg-sheet p-4"
    >
      <h2 id="other-writer-title" className="text-body font-semibold text-logwood">
        {by ?? 'Somebody'} saved this cut sheet while you were writing
      </h2>
      <p className="mt-1 text-table text-ink-2">
        {at && `${momentText(at)}. `}What you typed is kept; sections that only they changed now show their
        text. Look it over and save again.
      </p>
      {both.length > 0 && (
        <ul
          className="mt-3 divide-y divide-hair border-y border-hair"
          aria-label="Sections that you both changed"
        >
          {both.map((section) => (
            <li key={section} className="flex flex-wrap items-center justify-between gap-3 py-2 text-table">
              <span>
                <span className="font-medium">{sectionWords[section]}</span>: yours stands
              </span>
              <Button height="dense" onClick={() => onTake(section)}>
                Take theirs <span className="sr-only">for {sectionWords[section]}</span>
              </Button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
