import { kindIds } from '@ellwand/shared/points/kinds';
import { type NewPart as NewPartRecord, NewPart, type GarmentRecord } from '@ellwand/shared/records/garment';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { Button, ButtonLink } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { Fieldset } from '../../../components/ui/fieldset.js';
import { Page } from '../../../components/ui/page.js';
import { paths } from '../../../config/paths.js';
import { mistakesOf, showProblem } from '../../../lib/form-mistakes.js';
import { newId } from '../../../lib/ids.js';
import { garmentQuery } from '../api/garment.js';
import { makeGarment } from '../api/make-garment.js';
import { kindWord } from '../../../lib/words/kind-word.js';
import { boxLabels, emptyRecord, RecordForm, type RecordTyped } from '../record-form.js';
import { RecordFields } from './record-fields.js';

/** How garments usually fall into parts; more can be added afterwards. */
const divisions = [
  { id: 'whole', label: 'One part, measured by itself' },
  { id: 'bodice-skirt', label: 'Two parts: a bodice and a skirt' },
] as const;
type Division = (typeof divisions)[number]['id'];

export function partsFor(division: Division, kind: string): NewPartRecord[] {
  if (division === 'bodice-skirt') {
    return [
      NewPart.parse({ kind: 'bodice', name: 'Bodice', suffix: '.1' }),
      NewPart.parse({ kind: 'skirt', name: 'Skirt', suffix: '.2' }),
    ];
  }
  const whole = kindIds.find((id) => id === kind) ?? 'dress';
  return [NewPart.parse({ kind: whole, name: kindWord(whole) })];
}

export function NewGarmentPage() {
  const queries = useQueryClient();
  const navigate = useNavigate();
  const [division, setDivision] = useState<Division>('whole');
  // Made once for this page: a repeated request, after a lost answer, makes one garment.
  const [id] = useState(newId);
  const form = useForm<RecordTyped, unknown, GarmentRecord>({
    resolver: zodResolver(RecordForm),
    defaultValues: emptyRecord(),
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount } = form.formState;
  const save = form.handleSubmit(async (record) => {
    try {
      const garment = await makeGarment({ id, record, parts: partsFor(division, record.kind) });
      queries.setQueryData(garmentQuery(garment.id).queryKey, garment);
      void queries.invalidateQueries({ queryKey: ['garments'] });
      void navigate(paths.garment(garment.id));
    } catch (error) {
      showProblem(error, form.setError, {
        prefix: '/record',
        known: (name) => (name.split('.')[0] ?? '') in boxLabels,
      });
    }
  });
  return (
    <Page title="New garment" lead="Number, title, kind, date and credit line are enough to begin.">
      <FormProvider {...form}>
        <form noValidate onSubmit={(event) => void save(event)} className="max-w-3xl space-y-8">
          <ErrorSummary mistakes={mistakesOf(errors)} attempt={isSubmitting ? 0 : submitCount} />
          <Fieldset
            legend="Parts"
            hint="A part is what is measured by itself and has its own sheet. Parts can be added later."
          >
            <div className="flex flex-wrap gap-x-8 gap-y-3">
              {divisions.map(({ id: value, label }) => (
                <label key={value} className="flex min-h-8 items-center gap-3 text-table">
                  <input
                    type="radio"
                    name="division"
                    className="size-6 shrink-0 accent-indigo"
                    checked={division === value}
                    onChange={() => setDivision(value)}
                  />
                  {label}
                </label>
              ))}
            </div>
          </Fieldset>
          <RecordFields />
          <div className="sticky bottom-0 flex gap-3 border-t border-hair bg-paper py-3">
            <Button type="submit" tone="action" disabled={isSubmitting}>
              {isSubmitting ? 'Saving' : 'Make the garment'}
            </Button>
            <ButtonLink tone="quiet" to={paths.garments()}>
              Back to the list
            </ButtonLink>
          </div>
        </form>
      </FormProvider>
    </Page>
  );
}
