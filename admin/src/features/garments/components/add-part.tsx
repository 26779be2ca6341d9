import { kindIds } from '@ellwand/shared/points/kinds';
import { type Garment, NewPart } from '@ellwand/shared/records/garment';
import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '../../../components/ui/button.js';
import { Select, TextField } from '../../../components/ui/field.js';
import { Refused } from '../../../components/ui/states.js';
import { kindWord } from '../../../lib/words/kind-word.js';
import { garmentQuery } from '../api/garment.js';
import { addPart } from '../api/parts.js';

/** Another part of the garment, with its kind, name and number. */
export function AddPart({ garment, onDone }: { readonly garment: Garment; readonly onDone: () => void }) {
  const queries = useQueryClient();
  const form = useForm<z.input<typeof NewPart>, unknown, NewPart>({
    resolver: zodResolver(NewPart),
    defaultValues: {
      kind: 'bodice',
      name: '',
      suffix: `.${garment.parts.filter(({ wornTogether }) => !wornTogether).length + 1}`,
    },
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
