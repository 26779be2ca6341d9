import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { extraLinesOf } from '@ellwand/shared/protocols/extra-lines';
import { paintProtocol, placeUnder } from '@ellwand/shared/protocols/own-lines';
import type { OwnPointView } from '@ellwand/shared/records/protocol';
import { type MouseEvent, useMemo, useRef, useState } from 'react';
import { SceneDrawing } from '../../../components/drawing/scene-drawing.js';
import { ViewChoice } from '../../../components/drawing/view-choice.js';
import { Button } from '../../../components/ui/button.js';
import { FieldError } from '../../../components/ui/field.js';
import { lettersFor } from '@ellwand/shared/protocols/protocol';
import { type Draft, protocolOf, withOwnPoint } from '../model/draft.js';
import {
  type Line,
  MOST_PLACES,
  nextPlace,
  onDrawing,
  withoutPlace,
  withPlace,
} from '../model/line-edits.js';
import { tapIn } from '../model/tap.js';
import { PlaceList } from './place-list.js';

interface LineDeskProps {
  readonly draft: Draft;
  /** The point as far as it is written, for its letter and the look of its line. */
  readonly own: OwnPointView;
  readonly onChange: (line: Line) => void;
  readonly error?: string;
}

/** Draws an own point's line: by tapping the drawing, or by millimetres and the arrow keys. Each step can be taken back. */
export function LineDesk({ draft, own, onChange, error }: LineDeskProps) {
  const { line } = own;
  const { kind } = draft;
  const [before, setBefore] = useState<readonly Line[]>([]);
  const [lit, setLit] = useState<number | null>(null);
  const change = (next: Line) => {
    setBefore([...before, line]);
    onChange(next);
  };
  const undo = () => {
    const last = before.at(-1);
    if (!last) return;
    setBefore(before.slice(0, -1));
    onChange(last);
  };
  const isFull = line.along.length >= MOST_PLACES;
  const add = (place: Line['along'][number]) => {
    setLit(line.along.length);
    change(withPlace(line, place));
  };
  return (
    <fieldset
      id="line-along"
      tabIndex={-1}
      aria-describedby={error ? 'line-hint line-error' : 'line-hint'}
      className="min-w-0"
    >
      <legend className="text-table font-medium">Line on the diagram</legend>
      <p id="line-hint" className="max-w-text text-label text-ink-3">
        Tap the drawing where the tape begins, then where it goes on and ends; or add places and move them
        below.
      </p>
      {error && <FieldError id="line-error">{error}</FieldError>}
      <div className="mt-2 grid gap-3 border border-hair bg-sheet p-4">
        <LineDrawing draft={draft} own={own} lit={lit} onTap={isFull ? undefined : add} />
        <ViewChoice
          views={diagramFor(kind)?.views.map(({ name }) => name) ?? []}
          view={line.view}
          onChoose={(view) => view !== line.view && change({ view, along: [] })}
        />
      </div>
      <PlaceList
        line={line}
        kind={kind}
        onLight={setLit}
        onPlace={change}
        onRemove={(index) => change(withoutPlace(line, index))}
      />
      <div className="mt-3 flex flex-wrap gap-2">
        <Button disabled={isFull} onClick={() => add(nextPlace(kind, line))}>
          Add a place
        </Button>
        <Button disabled={before.length === 0} onClick={undo}>
          Undo
        </Button>
      </div>
      {isFull && (
        <p className="mt-2 text-label text-ink-2">A line goes through {MOST_PLACES} places at most.</p>
      )}
    </fieldset>
  );
}

interface LineDrawingProps {
  readonly draft: Draft;
  readonly own: OwnPointView;
  readonly lit: number | null;
  readonly onTap?: (place: Line['along'][number]) => void;
}

function LineDrawing({ draft, own, lit, onTap }: LineDrawingProps) {
  const box = useRef<HTMLDivElement>(null);
  const { view, along } = own.line;
  const painted = useMemo(() => {
    const protocol = protocolOf(withOwnPoint(draft, own));
    const request = { kind: draft.kind, views: [own.line.view], widthPx: 440, current: own.id };
    const letters = lettersFor(protocol);
    return paintProtocol({ ...request, letters, idPrefix: 'line' }, extraLinesOf(protocol.ownPoints));
  }, [draft, own]);
  const projection = painted?.projections.get(view);
  if (!painted || !projection) return null;
  const { scene } = painted;
  const tap = (event: MouseEvent) => {
    const svg = box.current?.querySelector('svg');
    if (!svg || !onTap) return;
    const at = tapIn(svg.getBoundingClientRect(), scene, event);
    onTap(onDrawing(draft.kind, view, placeUnder(at, projection)));
  };
  return (
    <div ref={box} data-testid="line-drawing" onClick={tap} className={onTap ? 'cursor-crosshair' : ''}>
      <SceneDrawing scene={scene} current={own.id} className="max-h-[36rem] w-full touch-manipulation">
        {along.map(([x, y], index) => (
          <circle
            key={index}
            className={index === lit ? 'drawing-ring-current' : 'drawing-ring'}
            cx={projection.originX + x * projection.scale}
            cy={projection.originY + y * projection.scale}
            r={index === lit ? 6 : 4}
            strokeWidth={1.5}
          />
        ))}
      </SceneDrawing>
    </div>
  );
}
