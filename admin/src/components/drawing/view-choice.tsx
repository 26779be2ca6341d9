import type { ViewName } from '@ellwand/shared/drawings/diagram/model';

export const viewWords: Readonly<Record<ViewName, string>> = {
  front: 'Front',
  back: 'Back',
  inside: 'Inside',
  side: 'Side',
  below: 'Below',
};

/** Which of a diagram's views is looked at; nothing to choose where there is one. */
export function ViewChoice({
  views,
  view,
  onChoose,
}: {
  readonly views: readonly ViewName[];
  readonly view: ViewName;
  readonly onChoose: (view: ViewName) => void;
}) {
  if (views.length < 2) return null;
  return (
    <div role="group" aria-label="View" className="flex flex-wrap justify-center gap-2">
      {views.map((name) => (
        <button
          key={name}
          type="button"
          aria-pressed={name === view}
          onClick={() => onChoose(name)}
          className="min-h-11 rounded-sm border border-rule px-3 text-label aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper"
        >
          {viewWords[name]}
        </button>
      ))}
    </div>
  );
}
