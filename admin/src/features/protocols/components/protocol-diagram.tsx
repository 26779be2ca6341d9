import type { ViewName } from '@ellwand/shared/drawings/diagram/model';
import { viewOfPoint } from '@ellwand/shared/drawings/diagram/model';
import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { lettersFor } from '@ellwand/shared/protocols/protocol';
import { extraLinesOf } from '@ellwand/shared/protocols/extra-lines';
import { paintProtocol } from '@ellwand/shared/protocols/own-lines';
import { useMemo, useState } from 'react';
import { SceneDrawing } from '../../../components/drawing/scene-drawing.js';
import { ViewChoice } from '../../../components/drawing/view-choice.js';
import { type Draft, protocolOf } from '../model/draft.js';

interface ProtocolDiagramProps {
  readonly draft: Draft;
  /** The point that is lit, on its own view. */
  readonly current: string | null;
  readonly onChoose?: (pointId: string) => void;
}

/** The protocol as it will stand beside the sheet: each point's line with its letter. */
export function ProtocolDiagram({ draft, current, onChoose }: ProtocolDiagramProps) {
  const diagram = diagramFor(draft.kind);
  const own = draft.ownPoints.find(({ id }) => id === current)?.line.view;
  const itsView = own ?? (diagram && current ? viewOfPoint(diagram, current) : undefined);
  const [looking, setLooking] = useState<{ view: ViewName; at: string | null } | null>(null);
  // A view that was chosen by hand holds until another point is chosen.
  const view = (looking?.at === current ? looking.view : itsView) ?? diagram?.views[0]?.name;
  if (!diagram || !view) return null;
  return (
    <section aria-label="Diagram" className="grid gap-3 border border-hair bg-sheet p-4">
      <PaintedView draft={draft} view={view} current={current} onChoose={onChoose} />
      <ViewChoice
        views={diagram.views.map(({ name }) => name)}
        view={view}
        onChoose={(next) => setLooking({ view: next, at: current })}
      />
    </section>
  );
}

function PaintedView({ draft, view, current, onChoose }: ProtocolDiagramProps & { readonly view: ViewName }) {
  const painted = useMemo(() => {
    const protocol = protocolOf(draft);
    const request = { kind: draft.kind, views: [view], widthPx: 400, letters: lettersFor(protocol) };
    return paintProtocol(
      { ...request, ...(current ? { current } : {}), idPrefix: 'protocol' },
      extraLinesOf(protocol.ownPoints),
    );
  }, [draft, view, current]);
  return (
    painted && (
      <SceneDrawing
        scene={painted.scene}
        className="max-h-[32rem] w-full max-md:max-h-80"
        current={current ?? undefined}
        onChoose={onChoose}
      />
    )
  );
}
