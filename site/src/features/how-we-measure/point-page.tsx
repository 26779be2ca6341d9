import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { groupLabels } from '@ellwand/shared/points/groups';
import { lettersFor } from '@ellwand/shared/protocols/protocol';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { toMmString } from '@ellwand/shared/units/length';
import { useMemo } from 'react';
import { useLoaderData } from 'react-router-dom';
import { useLitPoints } from '../../components/diagram/lit-points';
import { MeasuringDiagram } from '../../components/diagram/measuring-diagram';
import { SiteLink } from '../../components/ui/site-link';
import { Length } from '../../components/units/length';
import { paths } from '../../config/paths';
import { kindName } from '../../lib/words';
import { NotFoundPage } from '../../components/notices/not-found-page';
import { PointFacts } from './point-facts';

/** One measuring point: the address that every published figure of it links to. */
export function PointPage() {
  const point = findMeasuringPoint(useLoaderData<string | null>() ?? '');
  if (!point) return <NotFoundPage />;
  const [kind] = point.kinds;
  return (
    <article className="wide point">
      <div className="point-words">
        <p>
          <SiteLink className="link" to={paths.howWeMeasure()}>
            How we measure
          </SiteLink>
        </p>
        <h1>{point.name}</h1>
        <p className="point-definition">{point.definition}</p>
        <PointFacts point={point} />
        <h2>On which parts</h2>
        <p>{point.kinds.map(kindName).join(', ')}</p>
        <h2>Usual figures</h2>
        <p>
          From <Length mm={toMmString(point.softRange.from)} /> to{' '}
          <Length mm={toMmString(point.softRange.to)} />. A reading outside is asked about at the table, never
          refused. {point.softRange.basis}
        </p>
        <p>
          <SiteLink className="button-quiet" to={paths.search(`measure=${point.group}%3A0..`)}>
            Garments with a measure of: {groupLabels[point.group].toLowerCase()}
          </SiteLink>
        </p>
      </div>
      {kind && !point.wornTogether && <PointDiagram kind={kind} pointId={point.id} />}
    </article>
  );
}

function PointDiagram({ kind, pointId }: { readonly kind: GarmentKind; readonly pointId: string }) {
  const points = useMemo(() => [pointId], [pointId]);
  const letters = useMemo(() => new Map<string, string>(lettersFor(protocolFor(kind))), [kind]);
  const lit = useLitPoints((id) => id);
  return <MeasuringDiagram kind={kind} points={points} letters={letters} lit={lit} prefix="point" />;
}
