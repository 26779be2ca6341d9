import { handlingStepLabels, type MeasuringPoint } from '@ellwand/shared/points/point';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { TextField } from '../../../components/ui/field.js';
import { notAsked, searched, withPoint } from '../model/draft.js';
import type { DraftDesk } from '../model/use-draft.js';

/** What else could be asked for: the catalogue's points of the kind, own points made before, or a new one. */
export function PointAdder({ desk, onMake }: { readonly desk: DraftDesk; readonly onMake: () => void }) {
  const [words, setWords] = useState('');
  const { draft, change } = desk;
  const waiting = notAsked(draft);
  const found = searched(waiting, words);
  const isOwn = ({ id }: MeasuringPoint) => draft.ownPoints.some((own) => own.id === id);
  return (
    <section aria-labelledby="add-title" className="space-y-3">
      <h2 id="add-title" className="title text-title-25">
        Add a point
      </h2>
      {waiting.length === 0 ? (
        <p className="text-table text-ink-2">Every point that the catalogue has for this is asked for.</p>
      ) : (
        <>
          <div className="max-w-text">
            <TextField
              id="add-words"
              label="Find a point"
              hint="By its name or a word of its definition."
              autoComplete="off"
              value={words}
              onChange={({ target }) => setWords(target.value)}
            />
          </div>
          <p role="status" className="text-label text-ink-2">
            {found.length === 1 ? '1 point is not asked for' : `${found.length} points are not asked for`}
            {words.trim() && ` and ${found.length === 1 ? 'matches' : 'match'}`}
          </p>
          <ul className="max-h-96 overflow-y-auto border-y border-hair">
            {found.map((point) => (
              <li
                key={point.id}
                className="flex items-start justify-between gap-4 border-b border-hair py-2 pr-2 text-table last:border-b-0"
              >
                <div>
                  <p className="font-medium">
                    {point.name}{' '}
                    <span className="font-normal text-ink-3">
                      {handlingStepLabels[point.handlingStep].toLowerCase()}
                      {isOwn(point) && '; the museum’s own'}
                    </span>
                  </p>
                  <p className="text-label text-ink-2">{point.definition}</p>
                </div>
                <Button
                  height="dense"
                  onClick={() => change(withPoint(draft, point.id), `“${point.name}” added.`)}
                >
                  Add <span className="sr-only">{point.name}</span>
                </Button>
              </li>
            ))}
          </ul>
        </>
      )}
      <Button onClick={onMake}>Make a point of our own</Button>
    </section>
  );
}
