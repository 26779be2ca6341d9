import type { MarkName, NamedMark } from '../model/marks.js';

interface MarkChoiceProps {
  readonly marks: readonly NamedMark[];
  readonly chosen: MarkName;
  readonly disabled: boolean;
  readonly onChoose: (name: MarkName) => void;
}

/** Which mark the next tap in the picture sets. */
export function MarkChoice({ marks, chosen, disabled, onChoose }: MarkChoiceProps) {
  return (
    <fieldset disabled={disabled}>
      <legend className="text-table font-medium">A tap in the picture sets</legend>
      <div className="mt-1 flex flex-wrap gap-2">
        {marks.map(({ name, letter, at }) => (
          <label
            key={name}
            className={`inline-flex min-h-12 min-w-12 cursor-pointer items-center gap-2 rounded-sm border px-3 text-table has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-indigo ${name === chosen ? 'border-indigo bg-indigo-tint font-semibold text-indigo' : 'border-rule bg-sheet'}`}
          >
            <input
              type="radio"
              name="mark"
              className="accent-indigo"
              checked={name === chosen}
              onChange={() => onChoose(name)}
            />
            {letter}
            <span className={at ? 'sr-only' : 'text-label font-normal text-ink-3'}>
              {at ? ', set' : 'not set'}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
