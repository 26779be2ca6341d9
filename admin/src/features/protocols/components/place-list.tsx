import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { type KeyboardEvent, useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { type Line, onDrawing, type Place, withPlaceAt } from '../model/line-edits.js';

interface PlaceListProps {
  readonly line: Line;
  readonly kind: GarmentKind;
  readonly onLight: (index: number | null) => void;
  readonly onPlace: (line: Line) => void;
  readonly onRemove: (index: number) => void;
}

const NUDGE = 10;
const nudges = [
  { word: 'Left', by: [-NUDGE, 0] },
  { word: 'Right', by: [NUDGE, 0] },
  { word: 'Up', by: [0, -NUDGE] },
  { word: 'Down', by: [0, NUDGE] },
] as const;

/** Each place of the line with its millimetres, to be typed, stepped with the arrow keys, or nudged. */
export function PlaceList({ line, kind, onLight, onPlace, onRemove }: PlaceListProps) {
  const put = (index: number, place: readonly [number, number]) => {
    const next = onDrawing(kind, line.view, place);
    const [x, y] = line.along[index] ?? next;
    if (next[0] !== x || next[1] !== y) onPlace(withPlaceAt(line, index, next));
  };
  if (line.along.length === 0) return null;
  return (
    <div className="mt-3">
      <p id="places-hint" className="text-label text-ink-3">
        Millimetres on the drawing: across from the centre line, and down. The arrow keys up and down step by
        1, with Shift by 10.
      </p>
      <ol className="mt-1 border-t border-hair">
        {line.along.map(([x, y], index) => (
          <li
            key={index}
            onFocus={() => onLight(index)}
            className="flex flex-wrap items-center gap-x-3 gap-y-2 border-b border-hair py-2 text-table"
          >
            <span className="w-28 font-medium max-sm:w-full">{placeWord(index, line.along.length)}</span>
            <MmBox axis="Across" place={index + 1} value={x} onPut={(next) => put(index, [next, y])} />
            <MmBox axis="Down" place={index + 1} value={y} onPut={(next) => put(index, [x, next])} />
            <span className="flex flex-wrap gap-1">
              {nudges.map(({ word, by }) => (
                <Button
                  key={word}
                  height="dense"
                  className="px-2.5"
                  onClick={() => put(index, [x + by[0], y + by[1]])}
                >
                  {word} <span className="sr-only">10 millimetres, place {index + 1}</span>
                </Button>
              ))}
              <Button height="dense" className="px-2.5" onClick={() => onRemove(index)}>
                Remove <span className="sr-only">place {index + 1}</span>
              </Button>
            </span>
          </li>
        ))}
      </ol>
    </div>
  );
}

function placeWord(index: number, count: number): string {
  if (index === 0) return '1, beginning';
  return index === count - 1 ? `${index + 1}, end` : `${index + 1}`;
}

/** As in any box for figures: up is more. */
const steps: Readonly<Record<string, number>> = { ArrowUp: 1, ArrowDown: -1 };

/** One figure of a place. What is typed counts when the box is left or Enter is pressed. */
function MmBox({
  axis,
  place,
  value,
  onPut,
}: {
  readonly axis: 'Across' | 'Down';
  readonly place: number;
  readonly value: Place[0];
  readonly onPut: (value: number) => void;
}) {
  const [typed, setTyped] = useState<string | null>(null);
  const settle = () => {
    const figure = Number((typed ?? '').trim().replace(',', '.').replace('−', '-'));
    if (typed !== null && typed.trim() !== '' && Number.isFinite(figure)) onPut(figure);
    setTyped(null);
  };
  const press = (event: KeyboardEvent) => {
    const step = steps[event.key];
    if (event.key === 'Enter') {
      event.preventDefault();
      settle();
    }
    if (step === undefined) return;
    event.preventDefault();
    setTyped(null);
    onPut(value + step * (event.shiftKey ? 10 : 1));
  };
  return (
    <label className="flex items-center gap-2">
      <span className="text-label text-ink-2">
        {axis}
        <span className="sr-only">, place {place}, millimetres</span>
      </span>
      <input
        type="text"
        inputMode="numeric"
        autoComplete="off"
        aria-describedby="places-hint"
        className="box figures w-20 text-right max-sm:w-16"
        value={typed ?? String(value)}
        onChange={({ target }) => setTyped(target.value)}
        onBlur={settle}
        onKeyDown={press}
      />
    </label>
  );
}
