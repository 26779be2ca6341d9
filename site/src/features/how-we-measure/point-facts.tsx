import type { CataloguedPoint } from '@ellwand/shared/points/measuring-points';
import { handlingStepLabels, howLabels, sideLabels } from '@ellwand/shared/points/point';

/** From where to where, how the tape lies, and what goes wrong. */
export function PointFacts({ point }: { readonly point: CataloguedPoint }) {
  return (
    <dl className="facts facts-small">
      <div>
        <dt>From</dt>
        <dd>{point.from}</dd>
      </div>
      <div>
        <dt>To</dt>
        <dd>{point.to}</dd>
      </div>
      <div>
        <dt>How</dt>
        <dd>
          {sideLabels[point.side]}, {howLabels[point.how]}
        </dd>
      </div>
      <div>
        <dt>When</dt>
        <dd>{handlingStepLabels[point.handlingStep]}</dd>
      </div>
      <div>
        <dt>Watch for</dt>
        <dd>{point.watchFor}</dd>
      </div>
    </dl>
  );
}
