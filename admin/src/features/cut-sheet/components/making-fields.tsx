import {
  directionLabels,
  edgeLabels,
  fullnessLabels,
  stitchingLabels,
} from '@ellwand/shared/cut-sheet/words';
import { Fieldset } from '../../../components/ui/fieldset.js';
import { blankRows } from '../model/blank-rows.js';
import { ChoiceBox, CountBox, LengthBox, WordsBox } from './boxes.js';
import { RowList } from './row-list.js';

/** Pleats and gathers: where the fullness goes. */
export function FullnessFields() {
  return (
    <Fieldset
      legend="Pleats and gathers"
      hint="Depth of a pleat from fold to fold. For gathers and gauging, count the rows."
    >
      <RowList name="fullness" one="row of pleats or gathers" blank={blankRows.fullness} empty="None yet.">
        {(index) => <FullnessRow index={index} />}
      </RowList>
    </Fieldset>
  );
}

function FullnessRow({ index }: { readonly index: number }) {
  const at = `fullness.${index}` as const;
  return (
    <div className="space-y-4">
      <div className="grid items-start gap-4 sm:grid-cols-3">
        <WordsBox name={`${at}.where`} label="Where" />
        <ChoiceBox name={`${at}.kind`} label="Kind" choices={fullnessLabels} />
        <ChoiceBox name={`${at}.direction`} label="Laid" choices={directionLabels} />
      </div>
      <div className="grid grid-cols-2 items-start gap-4 sm:grid-cols-3">
        <CountBox name={`${at}.count`} label="How many" />
        <LengthBox name={`${at}.depth`} label="Depth" />
        <LengthBox name={`${at}.stitchedDown`} label="Stitched down" />
      </div>
      <WordsBox name={`${at}.note`} label="Note" optional />
    </div>
  );
}

/** Bones and other stiffening. */
export function BoneFields() {
  return (
    <Fieldset
      legend="Boning"
      hint="The material as it was seen: at a worn end, or by a magnet. Leave it empty where it is not known."
    >
      <RowList name="bones" one="bone" blank={blankRows.bones} empty="No bones yet.">
        {(index) => (
          <div className="grid grid-cols-2 items-start gap-4 lg:grid-cols-[minmax(0,1fr)_6rem_8rem_minmax(0,1fr)_minmax(0,1fr)]">
            <div className="col-span-2 lg:col-span-1">
              <WordsBox name={`bones.${index}.where`} label="Seam or channel" />
            </div>
            <CountBox name={`bones.${index}.count`} label="How many" />
            <LengthBox name={`bones.${index}.length`} label="Length" />
            <WordsBox name={`bones.${index}.material`} label="Material" optional />
            <WordsBox name={`bones.${index}.position`} label="Position" optional />
          </div>
        )}
      </RowList>
    </Fieldset>
  );
}

/** Seams: what is left inside, how they are sewn, how their edges are kept from fraying. */
export function SeamFields() {
  return (
    <Fieldset legend="Seams" hint="Stitches counted on 10 mm where they are whole.">
      <RowList name="seams" one="seam" blank={blankRows.seams} empty="No seams yet.">
        {(index) => <SeamRow index={index} />}
      </RowList>
    </Fieldset>
  );
}

function SeamRow({ index }: { readonly index: number }) {
  const at = `seams.${index}` as const;
  return (
    <div className="space-y-4">
      <div className="grid grid-cols-2 items-start gap-4 lg:grid-cols-[minmax(0,1fr)_8rem_15rem_8rem_10rem]">
        <div className="col-span-2 lg:col-span-1">
          <WordsBox name={`${at}.where`} label="Which seam" />
        </div>
        <LengthBox name={`${at}.allowance`} label="Allowance" />
        <ChoiceBox name={`${at}.stitching`} label="Sewn" choices={stitchingLabels} />
        <CountBox name={`${at}.stitchesPer10Mm`} label="On 10 mm" />
        <ChoiceBox name={`${at}.edge`} label="Edge" choices={edgeLabels} />
      </div>
      <WordsBox name={`${at}.note`} label="Note" optional />
    </div>
  );
}
