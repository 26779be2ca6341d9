import { handlingStepLabels } from '@ellwand/shared/points/point';
import type { OwnPointView } from '@ellwand/shared/records/protocol';
import { Button } from '../../../components/ui/button.js';
import { bandsOf, type DraftRow, moved, withAsking, withoutPoint } from '../model/draft.js';
import { mannerWords } from '../model/protocol-words.js';
import { rowId } from '../model/row-id.js';
import type { DraftDesk } from '../model/use-draft.js';

interface BandListProps {
  readonly desk: DraftDesk;
  readonly current: string | null;
  readonly onLight: (pointId: string) => void;
  readonly onDefine: (own: OwnPointView) => void;
}

/** The points in their three handling steps: a point moves within its step, for the garment is turned once. */
export function BandList({ desk, ...rest }: BandListProps) {
  return (
    <>
      {bandsOf(desk.draft).map(({ step, rows }) => (
        <section key={step} aria-labelledby={`step-${step}`}>
          <h2 id={`step-${step}`} className="text-body font-semibold">
            {handlingStepLabels[step]}
          </h2>
          {rows.length === 0 ? (
            <p className="mt-2 border-t border-ink pt-2 text-table text-ink-3">Nothing is asked for here.</p>
          ) : (
            <ol className="mt-2 border-t border-ink">
              {rows.map((row, index) => (
                <EditedRow
                  key={row.point.id}
                  row={row}
                  isFirst={index === 0}
                  isLast={index === rows.length - 1}
                  desk={desk}
                  {...rest}
                />
              ))}
            </ol>
          )}
        </section>
      ))}
    </>
  );
}

interface EditedRowProps extends BandListProps {
  readonly row: DraftRow;
  readonly isFirst: boolean;
  readonly isLast: boolean;
}

function EditedRow({ row, isFirst, isLast, desk, current, onLight, onDefine }: EditedRowProps) {
  const { point, letter } = row;
  const { draft, change } = desk;
  const own = draft.ownPoints.find(({ id }) => id === point.id);
  const move = (by: -1 | 1) => {
    onLight(point.id);
    change(moved(draft, point.id, by), `“${point.name}” moved ${by < 0 ? 'up' : 'down'}.`);
  };
  return (
    <li
      id={rowId(point.id)}
      tabIndex={-1}
      onFocus={() => onLight(point.id)}
      className={`flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-hair py-2 ${current === point.id ? 'bg-sheet' : ''}`}
    >
      <div className="flex min-w-56 flex-1 items-center gap-3 text-table">
        <span className={`letter ${current === point.id ? 'letter-lit' : ''}`}>{letter}</span>
        <div>
          <p className="font-medium">{point.name}</p>
          <p className="text-label text-ink-3">
            {mannerWords(point)}
            {own && '; the museum’s own'}
          </p>
        </div>
      </div>
      <div className="flex flex-wrap gap-1">
        <div className="flex gap-1">
          <Asking row={row} desk={desk} />
        </div>
        <div className="flex flex-wrap gap-1">
          <Button
            height="dense"
            className="px-2.5"
            aria-disabled={isFirst}
            onClick={() => !isFirst && move(-1)}
          >
            Up <span className="sr-only">{point.name}</span>
          </Button>
          <Button height="dense" className="px-2.5" aria-disabled={isLast} onClick={() => !isLast && move(1)}>
            Down <span className="sr-only">{point.name}</span>
          </Button>
          {own && (
            <Button height="dense" className="px-2.5" onClick={() => onDefine(own)}>
              Change <span className="sr-only">{point.name}</span>
            </Button>
          )}
          <Button
            height="dense"
            className="px-2.5"
            onClick={() => change(withoutPoint(draft, point.id), `“${point.name}” dropped.`)}
          >
            Drop <span className="sr-only">{point.name}</span>
          </Button>
        </div>
      </div>
    </li>
  );
}

const ROUNDS = [1, 2, 3];

/** Whether the point may be left out, and in how many rounds it is read. */
function Asking({ row, desk }: { readonly row: DraftRow; readonly desk: DraftDesk }) {
  const { asked, point } = row;
  const { draft, change } = desk;
  return (
    <>
      <select
        aria-label={`Whether ${point.name} may be left out`}
        className="box min-h-8 w-auto py-0.5 text-table"
        value={asked.required ? 'must' : 'may'}
        onChange={({ target }) => {
          const required = target.value === 'must';
          const said = required ? `“${point.name}” required.` : `“${point.name}” may be left out.`;
          change(withAsking(draft, point.id, { required }), said);
        }}
      >
        <option value="must">Required</option>
        <option value="may">May be left out</option>
      </select>
      <select
        aria-label={`Rounds of ${point.name}`}
        className="box min-h-8 w-auto py-0.5 text-table"
        value={asked.rounds}
        onChange={({ target }) => {
          const rounds = Number(target.value);
          change(withAsking(draft, point.id, { rounds }), `“${point.name}”: ${roundWords(rounds)}.`);
        }}
      >
        {[...new Set([...ROUNDS, asked.rounds])].map((rounds) => (
          <option key={rounds} value={rounds}>
            {roundWords(rounds)}
          </option>
        ))}
      </select>
    </>
  );
}

const roundWords = (rounds: number): string => (rounds === 1 ? '1 round' : `${rounds} rounds`);
