import { type Image, ImageChange, imageViewLabels } from '@ellwand/shared/records/image';
import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { Button } from '../../../components/ui/button.js';
import { Select, TextArea, TextField } from '../../../components/ui/field.js';
import { Refused } from '../../../components/ui/states.js';
import { changeImage } from '../api/change-image.js';
import { imagesQuery } from '../api/images.js';

export function PictureForm({ image, onDone }: { readonly image: Image; readonly onDone: () => void }) {
  const queries = useQueryClient();
  const form = useForm<ImageChange>({
    resolver: zodResolver(ImageChange),
    defaultValues: { view: image.view, alt: image.alt, caption: image.caption, credit: image.credit },
  });
  const { errors } = form.formState;
  const save = useMutation({
    mutationFn: (change: ImageChange) => changeImage(image.id, image.version, change),
    onSuccess: async () => {
      await queries.invalidateQueries({ queryKey: imagesQuery(image.garmentId).queryKey });
      onDone();
    },
  });
  const id = (name: string) => `${name}-${image.id}`;
  return (
    <form
      noValidate
      className="mt-3 space-y-4 border-t border-hair pt-3"
      onSubmit={(event) => void form.handleSubmit((change) => save.mutate(change))(event)}
    >
      <Select id={id('view')} label="View" {...form.register('view')}>
        {Object.entries(imageViewLabels).map(([view, label]) => (
          <option key={view} value={view}>
            {label}
          </option>
        ))}
      </Select>
      <TextArea
        id={id('alt')}
        label="Description in words"
        hint="What the picture shows, for people who cannot see it."
        error={errors.alt?.message}
        {...form.register('alt')}
      />
      <TextField
        id={id('caption')}
        optional
        label="Caption"
        error={errors.caption?.message}
        {...form.register('caption')}
      />
      <TextField
        id={id('credit')}
        optional
        label="Credit"
        error={errors.credit?.message}
        {...form.register('credit')}
      />
      <Refused error={save.error} />
      <div className="flex gap-2">
        <Button type="submit" tone="action" disabled={save.isPending}>
          Save
        </Button>
        <Button tone="quiet" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
