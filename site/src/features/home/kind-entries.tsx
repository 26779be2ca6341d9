import type { CatalogueFront } from '@ellwand/shared/records/site-catalogue';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { Outline } from '../../components/diagram/outline';
import { Tape } from '../../components/diagram/tape';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { counted, isKind, kindsName } from '../../lib/words';

/** Pixels to the millimetre, the same for every outline here. */
const SCALE = 0.105;
const TAPE_PX = 1280;

/** The kinds that the catalogue holds, in outline, all at one scale over the tape that proves it. */
export function KindEntries({ kinds }: { readonly kinds: CatalogueFront['kinds'] }) {
  const shown = kinds.filter((entry): entry is { kind: GarmentKind; count: number } => {
    return isKind(entry.kind) && entry.count > 0;
  });
  if (shown.length === 0) return null;
  return (
    <section className="kinds">
      <div className="wide">
        <h2>By kind of garment</h2>
        <ul>
          {shown.map(({ kind, count }) => (
            <li key={kind}>
              <SiteLink to={paths.kind(kind)}>
                <Outline kind={kind} pxPerMm={SCALE} />
                <span className="kinds-name">{kindsName(kind)}</span>
                <span className="kinds-count">{counted(count, 'garment')}</span>
              </SiteLink>
            </li>
          ))}
        </ul>
        <div className="kinds-tape">
          <Tape lengthPx={TAPE_PX} mmPerPx={1 / SCALE} />
        </div>
        <p className="kinds-note">All outlines and the tape at one scale.</p>
      </div>
    </section>
  );
}
