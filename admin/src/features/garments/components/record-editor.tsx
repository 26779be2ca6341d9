import type { Garment, GarmentRecord } from '@ellwand/shared/records/garment';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { mistakesOf, showProblem } from '../../../lib/form-mistakes.js';
import { timeText } from '../../../lib/moments.js';
import { isProblem, type ProblemError } from '../../../lib/problem-error.js';
import { garmentQuery } from '../api/garment.js';
import { saveRecord, staleOf } from '../api/save-record.js';
import { changesBehind, mergedUnder } from '../record-changes.js';
import { boxLabels, RecordForm, type RecordTyped, typedRecord } from '../record-form.js';
import { NotedPanel, useNoted } from './noted-panel.js';
import { RecordFields } from './record-fields.js';
import { type Meanwhile, StaleNotice } from './stale-notice.js';

const isBox = (name: string) => (name.split('.')[0] ?? '') in boxLabels;

/**
 * The record of one garment as a form. When somebody else saved in between, their changes are laid beside what was
 * typed here and nothing of either is lost.
 */
export function RecordEditor({ garment }: { readonly garment: Garment }) {
  const noted = useNoted(garment.id);
  const editing = useRecordEditing(garment, noted.saved);
  const { form, meanwhile, savedAt, save } = editing;
  const { errors, isSubmitting, submitCount, isDirty } = form.formState;
  useWarningOnLeave(isDirty);
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={(event) => void save(event)} className="space-y-6" aria-label="Record">
        <ErrorSummary mistakes={mistakesOf(errors)} attempt={isSubmitting ? 0 : submitCount} />
        {meanwhile && <StaleNotice meanwhile={meanwhile} onTake={editing.takeTheirs} />}
        <NotedPanel {...noted} />
        <RecordFields />
        <div className="sticky bottom-0 flex flex-wrap items-center gap-4 border-t border-hair bg-paper py-3">
          <Button type="submit" tone="action" disabled={isSubmitting}>
            {isSubmitting ? 'Saving' : 'Save the record'}
          </Button>
          <p role="status" className="text-table text-ink-2">
            {isDirty ? 'Changed, not saved yet' : savedAt ? `Saved, ${timeText(savedAt)}` : ''}
          </p>
        </div>
      </form>
    </FormProvider>
  );
}

function useRecordEditing(garment: Garment, onSaved: () => Promise<void>) {
  const queries = useQueryClient();
  const [opened, setOpened] = useState(() => ({
    typed: typedRecord(garment.record),
    version: garment.version,
  }));
  const [meanwhile, setMeanwhile] = useState<Meanwhile | null>(null);
  const [savedAt, setSavedAt] = useState<string | null>(null);
  const form = useForm<RecordTyped, unknown, GarmentRecord>({
    resolver: zodResolver(RecordForm),
    defaultValues: opened.typed,
    shouldFocusError: false,
  });

  // Parts and pictures raise the garment's version too; that is no reason to call this form stale.
  const sameRecord = JSON.stringify(typedRecord(garment.record)) === JSON.stringify(opened.typed);
  const version = sameRecord ? Math.max(garment.version, opened.version) : opened.version;

  const settle = (saved: Garment) => {
    queries.setQueryData(garmentQuery(saved.id).queryKey, saved);
    void queries.invalidateQueries({ queryKey: ['garments'] });
    const typed = typedRecord(saved.record);
    setOpened({ typed, version: saved.version });
    setMeanwhile(null);
    setSavedAt(saved.updatedAt);
    form.reset(typed);
  };

  const meetOther = async (error: ProblemError) => {
    const theirs = await queries.fetchQuery({ ...garmentQuery(garment.id), staleTime: 0 });
    const mine = form.getValues();
    const typed = typedRecord(theirs.record);
    const stale = staleOf(error);
    setMeanwhile({
      by: stale?.changedBy ?? null,
      at: stale?.changedAt ?? theirs.updatedAt,
      changes: changesBehind(opened.typed, typed, mine),
      typed,
    });
    const merged = mergedUnder(opened.typed, typed, mine);
    setOpened({ typed, version: theirs.version });
    form.reset(typed);
    for (const box of Object.keys(boxLabels) as (keyof RecordTyped)[])
      form.setValue(box, merged[box], { shouldDirty: true });
  };

  const save = form.handleSubmit(async (record) => {
    try {
      settle(await saveRecord(garment.id, version, record));
      // The record is kept by now: what the notes have to say of it is said beside them.
      await onSaved().catch(() => undefined);
    } catch (error) {
      if (isProblem(error) && error.status === 412) await meetOther(error);
      else showProblem(error, form.setError, { prefix: '/record', known: isBox });
    }
  });

  const takeTheirs = (box: keyof RecordTyped) => {
    if (!meanwhile) return;
    form.setValue(box, meanwhile.typed[box], { shouldDirty: true });
    setMeanwhile({ ...meanwhile, changes: meanwhile.changes.filter((change) => change.box !== box) });
  };
  return { form, meanwhile, savedAt, save, takeTheirs };
}

/** The browser asks before a closed window takes what was typed with it. */
function useWarningOnLeave(unsaved: boolean) {
  useEffect(() => {
    if (!unsaved) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [unsaved]);
}
