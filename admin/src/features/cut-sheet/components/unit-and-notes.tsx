import { type LengthUnit, lengthUnits, unitLabels } from '@ellwand/shared/units/format-length';
import { useFormContext, useWatch } from 'react-hook-form';
import { NeverPublic, Fieldset } from '../../../components/ui/fieldset.js';
import { Select, TextArea } from '../../../components/ui/field.js';
import { inUnit, type TypedSheet } from '../model/typed-sheet.js';
import { useBox } from './boxes.js';

/** In which unit bare figures are typed. Changing it spells out the unit of what stands there already. */
export function UnitChoice() {
  const { control, getValues, reset } = useFormContext<TypedSheet>();
  const unit = useWatch({ control, name: 'unit' });
  const change = (next: LengthUnit) =>
    reset(inUnit(getValues(), next), { keepDefaultValues: true, keepErrors: true, keepSubmitCount: true });
  return (
    <div className="max-w-60">
      <Select
        id="unit"
        label="Figures are typed in"
        hint="A unit typed out wins: 24 3/8 in."
        value={unit}
        onChange={({ target }) =>
          change(lengthUnits.find((each) => each === target.value) ?? getValues('unit'))
        }
      >
        {lengthUnits.map((each) => (
          <option key={each} value={each}>
            {unitLabels[each]}
          </option>
        ))}
      </Select>
    </div>
  );
}

export function NoteFields() {
  return (
    <Fieldset legend="Notes">
      <TextArea optional label="Note on the cut" hint="For makers and the public." {...useBox('note')} />
      <TextArea
        optional
        label="Inner note"
        remark={<NeverPublic />}
        hint="Doubts, and what to look at again."
        {...useBox('innerNote')}
      />
    </Fieldset>
  );
}
