import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { Button } from '../../../components/ui/button.js';
import { Page } from '../../../components/ui/page.js';
import { Paging } from '../../../components/ui/paging.js';
import { Empty, Failed, Waiting } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { momentText } from '../../../lib/moments.js';
import { auditQuery } from '../api/audit.js';

const SIZE = 50;

/** Who did what, when. Written once, never changed. */
export function AuditPage() {
  const [search, setSearch] = useSearchParams();
  const subjectId = search.get('subjectId') ?? undefined;
  const page = Math.max(1, Number(search.get('page')) || 1);
  const audit = useQuery(auditQuery({ page, size: SIZE, subjectId }));
  const go = (next: number) =>
    setSearch({ ...(subjectId ? { subjectId } : {}), ...(next > 1 ? { page: String(next) } : {}) });
  return (
    <Page
      title="Audit trail"
      lead="Newest first. Entries are added and never changed."
      aside={subjectId && <Button onClick={() => setSearch({})}>Show everything</Button>}
    >
      {audit.isPending && <Waiting label="Fetching the audit trail" rows={10} />}
      {audit.isError && <Failed error={audit.error} onRetry={() => void audit.refetch()} />}
      {audit.data?.total === 0 && (
        <Empty title="Nothing has been done yet">Every change to a record is noted here.</Empty>
      )}
      {audit.data && audit.data.total > 0 && (
        <>
          <table className="w-full bg-sheet text-table">
            <caption className="sr-only">What was done, newest first</caption>
            <thead className="border-b border-ink text-left text-label text-ink-2 max-md:sr-only">
              <tr>
                <th scope="col" className="px-3 py-2 font-medium">
                  When
                </th>
                <th scope="col" className="px-3 py-2 font-medium">
                  Who
                </th>
                <th scope="col" className="px-3 py-2 font-medium">
                  What
                </th>
              </tr>
            </thead>
            <tbody>
              {audit.data.items.map(({ id, at, actor, summary, subjectKind, subjectId: subject }) => (
                <tr key={id} className="border-b border-hair align-top max-md:grid max-md:py-2">
                  <td className="figures whitespace-nowrap px-3 py-2 text-ink-2 max-md:py-0">
                    {momentText(at)}
                  </td>
                  <td className="whitespace-nowrap px-3 py-2 max-md:py-0">{actor ?? 'Ellwand'}</td>
                  <td className="px-3 py-2 max-md:py-0">
                    {subjectKind === 'garment' && subject ? (
                      <Link to={paths.garment(subject)} className="text-indigo underline underline-offset-4">
                        {summary}
                      </Link>
                    ) : (
                      summary
                    )}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
          <Paging {...audit.data} onPage={go} />
        </>
      )}
    </Page>
  );
}
