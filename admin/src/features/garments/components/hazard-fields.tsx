import { hazardIds } from '@ellwand/shared/records/garment';
import { useFormContext, useWatch } from 'react-hook-form';
import { Fieldset } from '../../../components/ui/fieldset.js';
import { TextField } from '../../../components/ui/field.js';
import {
  hazardCautions,
  type HazardId,
  hazardLabels,
  standingLabels,
} from '@ellwand/shared/records/hazard-words';
import type { RecordTyped } from '../record-form.js';
import { useBox } from './record-fields.js';

/** Nine ways in which old dress can hurt. What is set brings its usual caution and a box for a note. */
export function HazardFields() {
  return (
    <Fieldset
      legend="Hazards"
      hint="Suspected until a qualified person has tested it. Your institution’s and country’s rules come first."
    >
      <ul className="divide-y divide-hair border-y border-hair">
        {hazardIds.map((id) => (
          <HazardRow key={id} id={id} />
        ))}
      </ul>
    </Fieldset>
  );
}

function HazardRow({ id }: { readonly id: HazardId }) {
  const { control } = useFormContext<RecordTyped>();
  const standing = useWatch({ control, name: `hazards.${id}.standing` });
  const box = useBox(`hazards.${id}.standing`);
  const note = useBox(`hazards.${id}.note`);
  return (
    <li className="py-2">
      <div className="grid items-center gap-x-4 gap-y-1 sm:grid-cols-[minmax(0,1fr)_15rem]">
        <label htmlFor={box.id} className="text-table">
          {hazardLabels[id]}
        </label>
        <select {...box} className="box">
          <option value="">Nothing noted</option>
          {Object.entries(standingLabels).map(([value, label]) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </div>
      {standing !== '' && (
        <div className="mb-2 mt-2 space-y-3 border-l-4 border-madder pl-3">
          {standing !== 'tested-absent' && <p className="text-label text-ink-2">{hazardCautions[id]}</p>}
          <TextField optional label="Note" hint="Where it is, who tested it and when." {...note} />
        </div>
      )}
    </li>
  );
}
