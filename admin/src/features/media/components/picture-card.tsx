import { type Image, type ImageChange, imageViewLabels } from '@ellwand/shared/records/image';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.js';
import { Refused } from '../../../components/ui/states.js';
import { staffPicture } from '../../../config/paths.js';
import { changeImage } from '../api/change-image.js';
import { imagesQuery } from '../api/images.js';
import { DeletePicture } from './delete-picture.js';
import { PictureForm } from './picture-form.js';

interface PictureCardProps {
  readonly image: Image;
  /** Its place in the order, from 0. */
  readonly place: number;
  readonly count: number;
  readonly editable: boolean;
}

export function PictureCard({ image, place, count, editable }: PictureCardProps) {
  const [editing, setEditing] = useState(false);
  const queries = useQueryClient();
  const change = useMutation({
    mutationFn: (body: ImageChange) => changeImage(image.id, image.version, body),
    onSettled: () => queries.invalidateQueries({ queryKey: imagesQuery(image.garmentId).queryKey }),
  });
  const name = `${imageViewLabels[image.view]}, picture ${place + 1}`;
  return (
    <li className="rounded-sm border border-hair bg-sheet p-3">
      <div className="flex gap-3">
        <Thumb image={image} />
        <div className="min-w-0 grow text-table">
          <p className="font-medium">
            {imageViewLabels[image.view]}
            {image.hidden && (
              <span className="ml-2 rounded-sm bg-well px-1.5 py-0.5 text-label text-ink-2">
                hidden from the public
              </span>
            )}
          </p>
          <p className="truncate text-label text-ink-3">{image.fileName}</p>
          {image.state === 'ready' && (
            <p className="text-label text-ink-2">
              {image.alt || 'No description yet: people who cannot see it need one.'}
            </p>
          )}
          <Making image={image} />
        </div>
      </div>
      {editable && !editing && (
        <div className="mt-2 flex flex-wrap gap-2">
          <Button height="dense" onClick={() => setEditing(true)}>
            Describe<span className="sr-only">: {name}</span>
          </Button>
          <Button
            height="dense"
            disabled={place === 0 || change.isPending}
            onClick={() => change.mutate({ position: place - 1 })}
          >
            Earlier<span className="sr-only">: {name}</span>
          </Button>
          <Button
            height="dense"
            disabled={place === count - 1 || change.isPending}
            onClick={() => change.mutate({ position: place + 1 })}
          >
            Later<span className="sr-only">: {name}</span>
          </Button>
          <Button
            height="dense"
            disabled={change.isPending}
            onClick={() => change.mutate({ hidden: !image.hidden })}
          >
            {image.hidden ? 'Show' : 'Hide'}
            <span className="sr-only">: {name}</span>
          </Button>
          <DeletePicture image={image} name={name} />
        </div>
      )}
      <Refused error={change.error} />
      {editing && <PictureForm image={image} onDone={() => setEditing(false)} />}
    </li>
  );
}

function Thumb({ image }: { readonly image: Image }) {
  const box = 'h-24 w-20 shrink-0 rounded-sm bg-well';
  if (image.state !== 'ready') return <div className={box} aria-hidden="true" />;
  return (
    <img
      src={staffPicture(image.id, image.widths[0] ?? 320)}
      alt={image.alt}
      loading="lazy"
      className={`${box} object-cover object-top ${image.hidden ? 'opacity-50' : ''}`}
    />
  );
}

/** What is happening to a picture that has arrived: a true fraction, or the sentence of refusal. */
function Making({ image }: { readonly image: Image }) {
  if (image.state === 'refused')
    return <p className="text-label font-medium text-madder">Refused: {image.refusal}</p>;
  if (image.state === 'ready') return null;
  return (
    <div role="status" className="text-label text-ink-2">
      <progress
        aria-label={`Making smaller forms of ${image.fileName}`}
        value={image.formsMade}
        max={Math.max(1, image.formsWanted)}
        className="progress w-full"
      />
      {image.state === 'received'
        ? 'Received; waiting its turn'
        : `Making smaller forms, ${image.formsMade} of ${image.formsWanted}`}
    </div>
  );
}
