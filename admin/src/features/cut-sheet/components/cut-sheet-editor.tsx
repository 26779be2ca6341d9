import type { CutSheet } from '@ellwand/shared/records/cut-sheet';
import { FormProvider } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary, type FormMistake } from '../../../components/ui/error-summary.js';
import { mistakesOf } from '../../../lib/form-mistakes.js';
import { momentText, timeText } from '../../../lib/moments.js';
import { placeOf } from '../model/box-words.js';
import { useCutSheetEditing } from '../model/use-cut-sheet-editing.js';
import { LeaveQuestion } from './leave-question.js';
import { BoneFields, FullnessFields, SeamFields } from './making-fields.js';
import { OtherWriterNotice } from './other-writer.js';
import { PatternFields } from './pattern-fields.js';
import { PieceFields } from './piece-fields.js';
import { DartFields, NeckFields } from './shape-fields.js';
import { NoteFields, UnitChoice } from './unit-and-notes.js';

interface CutSheetEditorProps {
  readonly sheet: CutSheet;
  readonly garmentId: string;
  /** Why nothing can be written now; null while it can. */
  readonly locked: string | null;
}

/** The whole cut sheet as one form, saved by one button. */
export function CutSheetEditor({ sheet, garmentId, locked }: CutSheetEditorProps) {
  const { form, other, savedAt, save, takeTheirs } = useCutSheetEditing(sheet, garmentId);
  const { errors, isSubmitting, submitCount, isDirty } = form.formState;
  return (
    <FormProvider {...form}>
      <form noValidate aria-label="Cut sheet" className="space-y-8" onSubmit={(event) => void save(event)}>
        <ErrorSummary mistakes={placed(mistakesOf(errors))} attempt={isSubmitting ? 0 : submitCount} />
        {other && <OtherWriterNotice other={other} onTake={takeTheirs} />}
        {locked && <p className="rounded-sm bg-well p-4 text-table">{locked}</p>}
        <fieldset disabled={locked !== null} className="min-w-0 space-y-8">
          <legend className="sr-only">How the part is cut</legend>
          <UnitChoice />
          <PieceFields rounds={sheet.rounds} />
          <DartFields />
          <NeckFields />
          <FullnessFields />
          <BoneFields />
          <SeamFields />
          <NoteFields />
          <PatternFields garmentId={garmentId} disabled={locked !== null} />
        </fieldset>
        {!locked && (
          <div className="sticky bottom-0 z-10 flex flex-wrap items-center gap-4 border-t border-hair bg-paper py-3">
            <Button type="submit" tone="action" height="table" disabled={isSubmitting}>
              {isSubmitting ? 'Saving' : 'Save the cut sheet'}
            </Button>
            <p role="status" className="text-table text-ink-2">
              {isDirty ? 'Changed, not saved yet' : savedText(sheet, savedAt)}
            </p>
          </div>
        )}
      </form>
      <LeaveQuestion unsaved={isDirty && !isSubmitting} />
    </FormProvider>
  );
}

function savedText({ updatedAt, updatedBy }: CutSheet, savedAt: string | null): string {
  if (savedAt) return `Saved, ${timeText(savedAt)}`;
  return updatedAt ? `Last saved ${momentText(updatedAt)}${updatedBy ? ` by ${updatedBy}` : ''}` : '';
}

/** Many boxes of this form are alike: each mistake is told with its place, and a mark's two boxes as one. */
function placed(mistakes: readonly FormMistake[]): FormMistake[] {
  const told = mistakes.map(({ fieldId, message }) =>
    fieldId ? { fieldId, message: `${placeOf(fieldId.replaceAll('-', '.'))}: ${message}` } : { message },
  );
  return told.filter(({ message }, place) => told.findIndex((one) => one.message === message) === place);
}
