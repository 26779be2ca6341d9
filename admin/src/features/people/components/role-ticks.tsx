import { type Role, roleLabels, roles } from '@ellwand/shared/records/roles';
import { FieldError } from '../../../components/ui/field.js';

const roleWork: Readonly<Record<Role, string>> = {
  recorder: 'records, photographs and measures',
  curator: 'reviews, publishes and withdraws',
  desk: 'answers requests for pictures and drawings',
  administrator: 'invites people and sets their roles',
};

interface RoleTicksProps {
  readonly id: string;
  readonly chosen: readonly Role[];
  readonly onChange: (roles: Role[]) => void;
  readonly error?: string;
}

export function RoleTicks({ id, chosen, onChange, error }: RoleTicksProps) {
  return (
    <fieldset id={id} tabIndex={-1} aria-describedby={error ? `${id}-error` : undefined}>
      <legend className="text-table font-medium">Roles</legend>
      {roles.map((role) => (
        <label key={role} className="flex min-h-10 items-center gap-3 py-1 text-table leading-5">
          <input
            type="checkbox"
            className="size-6 shrink-0 accent-indigo"
            checked={chosen.includes(role)}
            onChange={() =>
              onChange(roles.filter((one) => (one === role ? !chosen.includes(one) : chosen.includes(one))))
            }
          />
          <span>
            {roleLabels[role]}, <span className="text-ink-3">{roleWork[role]}</span>
          </span>
        </label>
      ))}
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </fieldset>
  );
}
