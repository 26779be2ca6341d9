import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { Select, TextField } from '../../../components/ui/field.js';
import type { RecordTyped } from '../record-form.js';
import { useBox } from './record-fields.js';

/** Former, loan and temporary numbers: kept, because old labels and letters still name them. */
export function OtherNumberFields() {
  const { control } = useFormContext<RecordTyped>();
  const numbers = useFieldArray({ control, name: 'otherNumbers' });
  return (
    <div>
      <p className="text-table font-medium">
        Other numbers <span className="font-normal text-ink-3">(optional)</span>
      </p>
      <p className="text-label text-ink-3">Former, loan and temporary numbers.</p>
      <ul className="mt-2 space-y-3">
        {numbers.fields.map((field, index) => (
          <li key={field.id} className="flex flex-wrap items-end gap-3">
            <NumberRow index={index} />
            <Button onClick={() => numbers.remove(index)}>
              Remove <span className="sr-only">other number {index + 1}</span>
            </Button>
          </li>
        ))}
      </ul>
      <Button className="mt-3" onClick={() => numbers.append({ kind: 'former', number: '' })}>
        Add a number
      </Button>
    </div>
  );
}

function NumberRow({ index }: { readonly index: number }) {
  return (
    <>
      <div className="w-40">
        <Select label={`Kind of number ${index + 1}`} {...useBox(`otherNumbers.${index}.kind`)}>
          <option value="former">Former</option>
          <option value="loan">Loan</option>
          <option value="temporary">Temporary</option>
        </Select>
      </div>
      <div className="min-w-40 grow">
        <TextField label={`Number ${index + 1}`} {...useBox(`otherNumbers.${index}.number`)} />
      </div>
    </>
  );
}
