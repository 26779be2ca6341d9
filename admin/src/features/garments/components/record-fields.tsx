import { kindIds } from '@ellwand/shared/points/kinds';
import { rightsStatements, wornByValues } from '@ellwand/shared/records/garment';
import type { ReactNode } from 'react';
import { type FieldPath, useFormContext } from 'react-hook-form';
import { Fieldset, NeverPublic } from '../../../components/ui/fieldset.js';
import { Select, TextArea, TextField, Tick } from '../../../components/ui/field.js';
import { fieldId } from '../../../lib/form-mistakes.js';
import { kindWord } from '../../../lib/words/kind-word.js';
import type { RecordTyped } from '../record-form.js';
import { HazardFields } from './hazard-fields.js';
import { OtherNumberFields } from './other-number-fields.js';

/** Id, registration and error of one box of the record's form. */
export function useBox(name: FieldPath<RecordTyped>) {
  const { register, getFieldState, formState } = useFormContext<RecordTyped>();
  const { error } = getFieldState(name, formState);
  // A list typed in one box has its mistake on one of its lines.
  const lineError =
    error && !error.message
      ? Object.values(error).find(
          (one): one is { message: string } => typeof one === 'object' && one !== null && 'message' in one,
        )
      : undefined;
  return { id: fieldId(name), error: error?.message ?? lineError?.message, ...register(name) };
}

const Pair = ({ children }: { readonly children: ReactNode }) => (
  <div className="grid items-end gap-5 sm:grid-cols-2">{children}</div>
);

const notPublic = <NeverPublic />;

const madeFor: Readonly<Record<(typeof wornByValues)[number], string>> = {
  woman: 'A woman',
  man: 'A man',
  child: 'A child',
  unknown: 'Not known',
};

function Identity() {
  return (
    <Fieldset legend="What it is">
      <Pair>
        <TextField
          label="Own number"
          hint="The museum’s number for the whole garment. Parts add theirs: .1, .2."
          {...useBox('ownNumber')}
        />
        <Select label="Kind of garment" {...useBox('kind')}>
          {kindIds.map((kind) => (
            <option key={kind} value={kind}>
              {kindWord(kind)}
            </option>
          ))}
          <option value="set">Set of several garments</option>
        </Select>
      </Pair>
      <TextField
        label="Title"
        hint="What it is in a few words: “Dress of teal silk with a shelf bustle”."
        {...useBox('title')}
      />
      <Pair>
        <TextField
          label="Date"
          hint="A year or a span: 1885, 1885~ for about 1885, 1858/1861."
          {...useBox('date')}
        />
        <Select label="Made for" {...useBox('wornBy')}>
          {wornByValues.map((value) => (
            <option key={value} value={value}>
              {madeFor[value]}
            </option>
          ))}
        </Select>
      </Pair>
      <TextArea
        rows={6}
        optional
        label="Public description"
        hint="Plain text. What a visitor should notice."
        {...useBox('description')}
      />
    </Fieldset>
  );
}

function Making() {
  return (
    <Fieldset legend="Making">
      <Pair>
        <TextField optional label="Maker" hint="A dressmaker, tailor or house." {...useBox('maker')} />
        <TextField optional label="Place" hint="Where it was made." {...useBox('place')} />
      </Pair>
      <Pair>
        <TextArea
          optional
          label="What the label says"
          hint="Letter for letter, line by line."
          {...useBox('label.transcription')}
        />
        <TextField
          optional
          label="Where the label sits"
          hint="For example: woven, inside the waistband at the back."
          {...useBox('label.where')}
        />
      </Pair>
      <Pair>
        <TextArea optional label="Materials" hint="One to a line." {...useBox('materials')} />
        <TextArea optional label="Techniques" hint="One to a line." {...useBox('techniques')} />
      </Pair>
      <Pair>
        <TextArea optional label="Colours" hint="One to a line." {...useBox('colours')} />
        <TextArea optional label="Fastenings" hint="Kind, number, where." {...useBox('fastenings')} />
      </Pair>
      <Pair>
        <TextArea optional label="Lining" {...useBox('lining')} />
        <TextArea
          optional
          label="Alterations"
          hint="What was let out, taken in or replaced, and how it shows."
          {...useBox('alterations')}
        />
      </Pair>
    </Fieldset>
  );
}

function History() {
  return (
    <Fieldset legend="History">
      <TextArea optional label="Wearer and occasion" hint="Public." {...useBox('wearer')} />
      <TextArea
        optional
        label="Provenance"
        remark={notPublic}
        hint="From whom, when, how."
        {...useBox('provenance')}
      />
      <TextArea optional label="References and exhibitions" hint="One to a line." {...useBox('references')} />
      <OtherNumberFields />
    </Fieldset>
  );
}

function Care() {
  return (
    <Fieldset legend="Condition and handling">
      <TextArea optional label="Condition" {...useBox('condition')} />
      <TextArea
        optional
        label="Handling notes"
        remark={notPublic}
        hint="Shown before every measuring sheet opens."
        {...useBox('handling')}
      />
      <TextField
        optional
        label="Store location"
        remark={notPublic}
        hint="Room, bay, shelf or box."
        {...useBox('storeLocation')}
      />
    </Fieldset>
  );
}

function Public() {
  return (
    <Fieldset legend="What the public may see">
      <TextField
        label="Credit line"
        hint="As the giver or the museum wishes to be named."
        {...useBox('creditLine')}
      />
      <Select label="Rights statement" {...useBox('rights')}>
        {Object.entries(rightsStatements).map(([uri, label]) => (
          <option key={uri} value={uri}>
            {label}
          </option>
        ))}
      </Select>
      <Tick
        label="Name the people who measured"
        hint="Otherwise only their number is told."
        {...useBox('showPeople')}
      />
      <Tick
        label="Tell the public of the hazards"
        hint="Staff always see them before a sheet opens."
        {...useBox('showHazards')}
      />
    </Fieldset>
  );
}

/** Every box of a garment's record, in the order in which it is written at the table. */
export function RecordFields() {
  return (
    <div className="space-y-8">
      <Identity />
      <Making />
      <Care />
      <HazardFields />
      <History />
      <Public />
    </div>
  );
}
