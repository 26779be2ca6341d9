import type { ReactNode } from 'react';
import { isProblem, NoAnswer } from '../../lib/problem-error.js';
import { Button } from './button.js';

/** Something is on its way. Silent for 300 ms; then grey rows in the shape of what will come. */
export function Waiting({ label, rows = 6 }: { readonly label: string; readonly rows?: number }) {
  return (
    <div role="status" className="dim-late">
      <span className="sr-only">{label}</span>
      <div aria-hidden="true" className="space-y-2">
        {Array.from({ length: rows }, (_, row) => (
          <div key={row} className="h-11 rounded-sm bg-well" />
        ))}
      </div>
    </div>
  );
}

/** What an error says to a person, in one sentence. */
export function errorSentence(error: unknown): string {
  if (error instanceof NoAnswer) return error.message;
  if (isProblem(error, 'permission.refused'))
    return 'Your role does not include this. An administrator can change that.';
  return error instanceof Error ? error.message : 'Something went wrong.';
}

/** Asking failed: says why, and offers the one thing that can be done. */
export function Failed({ error, onRetry }: { readonly error: unknown; readonly onRetry?: () => void }) {
  return (
    <div role="alert" className="rounded-sm border border-madder bg-madder-tint p-4 text-table">
      <p className="font-medium text-madder">This could not be shown</p>
      <p className="mt-1 text-ink">{errorSentence(error)}</p>
      {onRetry && (
        <Button className="mt-3" onClick={onRetry}>
          Try again
        </Button>
      )}
    </div>
  );
}

/** A request that a button made was refused: said beside the button. */
export function Refused({ error }: { readonly error: unknown }) {
  if (!error) return null;
  return (
    <p
      role="alert"
      className="rounded-sm border border-madder bg-madder-tint px-3 py-2 text-table text-madder"
    >
      <span className="font-medium">Not done: </span>
      <span className="text-ink">{errorSentence(error)}</span>
    </p>
  );
}

/** Nothing here: says why, and gives one next step. */
export function Empty({
  title,
  children,
  step,
}: {
  readonly title: string;
  readonly children?: ReactNode;
  readonly step?: ReactNode;
}) {
  return (
    <div className="rounded-sm border border-dashed border-rule p-8 text-center">
      <p className="title text-title-25">{title}</p>
      {children && <p className="mx-auto mt-2 max-w-text text-table text-ink-2">{children}</p>}
      {step && <div className="mt-4">{step}</div>}
    </div>
  );
}
