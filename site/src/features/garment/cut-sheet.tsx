import { type Cell, type CutRow, type CutTable, saidColumns } from '@ellwand/shared/cut-sheet/cut-table';
import { cutTables } from '@ellwand/shared/cut-sheet/cut-tables';
import type { PublishedPart } from '@ellwand/shared/records/published-garment';
import { Length, Uncertainty } from '../../components/units/length';

/** What a maker needs of a part beyond its girths: its pieces and how they are put together. */
export function CutSheet({ part, id }: { readonly part: PublishedPart; readonly id: string }) {
  if (!part.cutSheet) return null;
  const tables = cutTables(part.cutSheet);
  if (tables.length === 0 && part.cutSheet.note === '') return null;
  return (
    <div className="cut-sheet">
      <h2>How the {part.name.toLowerCase()} is cut</h2>
      <p className="cut-note">
        Seam to seam as it lies finished, pleats closed and gathers drawn up. A panel that was cut twice
        counts twice.
      </p>
      {part.cutSheet.note && <p className="cut-said">{part.cutSheet.note}</p>}
      <div className="cut-tables">
        {tables.map((table) => (
          <CutTableShown key={table.id} table={table} of={part.name.toLowerCase()} id={`${id}-${table.id}`} />
        ))}
      </div>
    </div>
  );
}

/** Only the columns in which anything is said. A wide one is scrolled by itself, also by keyboard. */
function CutTableShown({
  table,
  of,
  id,
}: {
  readonly table: CutTable;
  /** The part, for whoever jumps from table to table without seeing where they stand. */
  readonly of: string;
  readonly id: string;
}) {
  const places = saidColumns(table);
  return (
    <div className="cut-table">
      <h3 id={id}>{table.title}</h3>
      <div className="cut-table-room" role="region" aria-label={`${table.title} of the ${of}`} tabIndex={0}>
        <table>
          <thead>
            <tr>
              <th scope="col">{table.head}</th>
              {places.map((place) => (
                <th
                  key={place}
                  scope="col"
                  className={table.columns[place]?.figures ? 'text-end' : undefined}
                >
                  {table.columns[place]?.label}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {table.rows.map((row) => (
              <Row key={row.key} row={row} table={table} places={places} />
            ))}
          </tbody>
          {table.sums && table.sums.length > 0 && (
            <tfoot>
              {table.sums.map((row) => (
                <Row key={row.key} row={row} table={table} places={places} />
              ))}
            </tfoot>
          )}
        </table>
      </div>
    </div>
  );
}

interface RowProps {
  readonly row: CutRow;
  readonly table: CutTable;
  readonly places: readonly number[];
}

function Row({ row, table, places }: RowProps) {
  return (
    <tr>
      <th scope="row">{row.head}</th>
      {places.map((place) => (
        <td key={place} className={table.columns[place]?.figures ? 'text-end' : undefined}>
          <Said cell={row.cells[place] ?? []} />
        </td>
      ))}
    </tr>
  );
}

function Said({ cell }: { readonly cell: Cell }) {
  return cell.map((said, index) => (
    <span key={index}>
      {index > 0 && ' '}
      {typeof said === 'string' ? (
        said
      ) : (
        <>
          <Length mm={said.mm} uncertaintyMm={said.uncertaintyMm} />
          {said.uncertaintyMm !== undefined && (
            <span className="measures-uncertainty">
              {' '}
              ± <Uncertainty mm={said.uncertaintyMm} />
            </span>
          )}
        </>
      )}
    </span>
  ));
}
