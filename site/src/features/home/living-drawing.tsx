import { paintDiagram } from '@ellwand/shared/drawings/diagram/paint-diagram';
import { type CatalogueCard } from '@ellwand/shared/records/published-garment';
import { useMemo } from 'react';
import { useLitPoints } from '../../components/diagram/lit-points';
import { SceneDrawing } from '../../components/diagram/scene-drawing';
import { sheetScale } from '../../components/diagram/sheet-scale';
import { Tape } from '../../components/diagram/tape';
import { SiteLink } from '../../components/ui/site-link';
import { Length } from '../../components/units/length';
import { paths } from '../../config/paths';
import { chooseSubject, type DrawnMeasure } from './drawn-subject';

const WIDTH_PX = 560;
const PREFIX = 'opening';

/** A garment of the catalogue with the lines it was measured along: pointing at a figure lights its line. */
export function LivingDrawing({ newest }: { readonly newest: readonly CatalogueCard[] }) {
  const { kind, measures, card } = useMemo(() => chooseSubject(newest), [newest]);
  const lit = useLitPoints((pointId) => `${PREFIX}-${pointId}`);
  const scene = useMemo(() => {
    const letters = new Map(measures.map(({ pointId, letter }) => [pointId, letter]));
    const points = measures.map(({ pointId }) => pointId);
    return paintDiagram({ kind, points, letters, views: ['front', 'back'], widthPx: WIDTH_PX, idPrefix: PREFIX });
  }, [kind, measures]);
  if (!scene) return null;
  const mmPerPx = 1 / sheetScale(kind, ['front', 'back'], WIDTH_PX);
  return (
    <figure className="living">
      <div className="living-sheet">
        <Tape upright lengthPx={scene.height} mmPerPx={mmPerPx} />
        <SceneDrawing scene={scene} lit={lit} />
      </div>
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
  readonly lit: ReturnType<typeof useLitPoints>;
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
