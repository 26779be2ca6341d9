import type { CutSheet, NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { showProblem } from '../../../lib/form-mistakes.js';
import { isProblem, type ProblemError } from '../../../lib/problem-error.js';
import { cutSheetQuery, saveCutSheet, writtenBetween } from '../api/cut-sheet.js';
import { bothChanged, mergedSheet, type OtherWriter, type Section } from './two-writers.js';
import { CutSheetForm, inUnit, typedSheet, type TypedSheet } from './typed-sheet.js';

/** A cut sheet as a form, saved whole. When somebody else saved in between, nothing that either wrote is lost. */
export function useCutSheetEditing(sheet: CutSheet, garmentId: string) {
  const queries = useQueryClient();
  const [opened, setOpened] = useState(() => ({ typed: typedSheet(sheet.body), version: sheet.version }));
  const [other, setOther] = useState<OtherWriter | null>(null);
  const [savedAt, setSavedAt] = useState<string | null>(null);
  const form = useForm<TypedSheet, unknown, NewCutSheet>({
    resolver: zodResolver(CutSheetForm),
    defaultValues: opened.typed,
    shouldFocusError: false,
  });

  const settle = (saved: CutSheet) => {
    queries.setQueryData(cutSheetQuery(saved.partId).queryKey, saved);
    // A published record becomes a draft by it, and lists say so.
    void queries.invalidateQueries({ queryKey: ['garment', garmentId] });
    void queries.invalidateQueries({ queryKey: ['garments'] });
    const typed = typedSheet(saved.body);
    setOpened({ typed, version: saved.version });
    setOther(null);
    setSavedAt(saved.updatedAt);
    form.reset(typed);
  };

  const meetOther = async (error: ProblemError) => {
    const found = await queries.fetchQuery({ ...cutSheetQuery(sheet.partId), staleTime: 0 });
    const theirs = typedSheet(found.body);
    const versions = { opened: opened.typed, theirs, mine: form.getValues() };
    const { changedBy, changedAt } = writtenBetween(error);
    setOther({
      by: changedBy ?? found.updatedBy,
      at: changedAt ?? found.updatedAt,
      theirs,
      both: bothChanged(versions),
    });
    const merged = mergedSheet(versions);
    setOpened({ typed: theirs, version: found.version });
    form.reset(theirs);
    form.reset(merged, { keepDefaultValues: true });
  };

  const save = form.handleSubmit(async (body) => {
    try {
      settle(await saveCutSheet(sheet.partId, opened.version, body));
    } catch (error) {
      if (isProblem(error) && error.status === 412) await meetOther(error);
      else showProblem(error, form.setError);
    }
  });

  const takeTheirs = (section: Section) => {
    if (!other) return;
    const mine = form.getValues();
    form.reset({ ...mine, [section]: inUnit(other.theirs, mine.unit)[section] }, { keepDefaultValues: true });
    setOther({ ...other, both: other.both.filter((each) => each !== section) });
  };
  return { form, other, savedAt, save, takeTheirs };
}
