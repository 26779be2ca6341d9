import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { handlingStepLabels, handlingSteps } from '@ellwand/shared/points/point';
import { lettersFor, pointsOf as protocolPoints } from '@ellwand/shared/protocols/protocol';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { useMemo } from 'react';
import { useLitPoints } from '../../components/diagram/lit-points';
import { MeasuringDiagram } from '../../components/diagram/measuring-diagram';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { kindsName } from '../../lib/words';

/** A kind's points in handling order, beside its diagram where there is one. */
export function KindPoints({ kind }: { readonly kind: GarmentKind }) {
  const { letters, points, entries } = useMemo(() => pointsOf(kind), [kind]);
  const lit = useLitPoints((pointId) => `${kind}-${pointId}`);
  return (
    <section className="how-kind" id={`kind-${kind}`} aria-labelledby={`title-${kind}`}>
      <h2 id={`title-${kind}`}>{kindsName(kind)}</h2>
      <MeasuringDiagram kind={kind} points={points} letters={letters} lit={lit} prefix={`how-${kind}`} />
      <div className="how-steps">
        {handlingSteps.map((step) => {
          const here = entries.filter((entry) => entry.step === step);
          if (here.length === 0) return null;
          return (
            <div key={step}>
              <h3>{handlingStepLabels[step]}</h3>
              <ul>
                {here.map(({ pointId, name, letter }) => (
                  <li
                    key={pointId}
                    data-lit={lit.lit === pointId ? '' : undefined}
                    onPointerEnter={() => lit.light(pointId)}
                    onPointerLeave={() => lit.light(null)}
                    onFocus={() => lit.light(pointId)}
                    onBlur={() => lit.light(null)}
                  >
                    <span className="letter" aria-hidden="true">
                      {letter}
                    </span>
                    <SiteLink to={paths.point(pointId)}>
                      <span id={`${kind}-${pointId}`}>{name}</span>
                    </SiteLink>
                  </li>
                ))}
              </ul>
            </div>
          );
        })}
      </div>
    </section>
  );
}

function pointsOf(kind: GarmentKind) {
  const letters = new Map<string, string>(lettersFor(protocolFor(kind)));
  const points = [...letters.keys()];
  const entries = protocolPoints(protocolFor(kind)).map(({ id, name, handlingStep }) => ({
    pointId: id,
    letter: letters.get(id) ?? '',
    name,
    step: handlingStep,
  }));
  return { letters, points, entries };
}
