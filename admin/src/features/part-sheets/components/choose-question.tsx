import { type PartSheets, SpeakingSheet } from '@ellwand/shared/records/part-sheets';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { Select, TextArea } from '../../../components/ui/field.js';
import { Refused } from '../../../components/ui/states.js';
import { dayText } from '../../../lib/moments.js';
import { maySpeak } from '../model/words.js';

const NEWEST = 'newest';
const Choice = z.object({ which: z.string(), reason: SpeakingSheet.shape.reason });
type Choice = z.infer<typeof Choice>;

interface ChooseQuestionProps {
  readonly shown: PartSheets;
  readonly open: boolean;
  readonly onClose: () => void;
  readonly pending: boolean;
  readonly error: unknown;
  readonly onChoose: (choice: SpeakingSheet) => void;
}

/** Which sheet is to speak for the part, and why. */
export function ChooseQuestion({ shown, open, onClose, pending, error, onChoose }: ChooseQuestionProps) {
  const { sheets, speaking } = shown;
  const form = useForm<Choice>({
    resolver: zodResolver(Choice),
    defaultValues: { which: shown.chosen ? NEWEST : (speaking?.sheetId ?? NEWEST), reason: '' },
  });
  const choose = form.handleSubmit(({ which, reason }) =>
    onChoose({ sheetId: which === NEWEST ? null : which, reason }),
  );
  return (
    <Question
      open={open}
      onClose={onClose}
      title="Choose the sheet that speaks"
      actions={
        <>
          <Button tone="action" disabled={pending} onClick={() => void choose()}>
            Let it speak
          </Button>
          <Button onClick={onClose}>Leave it as it is</Button>
        </>
      }
    >
      <p>What is public stays as it is until the garment is published again.</p>
      <Select id="speaking-sheet" label="Sheet" {...form.register('which')}>
        <option value={NEWEST}>The newest complete one, whichever that is</option>
        {sheets.filter(maySpeak).map(({ id, measuredOn }) => (
          <option key={id} value={id}>
            {dayText(measuredOn)}
          </option>
        ))}
      </Select>
      <TextArea
        id="speaking-because"
        label="Why"
        hint="Kept with the record and frozen when it is sent to review."
        error={form.formState.errors.reason?.message}
        {...form.register('reason')}
      />
      <Refused error={error} />
    </Question>
  );
}
