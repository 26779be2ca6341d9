import type { Image } from '@ellwand/shared/records/image';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { Refused } from '../../../components/ui/states.js';
import { deleteImage } from '../api/change-image.js';
import { imagesQuery } from '../api/images.js';

/** Deleting cannot be undone, so it is asked; hiding can, so it is offered first. */
export function DeletePicture({ image, name }: { readonly image: Image; readonly name: string }) {
  const queries = useQueryClient();
  const [asking, setAsking] = useState(false);
  const remove = useMutation({
    mutationFn: () => deleteImage(image.id, image.version),
    onSuccess: async () => {
      setAsking(false);
      await queries.invalidateQueries({ queryKey: imagesQuery(image.garmentId).queryKey });
    },
  });
  return (
    <>
      <Button height="dense" tone="danger" onClick={() => setAsking(true)}>
        Delete<span className="sr-only">: {name}</span>
      </Button>
      <Question
        open={asking}
        onClose={() => setAsking(false)}
        title="Delete this picture?"
        actions={
          <>
            <Button tone="danger" disabled={remove.isPending} onClick={() => remove.mutate()}>
              Delete the picture
            </Button>
            <Button onClick={() => setAsking(false)}>Keep it</Button>
          </>
        }
      >
        <p>
          {image.fileName} and its smaller forms will be gone, also the original. If it should only not be
          shown, hide it instead: that can be undone.
        </p>
        <Refused error={remove.error} />
      </Question>
    </>
  );
}
