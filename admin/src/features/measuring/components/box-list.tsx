import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Button } from '../../../components/ui/button.js';
import { Refused } from '../../../components/ui/states.js';
import { isProblem } from '../../../lib/problem-error.js';
import { imagesQuery } from '../../media/api/images.js';
import { completeSheet, reopenSheet } from '../api/close-sheet.js';
import { findingsQuery } from '../api/findings.js';
import { sheetQuery } from '../api/sheet.js';
import { describedSoFar } from '../model/use-described.js';
import { boxTasks, type BoxTask } from '../model/box-tasks.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

interface BoxListProps {
  readonly desk: SheetDesk;
  readonly onPoint: (pointId: string) => void;
  readonly onFindings: () => void;
  readonly onNoted: () => void;
}

/** One list of what is still to take, to read again, to photograph, to answer, while the garment is out. */
export function BoxList({ desk, onPoint, onFindings, onNoted }: BoxListProps) {
  const images = useQuery(imagesQuery(desk.sheet.garmentId));
  const tasks = boxTasks({
    rows: desk.rows,
    entries: desk.view.entries,
    findings: desk.findings.data?.findings ?? [],
    views: viewsSoFar(desk, images.data?.map(({ view }) => view) ?? null),
    described: describedSoFar(desk.sheet, desk.view).map(({ thing }) => thing),
  });
  const musts = tasks.filter(({ must }) => must);
  return (
    <div className="space-y-6 p-4">
      <h2 className="title text-title-25">Before it goes back in its box</h2>
      <TaskList
        title="Needed"
        tasks={musts}
        none="Nothing more is needed."
        onPoint={onPoint}
        onFindings={onFindings}
        onNoted={onNoted}
      />
      <TaskList
        title="Worth doing while it is out"
        tasks={tasks.filter(({ must }) => !must)}
        none="Nothing more."
        onPoint={onPoint}
        onFindings={onFindings}
        onNoted={onNoted}
      />
      <Closing desk={desk} unsent={unsentOf(desk.view)} />
    </div>
  );
}

const unsentOf = ({ entries, notes, pictures }: SheetDesk['view']): number =>
  entries.length + notes.length + pictures.length;

/** Pictures that wait on this tablet count as taken. */
function viewsSoFar({ view }: SheetDesk, known: readonly string[] | null): readonly string[] | null {
  return known && [...known, ...view.pictures.map(({ picture }) => picture.view)];
}

interface TaskListProps {
  readonly title: string;
  readonly tasks: readonly BoxTask[];
  readonly none: string;
  readonly onPoint: (pointId: string) => void;
  readonly onFindings: () => void;
  readonly onNoted: () => void;
}

function TaskList({ title, tasks, none, onPoint, onFindings, onNoted }: TaskListProps) {
  return (
    <section>
      <h3 className="text-body font-semibold">{title}</h3>
      {tasks.length === 0 && <p className="text-table text-ink-2">{none}</p>}
      <ul className="mt-1 divide-y divide-hair">
        {tasks.map((task) => (
          <li key={task.sentence} className="flex min-h-12 items-center justify-between gap-4 text-table">
            <span>{task.sentence}</span>
            {task.pointId !== undefined && (
              <Button tone="quiet" className="min-h-11 shrink-0" onClick={() => onPoint(task.pointId ?? '')}>
                Go there<span className="sr-only">: {task.sentence}</span>
              </Button>
            )}
            {task.describe && (
              <Button tone="quiet" className="min-h-11 shrink-0" onClick={onNoted}>
                Note it<span className="sr-only">: {task.sentence}</span>
              </Button>
            )}
            {task.finding && (
              <Button tone="quiet" className="min-h-11 shrink-0" onClick={onFindings}>
                Answer<span className="sr-only">: {task.sentence}</span>
              </Button>
            )}
          </li>
        ))}
      </ul>
    </section>
  );
}

function Closing({ desk, unsent }: { readonly desk: SheetDesk; readonly unsent: number }) {
  const { sheet } = desk;
  const queries = useQueryClient();
  const close = useMutation({
    mutationFn: () =>
      desk.locked ? reopenSheet(sheet.id, sheet.version) : completeSheet(sheet.id, sheet.version),
    onSuccess: (next) => {
      queries.setQueryData(sheetQuery(sheet.id).queryKey, next);
      void queries.invalidateQueries({ queryKey: ['garment', sheet.garmentId] });
    },
    onError: (error) => {
      // Another hand has been at the sheet, or the checks know more than this page: fetch what is so.
      if (isProblem(error)) {
        void queries.invalidateQueries({ queryKey: sheetQuery(sheet.id).queryKey });
        void queries.invalidateQueries({ queryKey: findingsQuery(sheet.id).queryKey });
      }
    },
  });
  return (
    <div className="space-y-3 border-t border-hair pt-4">
      {unsent > 0 && (
        <p className="text-table text-ink-2">The sheet can be completed when all that was keyed is sent.</p>
      )}
      <Button
        tone={desk.locked ? 'plain' : 'action'}
        height="table"
        disabled={close.isPending || unsent > 0}
        onClick={() => close.mutate()}
      >
        {desk.locked ? 'Reopen the sheet' : 'Complete the sheet'}
      </Button>
      <Refused error={close.error} />
    </div>
  );
}
