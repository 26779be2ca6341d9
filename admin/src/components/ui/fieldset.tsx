import type { ReactNode } from 'react';

/** Boxes that belong together, under a title of their own. */
export function Fieldset({
  legend,
  hint,
  children,
}: {
  readonly legend: string;
  readonly hint?: ReactNode;
  readonly children: ReactNode;
}) {
  return (
    <fieldset className="min-w-0 border-t border-hair pt-5">
      <legend className="title float-left mb-4 w-full text-title-25">{legend}</legend>
      <div className="clear-both space-y-5">
        {hint && <p className="max-w-text text-label text-ink-3">{hint}</p>}
        {children}
      </div>
    </fieldset>
  );
}

/** Beside the label of what never leaves the Workroom. */
export function NeverPublic() {
  return (
    <span className="ml-2 rounded-sm bg-weld-tint px-1.5 py-0.5 text-label font-medium text-weld-text">
      never public
    </span>
  );
}
