import { unitLabels } from '@ellwand/shared/units/format-length';
import type { ReactNode } from 'react';
import { type FieldPath, useFormContext, useWatch } from 'react-hook-form';
import { Field, type FieldProps, Select, TextField } from '../../../components/ui/field.js';
import { fieldId } from '../../../lib/form-mistakes.js';
import type { TypedSheet } from '../model/typed-sheet.js';

export type BoxName = FieldPath<TypedSheet>;

/** What is to be mended at a box, or at several that belong together. */
export function useMistake(name: BoxName): string | undefined {
  const { getFieldState, formState } = useFormContext<TypedSheet>();
  const message: unknown = getFieldState(name, formState).error?.message;
  return typeof message === 'string' && message !== '' ? message : undefined;
}

/** Id, registration and error of one box of the cut sheet. */
export function useBox(name: BoxName) {
  const { register } = useFormContext<TypedSheet>();
  return { id: fieldId(name), error: useMistake(name), ...register(name) };
}

interface NamedBox {
  readonly name: BoxName;
  readonly label: string;
  readonly hint?: ReactNode;
}

/** A length in the unit of the sheet; a unit that is typed out wins over it. */
export function LengthBox({ name, label, hint }: NamedBox) {
  const { control } = useFormContext<TypedSheet>();
  const unit = useWatch({ control, name: 'unit' });
  const { error, id, ...box } = useBox(name);
  const field: FieldProps = {
    id,
    label,
    hint,
    error,
    remark: <span className="sr-only"> in {unitLabels[unit]}</span>,
  };
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <Field {...field}>
      <span className="flex items-center gap-1.5">
        <input
          type="text"
          inputMode="decimal"
          autoComplete="off"
          id={id}
          className="box figures min-w-0 text-right"
          aria-invalid={error ? true : undefined}
          aria-describedby={described || undefined}
          {...box}
        />
        <span aria-hidden="true" className="w-6 shrink-0 text-label text-ink-3">
          {unit}
        </span>
      </span>
    </Field>
  );
}

/** How many: a whole number. */
export function CountBox({ name, label, hint }: NamedBox) {
  return (
    <TextField
      label={label}
      hint={hint}
      inputMode="numeric"
      autoComplete="off"
      className="figures text-right"
      {...useBox(name)}
    />
  );
}

export function WordsBox({ name, label, hint, optional }: NamedBox & { readonly optional?: boolean }) {
  return <TextField label={label} hint={hint} optional={optional} autoComplete="off" {...useBox(name)} />;
}

/** A choice among words that are kept as ids. */
export function ChoiceBox({
  name,
  label,
  hint,
  choices,
}: NamedBox & { readonly choices: Readonly<Record<string, string>> }) {
  return (
    <Select label={label} hint={hint} {...useBox(name)}>
      {Object.entries(choices).map(([value, words]) => (
        <option key={value} value={value}>
          {words}
        </option>
      ))}
    </Select>
  );
}

/** A box to tick that stands in a row of boxes, its words above it as theirs are. */
export function TickBox({ name, label }: NamedBox) {
  const { register } = useFormContext<TypedSheet>();
  const id = fieldId(name);
  return (
    <div>
      <label htmlFor={id} className="text-table font-medium">
        {label}
      </label>
      <div className="mt-1 flex min-h-10 items-center">
        <input id={id} type="checkbox" className="size-6 accent-indigo" {...register(name)} />
      </div>
    </div>
  );
}
