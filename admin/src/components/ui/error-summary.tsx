import { type RefObject, useEffect, useRef } from 'react';

export interface FormMistake {
  /** Id of the box to mend; none where the mistake is of the whole form. */
  readonly fieldId?: string;
  readonly message: string;
}

/**
 * First in the form after a failed submit, with the focus on it: a link for each thing to mend, in the same words
 * as beside the field. `attempt` counts the submits, so that a second failure takes the focus again.
 */
export function ErrorSummary({
  mistakes,
  attempt,
}: {
  readonly mistakes: readonly FormMistake[];
  readonly attempt: number;
}) {
  const summary: RefObject<HTMLDivElement | null> = useRef(null);
  useEffect(() => {
    if (attempt > 0) summary.current?.focus();
  }, [attempt]);
  if (mistakes.length === 0) return null;
  return (
    <div
      ref={summary}
      tabIndex={-1}
      role="group"
      aria-labelledby="error-summary-title"
      className="rounded-sm border-2 border-madder bg-sheet p-4"
    >
      <h2 id="error-summary-title" className="text-body font-semibold text-madder">
        {mistakes.length === 1 ? 'There is one thing to mend' : `There are ${mistakes.length} things to mend`}
      </h2>
      <ul className="mt-2 list-disc space-y-1 pl-5 text-table">
        {mistakes.map(({ fieldId, message }) => (
          <li key={`${fieldId ?? ''} ${message}`}>
            {fieldId ? (
              <a
                href={`#${fieldId}`}
                className="text-madder underline"
                onClick={(event) => goTo(event, fieldId)}
              >
                {message}
              </a>
            ) : (
              message
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** Moves the focus rather than the address: an address with a fragment would be a new place to go back through. */
function goTo(event: { preventDefault(): void }, fieldId: string) {
  event.preventDefault();
  const box = document.getElementById(fieldId);
  box?.scrollIntoView({ block: 'center' });
  box?.focus({ preventScroll: true });
}
