import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Failed, Refused, Waiting } from '../../../components/ui/states.js';
import { damageReportsQuery, setDamageReports, tellableQuery } from '../api/damage-reports.js';

/** Who is written to when measuring is stopped because damage was seen. */
export function DamageReportsSetting() {
  const reports = useQuery(damageReportsQuery);
  const people = useQuery(tellableQuery);
  const failed = [reports, people].find(({ isError }) => isError);
  return (
    <section aria-labelledby="damage-title">
      <h2 id="damage-title" className="title text-title-25">
        Damage seen at the table
      </h2>
      {failed && <Failed error={failed.error} onRetry={() => void failed.refetch()} />}
      {!failed && !(reports.data && people.data) && <Waiting label="Fetching who is told" rows={2} />}
      {reports.data && people.data && <Ticks chosen={reports.data.userIds} people={people.data} />}
    </section>
  );
}

interface TicksProps {
  readonly chosen: readonly string[];
  readonly people: readonly { readonly id: string; readonly name: string }[];
}

function Ticks({ chosen, people }: TicksProps) {
  const queries = useQueryClient();
  const set = useMutation({
    mutationFn: setDamageReports,
    onSuccess: (next) => queries.setQueryData(damageReportsQuery.queryKey, next),
  });
  const here = chosen.filter((id) => people.some((person) => person.id === id));
  const tick = (id: string) =>
    set.mutate({ userIds: here.includes(id) ? here.filter((one) => one !== id) : [...here, id] });
  return (
    <fieldset className="mt-1">
      <legend className="max-w-text text-table text-ink-2">
        {here.length === 0
          ? 'Every curator is written to. Tick people to write to them instead.'
          : 'Written to when measuring stops because damage was seen:'}
      </legend>
      {people.map(({ id, name }) => (
        <label key={id} className="flex min-h-10 items-center gap-3 py-1 text-table">
          <input
            type="checkbox"
            className="size-6 shrink-0 accent-indigo"
            checked={here.includes(id)}
            disabled={set.isPending}
            onChange={() => tick(id)}
          />
          {name}
        </label>
      ))}
      <Refused error={set.error} />
    </fieldset>
  );
}
