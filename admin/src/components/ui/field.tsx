import type { InputHTMLAttributes, ReactNode, SelectHTMLAttributes, TextareaHTMLAttributes } from 'react';

export interface FieldProps {
  readonly id: string;
  readonly label: string;
  /** One sentence above the box. There are no placeholders. */
  readonly hint?: ReactNode;
  readonly error?: string;
  readonly optional?: boolean;
  /** After the label: "never public". */
  readonly remark?: ReactNode;
}

/** The ids of a box's hint and error, for `aria-describedby`: the field joins them, no caller can drop one. */
function describedBy({ id, hint, error }: FieldProps): string | undefined {
  return [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ') || undefined;
}

/** Label, hint, box and error, tied together for everybody. */
export function Field({ children, ...field }: FieldProps & { readonly children: ReactNode }) {
  const { id, label, hint, error, optional, remark } = field;
  return (
    <div>
      <label htmlFor={id} className="text-table font-medium">
        {label}
        {optional && <span className="font-normal text-ink-3"> (optional)</span>}
        {remark}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="max-w-text text-label text-ink-3">
          {hint}
        </p>
      )}
      <div className="mt-1">{children}</div>
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </div>
  );
}

export function FieldError({ id, children }: { readonly id: string; readonly children: ReactNode }) {
  return (
    <p id={id} className="mt-1 flex items-start gap-1.5 text-label font-medium text-madder">
      <svg viewBox="0 0 16 16" className="mt-0.5 size-3.5 shrink-0 fill-current" aria-hidden="true">
        <path d="M8 1 15.5 15H.5Z M7.2 6v4.4h1.6V6Zm0 5.6v1.6h1.6v-1.6Z" fillRule="evenodd" />
      </svg>
      <span>
        <span className="sr-only">Error: </span>
        {children}
      </span>
    </p>
  );
}

function boxAttributes(field: FieldProps) {
  return {
    id: field.id,
    'aria-describedby': describedBy(field),
    'aria-invalid': field.error ? (true as const) : undefined,
  };
}

function splitField<P extends FieldProps>({ id, label, hint, error, optional, remark, ...box }: P) {
  return { field: { id, label, hint, error, optional, remark }, box };
}

export function TextField(props: FieldProps & InputHTMLAttributes<HTMLInputElement>) {
  const { field, box } = splitField(props);
  return (
    <Field {...field}>
      <input type="text" {...box} {...boxAttributes(field)} className={`box ${box.className ?? ''}`} />
    </Field>
  );
}

export function TextArea(props: FieldProps & TextareaHTMLAttributes<HTMLTextAreaElement>) {
  const { field, box } = splitField(props);
  return (
    <Field {...field}>
      <textarea rows={3} {...box} {...boxAttributes(field)} className={`box ${box.className ?? ''}`} />
    </Field>
  );
}

export function Select(props: FieldProps & SelectHTMLAttributes<HTMLSelectElement>) {
  const { field, box } = splitField(props);
  return (
    <Field {...field}>
      <select {...box} {...boxAttributes(field)} className={`box ${box.className ?? ''}`} />
    </Field>
  );
}

/** A box to tick, with its words beside it. */
export function Tick({ id, label, hint, ...box }: FieldProps & InputHTMLAttributes<HTMLInputElement>) {
  return (
    <div className="flex items-start gap-3">
      <input
        {...box}
        id={id}
        type="checkbox"
        aria-describedby={hint ? `${id}-hint` : undefined}
        className="mt-0.5 size-6 shrink-0 accent-indigo"
      />
      <div>
        <label htmlFor={id} className="text-table font-medium">
          {label}
        </label>
        {hint && (
          <p id={`${id}-hint`} className="max-w-text text-label text-ink-3">
            {hint}
          </p>
        )}
      </div>
    </div>
  );
}
