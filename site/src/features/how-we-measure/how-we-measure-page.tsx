import { measuringPoints } from '@ellwand/shared/points/measuring-points';
import { groups } from '@ellwand/shared/points/groups';
import { kindIds } from '@ellwand/shared/points/kinds';
import { useSearchParams } from 'react-router-dom';
import { Outline } from '../../components/diagram/outline';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { kindsName } from '../../lib/words';
import { kindOf } from './kind-of';
import { KindPoints } from './kind-points';
import { PointEntry } from './point-entry';

const SCALE = 0.05;

/** One kind of part with its diagram and points, the way to all others, then every point in full. */
export function HowWeMeasurePage() {
  const [params] = useSearchParams();
  const shown = kindOf(params);
  return (
    <div className="wide">
      <header className="how-heading">
        <h1>How we measure</h1>
        <div className="how-rules">
          <p>
            Two people at a clean table: one reads the tape, the other holds its end and steadies the garment.
            In millimetres, inside the opened garment, from fastening to fastening and not from the edge of
            the cloth, because plackets overlap. The garment is turned over once, and the points come in that
            order.
          </p>
          <p>
            What can be worked out is not measured. A published figure is the mean of its readings; its ±
            tells how far it can be trusted, from the step of the tape, the way it lay, each join of tape
            lengths and how far the readings lay apart. A garment’s measure is not its wearer’s, nor a modern
            size.
          </p>
        </div>
      </header>
      <nav aria-label="Kinds of part" className="how-kinds">
        <ul>
          {kindIds.map((kind) => (
            <li key={kind}>
              <SiteLink to={paths.kindMeasured(kind)} aria-current={kind === shown ? 'page' : undefined}>
                <Outline kind={kind} pxPerMm={SCALE} />
                <span>{kindsName(kind)}</span>
              </SiteLink>
            </li>
          ))}
        </ul>
      </nav>
      <KindPoints key={shown} kind={shown} />
      <section className="how-points" aria-labelledby="every-point">
        <h2 id="every-point">Every measuring point</h2>
        {groups.map(({ id, label }) => (
          <section key={id} aria-labelledby={`group-${id}`}>
            <h3 id={`group-${id}`}>{label}</h3>
            {measuringPoints
              .filter((point) => point.group === id)
              .map((point) => (
                <PointEntry key={point.id} point={point} />
              ))}
          </section>
        ))}
      </section>
    </div>
  );
}
