import { centreLabels, neckAndUnderarm, tipSideLabels } from '@ellwand/shared/cut-sheet/words';
import { useFormContext, useWatch } from 'react-hook-form';
import { Fieldset } from '../../../components/ui/fieldset.js';
import { blankRows } from '../model/blank-rows.js';
import type { TypedSheet } from '../model/typed-sheet.js';
import { type BoxName, ChoiceBox, CountBox, LengthBox, WordsBox } from './boxes.js';
import { RowList } from './row-list.js';

/** Darts: where they stand and what they take up. */
export function DartFields() {
  return (
    <Fieldset
      legend="Darts"
      hint="From the centre line along the waist to the middle of the dart; the tip above or below the waist."
    >
      <RowList name="darts" one="dart" blank={blankRows.darts} empty="No darts yet.">
        {(index) => <DartRow index={index} />}
      </RowList>
    </Fieldset>
  );
}

function DartRow({ index }: { readonly index: number }) {
  const at = `darts.${index}` as const;
  const { control } = useFormContext<TypedSheet>();
  const pieces = useWatch({ control, name: 'pieces' });
  const choices = {
    '': 'Not said',
    ...Object.fromEntries(pieces.map(({ key, name }, place) => [key, name.trim() || `Piece ${place + 1}`])),
  };
  return (
    <div className="space-y-4">
      <div className="grid grid-cols-2 items-start gap-4 sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_6rem]">
        <ChoiceBox name={`${at}.piece`} label="Piece" choices={choices} />
        <WordsBox name={`${at}.where`} label="Where" optional />
        <CountBox name={`${at}.count`} label="How many" />
      </div>
      <div className="grid grid-cols-2 items-start gap-4 lg:grid-cols-6">
        <LengthBox name={`${at}.fromCentre`} label="From centre" />
        <ChoiceBox name={`${at}.centre`} label="Which centre" choices={centreLabels} />
        <LengthBox name={`${at}.tip`} label="Tip" />
        <ChoiceBox name={`${at}.tipSide`} label="Tip lies" choices={tipSideLabels} />
        <LengthBox name={`${at}.length`} label="Length" />
        <LengthBox name={`${at}.intake`} label="Intake" />
      </div>
    </div>
  );
}

const sections = ['neck', 'underarm'] as const;

/** Neck and underarm: lengths that a part has once. */
export function NeckFields() {
  return (
    <Fieldset
      legend="Neck and underarm"
      hint="Width straight across from neck point to neck point; depth straight down from the line between them."
    >
      <div className="grid grid-cols-2 items-end gap-4 lg:grid-cols-3">
        {sections.flatMap((section) =>
          Object.entries(neckAndUnderarm[section]).map(([field, label]) => (
            <LengthBox key={field} name={`${section}.${field}` as BoxName} label={label} />
          )),
        )}
      </div>
    </Fieldset>
  );
}
