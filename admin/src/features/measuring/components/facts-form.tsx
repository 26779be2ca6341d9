import { SheetFacts, type SheetFactsInput, supportLabels, supports } from '@ellwand/shared/records/sheet';
import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { ErrorSummary } from '../../../components/ui/error-summary.js';
import { Select, TextArea, TextField } from '../../../components/ui/field.js';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { mistakesOf, showProblem } from '../../../lib/form-mistakes.js';
import { colleaguesQuery } from '../api/colleagues.js';
import type { SheetPoint } from '../model/sheet-points.js';
import { RepeatChoice } from './repeat-choice.js';
import { PeopleChoice } from './people-choice.js';

interface FactsFormProps {
  readonly facts: SheetFactsInput;
  readonly verb: string;
  readonly onSave: (facts: SheetFacts) => Promise<void>;
  readonly aside?: ReactNode;
  /** The points of a sheet that is open, of which some may be read twice. */
  readonly points?: readonly SheetPoint[];
}

/** Who, when, where, on what, with which tape. */
export function FactsForm({ facts, verb, onSave, aside, points }: FactsFormProps) {
  const colleagues = useQuery(colleaguesQuery);
  const form = useForm<SheetFactsInput, unknown, SheetFacts>({
    resolver: zodResolver(SheetFacts),
    defaultValues: facts,
    shouldFocusError: false,
  });
  const { errors, isSubmitting, submitCount, isSubmitSuccessful, isDirty } = form.formState;
  const submit = form.handleSubmit(async (values) => {
    try {
      await onSave(values);
      form.reset(values);
    } catch (error) {
      showProblem(error, form.setError, { prefix: '/facts' });
    }
  });
  if (colleagues.isPending) return <Waiting label="Fetching the colleagues" />;
  if (colleagues.isError)
    return <Failed error={colleagues.error} onRetry={() => void colleagues.refetch()} />;
  const box = (
    name:
      | 'place'
      | 'tape'
      | 'tapeLengthMm'
      | 'tapeZeroMm'
      | 'fasteningPair'
      | 'note'
      | 'aloneBecause'
      | 'measuredOn'
      | 'support'
      | 'purpose',
  ) => ({
    id: name,
    error: errors[name]?.message,
    ...form.register(name),
  });
  return (
    <form
      noValidate
      onSubmit={(event) => void submit(event)}
      className="max-w-text space-y-6"
      aria-label="Sheet facts"
    >
      <ErrorSummary mistakes={mistakesOf(errors)} attempt={isSubmitting ? 0 : submitCount} />
      <Controller
        control={form.control}
        name="people"
        render={({ field, fieldState }) => (
          <PeopleChoice
            id="people"
            colleagues={colleagues.data}
            people={field.value}
            onChange={field.onChange}
            error={fieldState.error?.message ?? errors.people?.root?.message}
          />
        )}
      />
      <TextField
        optional
        label="Why one person measured alone"
        hint="Needed where nobody held the other end."
        {...box('aloneBecause')}
      />
      <div className="grid items-end gap-5 sm:grid-cols-2">
        <TextField type="date" label="Measured on" {...box('measuredOn')} />
        <TextField label="Place" hint="Room and table." {...box('place')} />
      </div>
      <Select label="How the garment lay" {...box('support')}>
        {supports.map((support) => (
          <option key={support} value={support}>
            {supportLabels[support]}
          </option>
        ))}
      </Select>
      <TextField label="Tape" hint="Which one." {...box('tape')} />
      <div className="grid items-end gap-5 sm:grid-cols-2">
        <TextField
          label="Tape length, mm"
          hint="For whole tapes."
          inputMode="decimal"
          {...box('tapeLengthMm')}
          className="figures text-right"
        />
        <TextField
          label="Tape at nothing, mm"
          hint="Taken off every reading."
          inputMode="decimal"
          {...box('tapeZeroMm')}
          className="figures text-right"
        />
      </div>
      <TextField
        optional
        label="Fastening pair"
        hint="From which hook to which eye the rounds were read."
        {...box('fasteningPair')}
      />
      <TextArea optional label="Note" {...box('note')} />
      <Select
        label="What it is for"
        hint="A study shows how well readings repeat; it is never published."
        {...box('purpose')}
      >
        <option value="record">The record of the garment</option>
        <option value="study">A study of how well readings repeat</option>
      </Select>
      {points && (
        <Controller
          control={form.control}
          name="repeatPoints"
          render={({ field }) => (
            <RepeatChoice points={points} chosen={field.value ?? []} onChange={field.onChange} />
          )}
        />
      )}
      <div className="flex flex-wrap items-center gap-3">
        <Button type="submit" tone="action" height="table" disabled={isSubmitting}>
          {verb}
        </Button>
        {aside}
        <p role="status" className="text-table text-ink-2">
          {isSubmitSuccessful && !isDirty ? 'Saved' : ''}
        </p>
      </div>
    </form>
  );
}
