import { FieldError } from '../../../components/ui/field.js';
import { fieldId } from '../../../lib/form-mistakes.js';
import { useBox, useMistake } from './boxes.js';

type Ends = 'pattern.marks' | `pattern.pairs.${number}`;

/** The places of two marks in pixels, to be typed where they are not tapped. */
export function MarkBoxes({
  at,
  letters,
}: {
  readonly at: Ends;
  readonly letters: readonly [first: string, second: string];
}) {
  return (
    <div className="grid grid-cols-2 gap-4">
      <Place at={`${at}.from`} letter={letters[0]} />
      <Place at={`${at}.to`} letter={letters[1]} />
    </div>
  );
}

function Place({ at, letter }: { readonly at: `${Ends}.${'from' | 'to'}`; readonly letter: string }) {
  const across = useBox(`${at}.x`);
  const down = useBox(`${at}.y`);
  const whole = useMistake(at);
  const error = across.error ?? down.error ?? whole;
  return (
    <fieldset id={fieldId(at)} tabIndex={-1}>
      <legend className="text-label font-medium">{letter}, px across and down</legend>
      <div className="mt-1 flex gap-1.5">
        <PixelBox box={across} label={`${letter}, pixels across`} wrong={error !== undefined} />
        <PixelBox box={down} label={`${letter}, pixels down`} wrong={error !== undefined} />
      </div>
      {error && <FieldError id={`${fieldId(at)}-error`}>{error}</FieldError>}
    </fieldset>
  );
}

function PixelBox({
  box: { id, error: _error, ...box },
  label,
  wrong,
}: {
  readonly box: ReturnType<typeof useBox>;
  readonly label: string;
  readonly wrong: boolean;
}) {
  return (
    <input
      type="text"
      inputMode="numeric"
      autoComplete="off"
      id={id}
      aria-label={label}
      aria-invalid={wrong || undefined}
      className="box figures min-w-0 px-2 text-right"
      {...box}
    />
  );
}
