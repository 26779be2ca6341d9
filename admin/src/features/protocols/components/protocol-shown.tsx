import { handlingStepLabels } from '@ellwand/shared/points/point';
import type { ProtocolVersion } from '@ellwand/shared/records/protocol';
import { useState } from 'react';
import { bandsOf, type DraftRow } from '../model/draft.js';
import { mannerWords } from '../model/protocol-words.js';
import { ProtocolDiagram } from './protocol-diagram.js';

/** A version to read: its points in their three handling steps, beside the diagram. */
export function ProtocolShown({ protocol }: { readonly protocol: ProtocolVersion }) {
  const [current, setCurrent] = useState<string | null>(null);
  return (
    <div className="grid gap-8 md:grid-cols-[minmax(0,1fr)_20rem] lg:grid-cols-[minmax(0,1fr)_24rem]">
      <div className="space-y-8">
        {bandsOf(protocol)
          .filter(({ rows }) => rows.length > 0)
          .map(({ step, rows }) => (
            <section key={step} aria-labelledby={`step-${step}`}>
              <h2 id={`step-${step}`} className="text-body font-semibold">
                {handlingStepLabels[step]}
              </h2>
              <ol className="mt-2 border-t border-ink">
                {rows.map((row) => (
                  <li key={row.point.id} className="border-b border-hair py-2">
                    <ShownRow row={row} onLight={() => setCurrent(row.point.id)} />
                  </li>
                ))}
              </ol>
            </section>
          ))}
      </div>
      <div className="max-md:order-first md:sticky md:top-4 md:self-start">
        <ProtocolDiagram draft={protocol} current={current} onChoose={setCurrent} />
      </div>
    </div>
  );
}

function ShownRow({ row, onLight }: { readonly row: DraftRow; readonly onLight: () => void }) {
  const { asked, point, letter, isOwn } = row;
  return (
    <div className="flex gap-3 text-table">
      <button
        type="button"
        onClick={onLight}
        className="-m-2 grid size-11 shrink-0 place-items-center"
        aria-label={`Show ${point.name} on the diagram`}
      >
        <span className="letter">{letter}</span>
      </button>
      <div>
        <p className="font-medium">{point.name}</p>
        <p className="text-ink-2">{point.definition}</p>
        <p className="text-label text-ink-3">
          {[
            asked.required ? 'Required' : 'May be left out',
            asked.rounds > 1 ? `${asked.rounds} rounds` : '',
            mannerWords(point),
            isOwn ? 'the museum’s own' : '',
          ]
            .filter(Boolean)
            .join('; ')}
        </p>
      </div>
    </div>
  );
}
