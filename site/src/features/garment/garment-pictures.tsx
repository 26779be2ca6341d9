import { type PublishedImage } from '@ellwand/shared/records/published-garment';
import { Picture } from '../../components/ui/picture';

/** The pictures, in the order the museum set, each with what it shows and whose it is. */
export function GarmentPictures({ images }: { readonly images: readonly PublishedImage[] }) {
  if (images.length === 0) return null;
  return (
    <section className="pictures">
      <h2>Pictures</h2>
      <ul>
        {images.map((image) => (
          <li key={image.id}>
            <figure>
              <Picture image={image} sizes="(width >= 64rem) 400px, (width >= 40rem) 45vw, 92vw" />
              <figcaption>
                {image.caption}
                <span className="picture-credit">{image.credit}</span>
              </figcaption>
            </figure>
          </li>
        ))}
      </ul>
    </section>
  );
}
