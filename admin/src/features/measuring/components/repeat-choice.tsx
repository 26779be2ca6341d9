import type { SheetPoint } from '../model/sheet-points.js';

interface RepeatChoiceProps {
  readonly points: readonly SheetPoint[];
  readonly chosen: readonly string[];
  readonly onChange: (chosen: readonly string[]) => void;
}

/** Which points are read a second time, blind: few, and on garments that can bear it. */
export function RepeatChoice({ points, chosen, onChange }: RepeatChoiceProps) {
  const toggle = (id: string) =>
    onChange(chosen.includes(id) ? chosen.filter((one) => one !== id) : [...chosen, id]);
  return (
    <fieldset>
      <legend className="text-table font-medium">Points to read twice</legend>
      <p className="text-label text-ink-3">
        Every reading is handling: choose a few, and none where the cloth is weak. The first figure is covered
        until the second is in.
      </p>
      <div className="mt-1 grid gap-x-6 sm:grid-cols-2">
        {points.map(({ id, point }) => (
          <label key={id} className="flex min-h-11 items-center gap-3 text-table">
            <input
              type="checkbox"
              checked={chosen.includes(id)}
              onChange={() => toggle(id)}
              className="size-6 shrink-0 accent-indigo"
            />
            {point.name}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
