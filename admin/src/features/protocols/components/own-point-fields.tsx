import { groups } from '@ellwand/shared/points/groups';
import { handlingStepLabels, handlingSteps, howLabels, sideLabels } from '@ellwand/shared/points/point';
import type { UseFormReturn } from 'react-hook-form';
import { Select, TextArea, TextField, Tick } from '../../../components/ui/field.js';
import type { OwnPointRead, OwnPointTyped } from '../model/own-point-form.js';

export type OwnPointDesk = UseFormReturn<OwnPointTyped, unknown, OwnPointRead>;
type BoxName = Exclude<keyof OwnPointTyped, 'line'>;

const boxesOf = (form: OwnPointDesk) => (name: BoxName) => ({
  id: name,
  error: form.formState.errors[name]?.message,
  ...form.register(name),
});

const hows = Object.keys(howLabels) as (keyof typeof howLabels)[];
const sentenceCase = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** What an own point is, in words: what gives its readings their meaning. */
export function MeaningFields({ form }: { readonly form: OwnPointDesk }) {
  const box = boxesOf(form);
  return (
    <>
      <TextField
        label="Name"
        hint="As it stands in the table: “Loop to hem”."
        autoComplete="off"
        {...box('name')}
      />
      <TextArea
        label="Definition"
        hint="One sentence that two people read the same way."
        {...box('definition')}
      />
      <TextField
        label="From"
        hint="Where the tape begins: “the lower edge of the band”."
        autoComplete="off"
        {...box('from')}
      />
      <TextField label="To" hint="Where it ends." autoComplete="off" {...box('to')} />
      <div className="grid items-end gap-5 sm:grid-cols-2">
        <Select label="Handling step" {...box('handlingStep')}>
          {handlingSteps.map((step) => (
            <option key={step} value={step}>
              {handlingStepLabels[step]}
            </option>
          ))}
        </Select>
        <Select label="Side of the cloth" {...box('side')}>
          <option value="inside">{sideLabels.inside}</option>
          <option value="outside">{sideLabels.outside}</option>
        </Select>
        <Select label="How the tape goes" {...box('how')}>
          {hows.map((how) => (
            <option key={how} value={how}>
              {sentenceCase(howLabels[how])}
            </option>
          ))}
        </Select>
        <Select label="Searched with" {...box('group')}>
          <option value="">Choose</option>
          {groups.map(({ id, label }) => (
            <option key={id} value={id}>
              {label}
            </option>
          ))}
        </Select>
      </div>
      <div className="space-y-3">
        <Tick label="May need whole tape lengths" {...box('takesTapeLengths')} />
        <Tick label="The sheet says how its level was found" {...box('levelRecorded')} />
        <Tick label="On both sides: left and right may each be read" {...box('paired')} />
      </div>
    </>
  );
}

/** The same of a point that stands in an earlier version, to read. */
export function KeptMeaning({ form }: { readonly form: OwnPointDesk }) {
  const { definition, from, to, handlingStep, side, how } = form.getValues();
  const facts = [
    ['Definition', definition],
    ['From', from],
    ['To', to],
    ['Taken', `${handlingStepLabels[handlingStep]}; ${sideLabels[side].toLowerCase()}, ${howLabels[how]}`],
  ] as const;
  return (
    <dl className="space-y-2 border-l-2 border-hair pl-4 text-table">
      {facts.map(([term, said]) => (
        <div key={term}>
          <dt className="text-label text-ink-3">{term}</dt>
          <dd>{said}</dd>
        </div>
      ))}
    </dl>
  );
}

/** What may be bettered as a house learns: usual range and advice. */
export function AdviceFields({ form }: { readonly form: OwnPointDesk }) {
  const box = boxesOf(form);
  return (
    <>
      <fieldset>
        <legend className="text-table font-medium">
          Usual range <span className="font-normal text-ink-3">(optional)</span>
        </legend>
        <p className="text-label text-ink-3">A reading outside is asked about, never refused.</p>
        <div className="mt-1 grid grid-cols-2 gap-5">
          <TextField
            label="From, mm"
            inputMode="decimal"
            {...box('rangeFrom')}
            className="figures text-right"
          />
          <TextField label="To, mm" inputMode="decimal" {...box('rangeTo')} className="figures text-right" />
        </div>
      </fieldset>
      <TextArea optional label="What to watch for" hint="One sentence for the table." {...box('watchFor')} />
    </>
  );
}
