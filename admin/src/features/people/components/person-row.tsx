import { type Role, roleLabels } from '@ellwand/shared/records/roles';
import type { Person, PersonChange } from '@ellwand/shared/records/session';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { z } from 'zod';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { Refused } from '../../../components/ui/states.js';
import { momentText } from '../../../lib/moments.js';
import { useSession } from '../../../lib/session.js';
import { changePerson } from '../api/people.js';
import { RoleTicks } from './role-ticks.js';

export function PersonRow({ person }: { readonly person: z.infer<typeof Person> }) {
  const { user } = useSession();
  const queries = useQueryClient();
  const [choosing, setChoosing] = useState<readonly Role[] | null>(null);
  const change = useMutation({
    mutationFn: (body: PersonChange) => changePerson(person.id, person.version, body),
    onSuccess: () => setChoosing(null),
    onSettled: () => queries.invalidateQueries({ queryKey: ['people'] }),
  });
  return (
    <tr className="border-b border-hair max-md:grid max-md:py-3">
      <th scope="row" className="py-2 pr-3 text-left font-medium max-md:py-0">
        {person.name}
        <span className="block text-label font-normal text-ink-3">{person.email}</span>
      </th>
      <td className="py-2 pr-3 max-md:py-1">{person.roles.map((role) => roleLabels[role]).join(', ')}</td>
      <td className="figures py-2 pr-3 text-ink-2 max-md:py-0">
        <span className="md:hidden">Last signed in: </span>
        {person.lastSignInAt ? momentText(person.lastSignInAt) : 'never'}
      </td>
      <td className="py-2 pr-3 max-md:py-0">{person.active ? 'Active' : 'Closed'}</td>
      <td className="py-2 text-right max-md:text-left">
        <div className="flex flex-wrap gap-2 md:justify-end">
          <Button height="dense" onClick={() => setChoosing(person.roles)}>
            Change roles <span className="sr-only">of {person.name}</span>
          </Button>
          {person.id !== user.id && (
            <Button
              height="dense"
              disabled={change.isPending}
              onClick={() => change.mutate({ active: !person.active })}
            >
              {person.active ? 'Close access' : 'Open access'}{' '}
              <span className="sr-only">of {person.name}</span>
            </Button>
          )}
        </div>
        {choosing === null && <Refused error={change.error} />}
        <Question
          open={choosing !== null}
          onClose={() => setChoosing(null)}
          title={`Roles of ${person.name}`}
          actions={
            <>
              <Button
                tone="action"
                disabled={change.isPending}
                onClick={() => change.mutate({ roles: [...(choosing ?? [])] })}
              >
                Save the roles
              </Button>
              <Button onClick={() => setChoosing(null)}>Leave them</Button>
            </>
          }
        >
          <RoleTicks
            id={`roles-${person.id}`}
            chosen={choosing ?? []}
            onChange={setChoosing}
            error={choosing?.length === 0 ? 'Choose at least one role' : undefined}
          />
          <Refused error={change.error} />
        </Question>
      </td>
    </tr>
  );
}
