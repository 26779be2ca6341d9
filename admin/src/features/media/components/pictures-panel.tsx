import { useQuery } from '@tanstack/react-query';
import { Failed, Waiting } from '../../../components/ui/states.js';
import { useMay } from '../../../lib/session.js';
import { imagesQuery } from '../api/images.js';
import { useUploads } from '../use-uploads.js';
import { DropPlace } from './drop-place.js';
import { PictureCard } from './picture-card.js';
import { UploadRow } from './upload-row.js';

/** A garment's pictures: dropped or chosen, several at once, then described, ordered and shown or hidden. */
export function PicturesPanel({ garmentId }: { readonly garmentId: string }) {
  const images = useQuery(imagesQuery(garmentId));
  const mayWrite = useMay('image:write');
  const { uploads, add, again, dismiss } = useUploads(garmentId);
  return (
    <section id="pictures" aria-labelledby="pictures-title">
      <h2 id="pictures-title" className="title text-title-28">
        Pictures
      </h2>
      {mayWrite && <DropPlace onFiles={add} />}
      {uploads.length > 0 && (
        <ul className="mt-3 space-y-2" aria-label="Pictures on their way">
          {uploads.map((upload) => (
            <UploadRow
              key={upload.id}
              upload={upload}
              onAgain={() => again(upload)}
              onDismiss={() => dismiss(upload.id)}
            />
          ))}
        </ul>
      )}
      <div className="mt-3">
        {images.isPending && <Waiting label="Fetching the pictures" rows={3} />}
        {images.isError && <Failed error={images.error} onRetry={() => void images.refetch()} />}
        {images.data?.length === 0 && uploads.length === 0 && (
          <p className="text-table text-ink-3">No pictures yet. Front and back views help most.</p>
        )}
        {images.data && images.data.length > 0 && (
          <ol className="space-y-3">
            {images.data.map((image, index) => (
              <PictureCard
                key={image.id}
                image={image}
                place={index}
                count={images.data.length}
                editable={mayWrite}
              />
            ))}
          </ol>
        )}
      </div>
    </section>
  );
}
