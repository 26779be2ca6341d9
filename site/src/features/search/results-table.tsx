import type { CatalogueCard } from '@ellwand/shared/records/published-garment';
import { SiteLink } from '../../components/ui/site-link';
import { Length, UnitName } from '../../components/units/length';
import { paths } from '../../config/paths';
import { kindName } from '../../lib/words';

/** The same results with a column for each measurement that any of them shows. */
export function ResultsTable({ cards }: { readonly cards: readonly CatalogueCard[] }) {
  const columns = new Map(
    cards.flatMap((card) => card.measurements.map(({ pointId, label }) => [pointId, label])),
  );
  return (
    <div className="table-scroll" tabIndex={0} role="region" aria-labelledby="results-caption">
      <table className="table">
        <caption id="results-caption" className="table-caption">
          Measurements in <UnitName />, inside of the garment as fastened
        </caption>
        <thead>
          <tr>
            <th scope="col">Garment</th>
            <th scope="col">Kind</th>
            <th scope="col">Date</th>
            {[...columns].map(([pointId, label]) => (
              <th key={pointId} scope="col" className="text-end">
                {label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {cards.map((card) => (
            <tr key={card.number}>
              <th scope="row">
                <SiteLink to={paths.garment(card.number)} className="link">
                  {card.title}
                </SiteLink>
              </th>
              <td>{kindName(card.kind)}</td>
              <td className="whitespace-nowrap">{card.dateDisplay}</td>
              {[...columns.keys()].map((pointId) => (
                <td key={pointId} className="text-end">
                  <Cell card={card} pointId={pointId} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Cell({ card, pointId }: { readonly card: CatalogueCard; readonly pointId: string }) {
  const measurement = card.measurements.find((each) => each.pointId === pointId);
  if (!measurement) return <span className="sr-only">not among those shown</span>;
  return <Length mm={measurement.valueMm} bare />;
}
