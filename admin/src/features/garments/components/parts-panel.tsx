import { kindIds } from '@ellwand/shared/points/kinds';
import { type Garment, NewPart, type Part } from '@ellwand/shared/records/garment';
import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import type { z } from 'zod';
import { Button, ButtonLink } from '../../../components/ui/button.js';
import { Select, TextField } from '../../../components/ui/field.js';
import { Refused } from '../../../components/ui/states.js';
import { paths } from '../../../config/paths.js';
import { dayText } from '../../../lib/moments.js';
import { useMay } from '../../../lib/session.js';
import { garmentQuery } from '../api/garment.js';
import { addPart, removePart } from '../api/parts.js';
import { kindWord } from '../../../lib/words/kind-word.js';

/** The garment's parts and their measuring sheets. */
export function PartsPanel({ garment, locked }: { readonly garment: Garment; readonly locked: boolean }) {
  const [adding, setAdding] = useState(false);
  return (
    <section id="parts" aria-labelledby="parts-title">
      <h2 id="parts-title" className="title text-title-28">
        Parts and sheets
      </h2>
      <ul className="mt-2 space-y-3">
        {garment.parts.map((part) => (
          <PartCard key={part.id} garment={garment} part={part} locked={locked} />
        ))}
      </ul>
      {!locked && !adding && (
        <Button className="mt-3" onClick={() => setAdding(true)}>
          Add a part
        </Button>
      )}
      {adding && <AddPart garment={garment} onDone={() => setAdding(false)} />}
    </section>
  );
}

function PartCard({
  garment,
  part,
  locked,
}: {
  readonly garment: Garment;
  readonly part: Part;
  readonly locked: boolean;
}) {
  const mayMeasure = useMay('sheet:write');
  const queries = useQueryClient();
  const remove = useMutation({
    mutationFn: () => removePart(part.id, garment.version),
    onSuccess: (next) => queries.setQueryData(garmentQuery(garment.id).queryKey, next),
  });
  return (
    <li className="rounded-sm border border-hair bg-sheet p-4">
      <div className="flex items-baseline justify-between gap-3">
        <h3 className="text-body font-semibold">{part.name}</h3>
        <span className="figures text-label text-ink-3">
          {garment.record.ownNumber}
          {part.suffix}
        </span>
      </div>
      {part.sheets.length === 0 && <p className="text-table text-ink-3">Not measured yet.</p>}
      <ul className="mt-1">
        {part.sheets.map((sheet) => (
          <li key={sheet.id} className="border-t border-hair py-2 first:border-t-0">
            <Link
              to={paths.sheet(sheet.id)}
              className="text-table font-medium text-indigo underline underline-offset-4"
            >
              Sheet of {dayText(sheet.measuredOn)}
            </Link>
            <p className="figures text-label text-ink-2">
              {sheet.state === 'complete' ? 'Complete' : 'Open'}, {sheet.pointsDone} of {sheet.pointsWanted}{' '}
              points
            </p>
          </li>
        ))}
      </ul>
      <div className="mt-2 flex flex-wrap gap-2">
        {mayMeasure && !locked && (
          <ButtonLink height="dense" to={paths.newSheet(garment.id, part.id)}>
            New measuring sheet <span className="sr-only">for {part.name}</span>
          </ButtonLink>
        )}
        <ButtonLink height="dense" to={paths.cutSheet(garment.id, part.id)}>
          Cut sheet <span className="sr-only">of {part.name}</span>
        </ButtonLink>
        {!locked && part.sheets.length === 0 && garment.parts.length > 1 && (
          <Button height="dense" tone="quiet" disabled={remove.isPending} onClick={() => remove.mutate()}>
            Remove <span className="sr-only">{part.name}</span>
          </Button>
        )}
      </div>
      <Refused error={remove.error} />
    </li>
  );
}

function AddPart({ garment, onDone }: { readonly garment: Garment; readonly onDone: () => void }) {
  const queries = useQueryClient();
  const form = useForm<z.input<typeof NewPart>, unknown, NewPart>({
    resolver: zodResolver(NewPart),
    defaultValues: { kind: 'bodice', name: '', suffix: `.${garment.parts.length + 1}` },
  });
  const { errors } = form.formState;
  const add = useMutation({
    mutationFn: (part: NewPart) => addPart(garment.id, garment.version, part),
    onSuccess: (next) => {
      queries.setQueryData(garmentQuery(garment.id).queryKey, next);
      onDone();
    },
  });
  return (
    <form
      noValidate
      className="mt-3 space-y-4 rounded-sm border border-hair bg-sheet p-4"
      onSubmit={(event) => void form.handleSubmit((part) => add.mutate(part))(event)}
    >
      <Select id="part-kind" label="Kind of part" {...form.register('kind')}>
        {kindIds.map((kind) => (
          <option key={kind} value={kind}>
            {kindWord(kind)}
          </option>
        ))}
      </Select>
      <TextField
        id="part-name"
        label="Name"
        hint="As it is called on its sheet: “Day bodice”."
        error={errors.name?.message}
        {...form.register('name')}
      />
      <TextField
        id="part-suffix"
        optional
        label="Added to the number"
        hint=".1 or a"
        error={errors.suffix?.message}
        {...form.register('suffix')}
      />
      <Refused error={add.error} />
      <div className="flex gap-2">
        <Button type="submit" tone="action" disabled={add.isPending}>
          Add the part
        </Button>
        <Button tone="quiet" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
