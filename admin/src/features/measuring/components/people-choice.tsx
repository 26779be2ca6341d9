import { type duties, dutyLabels } from '@ellwand/shared/records/hands';
import { FieldError } from '../../../components/ui/field.js';

type Duty = (typeof duties)[number];
interface Named {
  readonly userId: string;
  readonly duty: Duty;
}

interface PeopleChoiceProps {
  readonly id: string;
  readonly colleagues: readonly { readonly id: string; readonly name: string }[];
  readonly people: readonly Named[];
  readonly onChange: (people: readonly Named[]) => void;
  readonly error?: string;
}

const columns: readonly (readonly [Duty, string])[] = [
  ['read', 'Read'],
  ['held', 'Held'],
  ['wrote', 'Wrote'],
];

/** Who did what at the table. One person may do several things; reading and holding take two. */
export function PeopleChoice({ id, colleagues, people, onChange, error }: PeopleChoiceProps) {
  const has = (userId: string, duty: Duty) =>
    people.some((one) => one.userId === userId && one.duty === duty);
  const toggle = (userId: string, duty: Duty) =>
    onChange(
      has(userId, duty)
        ? people.filter((one) => one.userId !== userId || one.duty !== duty)
        : [...people, { userId, duty }],
    );
  return (
    <fieldset id={id} tabIndex={-1} aria-describedby={error ? `${id}-hint ${id}-error` : `${id}-hint`}>
      <legend className="title text-title-25">Who measured</legend>
      <p id={`${id}-hint`} className="text-label text-ink-3">
        One reads and keys, another holds the end of the tape. Whoever is named here cannot approve these
        measurements.
      </p>
      <table className="mt-2 w-full text-table">
        <caption className="sr-only">Colleagues and what they did</caption>
        <thead className="border-b border-ink text-label text-ink-2">
          <tr>
            <th scope="col" className="text-left font-medium">
              Name
            </th>
            {columns.map(([duty, label]) => (
              <th key={duty} scope="col" className="w-16 font-medium">
                {label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {colleagues.map(({ id: userId, name }) => (
            <tr key={userId} className="border-b border-hair">
              <th scope="row" className="text-left font-normal">
                {name}
              </th>
              {columns.map(([duty]) => (
                <td key={duty} className="text-center">
                  <label className="inline-grid size-11 place-items-center">
                    <span className="sr-only">
                      {name}: {dutyLabels[duty]}
                    </span>
                    <input
                      type="checkbox"
                      checked={has(userId, duty)}
                      onChange={() => toggle(userId, duty)}
                      className="size-6 shrink-0 accent-indigo"
                    />
                  </label>
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </fieldset>
  );
}
