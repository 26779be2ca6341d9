import type { ViewName } from '@ellwand/shared/drawings/diagram/model';
import { LitDrawing } from '../../components/diagram/lit-drawing';
import { type LitPoints, useLitPoints } from '../../components/diagram/lit-points';
import { SiteLink } from '../../components/ui/site-link';
import { Length } from '../../components/units/length';
import { paths } from '../../config/paths';
import type { DrawnMeasure, DrawnSubject } from './drawn-subject';

const PREFIX = 'opening';
/** With the tape beside it: what stands in half a page, and on a phone. */
const WIDE_PX = 560;
const NARROW_PX = 324;

/** A garment of the catalogue with the lines it was measured along: pointing at a figure lights its line. */
export function LivingDrawing({ subject }: { readonly subject: DrawnSubject }) {
  const { kind, views, viewsWithLines, measures, card } = subject;
  const lit = useLitPoints((pointId) => `${PREFIX}-${pointId}`);
  const letters = new Map(measures.map(({ pointId, letter }) => [pointId, letter]));
  const points = measures.map(({ pointId }) => pointId);
  const sheet = (widthPx: number, shown: readonly ViewName[]) => {
    return { kind, views: shown, points, letters, widthPx, idPrefix: `${PREFIX}-${widthPx}`, tape: true };
  };
  return (
    <figure className="living">
      <LitDrawing sheet={sheet(WIDE_PX, views)} lit={lit} className="living-sheet only-wide" />
      <LitDrawing sheet={sheet(NARROW_PX, viewsWithLines)} lit={lit} className="living-sheet only-narrow" />
      <figcaption>
        <ol className="living-measures">
          {measures.map((measure) => (
            <MeasureRow key={measure.pointId} measure={measure} lit={lit} />
          ))}
        </ol>
        {card && (
          <p>
            Read off{' '}
            <SiteLink className="link" to={paths.garment(card.number)}>
              {card.title}
            </SiteLink>
            , {card.dateDisplay}. The outline is the kind’s; the tape is the outline’s own scale.
          </p>
        )}
      </figcaption>
    </figure>
  );
}

interface MeasureRowProps {
  readonly measure: DrawnMeasure;
  readonly lit: LitPoints;
}

function MeasureRow({ measure: { pointId, letter, label, valueMm }, lit }: MeasureRowProps) {
  return (
    <li
      data-lit={lit.lit === pointId ? '' : undefined}
      onPointerEnter={() => lit.light(pointId)}
      onPointerLeave={() => lit.light(null)}
    >
      <button
        type="button"
        id={`${PREFIX}-${pointId}`}
        aria-pressed={lit.chosen === pointId}
        onClick={() => lit.chooseRow(pointId)}
        onFocus={() => lit.light(pointId)}
        onBlur={() => lit.light(null)}
      >
        <span className="letter" aria-hidden="true">
          {letter}
        </span>
        {label}
        {valueMm !== null && (
          <strong>
            <Length mm={valueMm} />
          </strong>
        )}
      </button>
    </li>
  );
}
