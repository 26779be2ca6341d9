import { grainLabels, layerLabels, levelNames, panelLevels } from '@ellwand/shared/cut-sheet/words';
import type { RoundRead } from '@ellwand/shared/records/cut-sheet';
import { useFormContext, useWatch } from 'react-hook-form';
import { Fieldset } from '../../../components/ui/fieldset.js';
import { blankRows } from '../model/blank-rows.js';
import { notesWhileTyping } from '../model/panels-typed.js';
import type { TypedSheet } from '../model/typed-sheet.js';
import { ChoiceBox, CountBox, LengthBox, TickBox, WordsBox } from './boxes.js';
import { RowList } from './row-list.js';

/** The pieces, each with its widths where it goes round, and what the panels come to. */
export function PieceFields({ rounds }: { readonly rounds: readonly RoundRead[] }) {
  return (
    <Fieldset
      legend="Pieces and panel widths"
      hint="Widths seam to seam as the piece lies finished, pleats closed; at an opening to the fastening line. 0 is a panel that comes to nothing there; an empty box is not measured."
    >
      <RowList name="pieces" one="piece" blank={blankRows.pieces} empty="No pieces yet.">
        {(index) => <PieceRow index={index} />}
      </RowList>
      <PanelSums rounds={rounds} />
    </Fieldset>
  );
}

function PieceRow({ index }: { readonly index: number }) {
  const at = `pieces.${index}` as const;
  return (
    <div className="space-y-4">
      <div className="grid grid-cols-2 items-start gap-4 sm:grid-cols-6 lg:grid-cols-[minmax(0,1fr)_5.5rem_4.5rem_9rem_15rem]">
        <div className="col-span-2 sm:col-span-4 lg:col-span-1">
          <WordsBox name={`${at}.name`} label="Name" />
        </div>
        <CountBox name={`${at}.count`} label="How many" />
        <TickBox name={`${at}.onFold`} label="On fold" />
        <div className="col-span-2 sm:col-span-3 lg:col-span-1">
          <ChoiceBox name={`${at}.grain`} label="Grain" choices={grainLabels} />
        </div>
        <div className="col-span-2 sm:col-span-3 lg:col-span-1">
          <ChoiceBox name={`${at}.layer`} label="Layer" choices={layerLabels} />
        </div>
      </div>
      <div className="grid grid-cols-2 items-start gap-4 sm:grid-cols-4 lg:grid-cols-[repeat(4,8rem)_minmax(0,1fr)]">
        {panelLevels.map((level) => (
          <LengthBox key={level} name={`${at}.widths.${level}`} label={`${levelNames[level]} width`} />
        ))}
        <div className="col-span-2 sm:col-span-4 lg:col-span-1">
          <WordsBox name={`${at}.note`} label="Note" optional />
        </div>
      </div>
    </div>
  );
}

const looks = {
  agrees: { edge: 'border-verdigris', word: 'Agrees', tone: 'text-verdigris' },
  apart: { edge: 'border-madder', word: 'Apart', tone: 'text-madder' },
  open: { edge: 'border-rule', word: 'Open', tone: 'text-ink-2' },
} as const;

/** The panels' sums as they are typed, beside the rounds that were read on the measuring sheet. */
function PanelSums({ rounds }: { readonly rounds: readonly RoundRead[] }) {
  const { control } = useFormContext<TypedSheet>();
  const [unit, pieces] = useWatch({ control, name: ['unit', 'pieces'] });
  const notes = notesWhileTyping({ unit, pieces }, rounds);
  if (notes.length === 0) return null;
  return (
    <section aria-label="Sums of the panels">
      <p className="text-table font-semibold">Sums of the panels</p>
      <ul className="mt-1 space-y-1">
        {notes.map(({ level, says, sentence }) => (
          <li key={level} className={`border-l-4 bg-sheet px-3 py-2 text-table ${looks[says].edge}`}>
            <strong className={`font-medium ${looks[says].tone}`}>{looks[says].word}.</strong> {sentence}
          </li>
        ))}
      </ul>
    </section>
  );
}
