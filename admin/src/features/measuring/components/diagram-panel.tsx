import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { type ViewName, viewOfPoint } from '@ellwand/shared/drawings/diagram/model';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { extraLinesOf } from '@ellwand/shared/protocols/extra-lines';
import { paintProtocol } from '@ellwand/shared/protocols/own-lines';
import type { WornSide } from '@ellwand/shared/readings/worn-side';
import type { OwnPointView } from '@ellwand/shared/records/protocol';
import { memo, useMemo, useState } from 'react';
import { mannerOf, type SheetPoint } from '../model/sheet-points.js';
import { SceneDrawing } from '../../../components/drawing/scene-drawing.js';

interface DiagramPanelProps {
  readonly kind: GarmentKind;
  readonly points: readonly SheetPoint[];
  /** The museum's own points of the sheet's protocol, for their lines. */
  readonly ownPoints: readonly OwnPointView[];
  readonly current: SheetPoint;
  /** The wearer's side that is being read, where left and right are told apart: the line lies there. */
  readonly worn: WornSide | null;
  readonly onChoose: (pointId: string) => void;
}

/** The view on which the current point lies, its line lit, and beneath it the one instruction that matters now. */
export const DiagramPanel = memo(Diagram);

function Diagram({ kind, points, ownPoints, current, worn, onChoose }: DiagramPanelProps) {
  const diagram = diagramFor(kind);
  const ownLine = ownPoints.find(({ id }) => id === current.id)?.line;
  const own = ownLine?.view ?? (diagram && viewOfPoint(diagram, current.id));
  const [looking, setLooking] = useState<{ view: ViewName; at: string } | null>(null);
  // A view that was chosen by hand holds until the work moves to another point.
  const view = looking?.at === current.id ? looking.view : (own ?? diagram?.views[0]?.name);
  const scene = useMemo(
    () =>
      view &&
      paintProtocol(
        {
          kind,
          views: [view],
          widthPx: 368,
          current: current.id,
          ...(worn ? { wornSide: worn } : {}),
          points: points.map(({ id }) => id),
          letters: new Map(points.map(({ id, letter }) => [id, letter])),
        },
        extraLinesOf(ownPoints),
      )?.scene,
    [kind, view, current.id, worn, points, ownPoints],
  );
  return (
    <section
      aria-label="Diagram"
      className="grid gap-4 bg-sheet p-4 max-md:grid-cols-[10rem_minmax(0,1fr)] max-md:gap-3 max-md:p-3 md:h-full md:content-start"
    >
      {scene && (
        <div className="mx-auto w-full max-w-md shrink-0">
          <SceneDrawing
            key={`${view ?? ''}`}
            scene={scene}
            current={current.id}
            onChoose={onChoose}
            className="max-h-[26rem] w-full max-md:max-h-44"
          />
        </div>
      )}
      {diagram && diagram.views.length > 1 && (
        <div
          role="group"
          aria-label="View"
          className="flex flex-wrap justify-center gap-2 max-md:order-last max-md:col-span-2"
        >
          {diagram.views.map(({ name }) => (
            <button
              key={name}
              type="button"
              aria-pressed={name === view}
              onClick={() => setLooking({ view: name, at: current.id })}
              className="min-h-11 rounded-sm border border-rule px-3 text-label aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper"
            >
              {viewWords[name]}
            </button>
          ))}
        </div>
      )}
      <Instruction current={current} />
    </section>
  );
}

const viewWords: Readonly<Record<ViewName, string>> = {
  front: 'Front',
  back: 'Back',
  inside: 'Inside',
  side: 'Side',
  below: 'Below',
};

function Instruction({ current }: { readonly current: SheetPoint }) {
  const { point, letter } = current;
  return (
    <div aria-live="polite" className="max-md:text-label">
      <h2 className="flex items-center gap-2 text-body font-semibold">
        <span className="letter letter-lit" aria-hidden="true">
          {letter}
        </span>
        {point.name}
      </h2>
      <p className="mt-2 text-table text-ink max-md:hidden">{point.definition}</p>
      <p className="mt-1 text-table text-ink-2">
        From {point.from} to {point.to}. {mannerOf(current)}
      </p>
      <p className="mt-1 text-table text-ink-2 max-md:hidden">{point.watchFor}</p>
    </div>
  );
}
