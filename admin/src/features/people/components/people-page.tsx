import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Page } from '../../../components/ui/page.js';
import { Paging } from '../../../components/ui/paging.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { peopleQuery } from '../api/people.js';
import { DamageReportsSetting } from './damage-reports.js';
import { InvitationList } from './invitation-list.js';
import { InviteForm } from './invite-form.js';
import { PersonRow } from './person-row.js';

const SIZE = 50;

export function PeoplePage() {
  const [page, setPage] = useState(1);
  const people = useQuery(peopleQuery(page, SIZE));
  return (
    <Page title="People">
      <div className="grid gap-10 lg:grid-cols-[minmax(0,1fr)_22rem] lg:items-start">
        <div className="space-y-10">
          {people.isPending && <Waiting label="Fetching the people" />}
          {people.isError && <Failed error={people.error} onRetry={() => void people.refetch()} />}
          {people.data && (
            <div>
              <table className="w-full text-table max-md:block">
                <caption className="sr-only">Everybody who has been let into the Workroom</caption>
                <thead className="border-b border-ink text-left text-label text-ink-2 max-md:sr-only">
                  <tr>
                    <th scope="col" className="py-2 pr-3 font-medium">
                      Name
                    </th>
                    <th scope="col" className="py-2 pr-3 font-medium">
                      Roles
                    </th>
                    <th scope="col" className="py-2 pr-3 font-medium">
                      Last signed in
                    </th>
                    <th scope="col" className="py-2 pr-3 font-medium">
                      Access
                    </th>
                    <th scope="col">
                      <span className="sr-only">Change</span>
                    </th>
                  </tr>
                </thead>
                <tbody className="max-md:block">
                  {people.data.items.map((person) => (
                    <PersonRow key={person.id} person={person} />
                  ))}
                </tbody>
              </table>
              <Paging {...people.data} onPage={setPage} />
            </div>
          )}
          <InvitationList />
          <DamageReportsSetting />
        </div>
        <InviteForm />
      </div>
    </Page>
  );
}
