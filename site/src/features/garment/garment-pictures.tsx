import type { PublishedImage } from '@ellwand/shared/records/published-garment';
import { Picture } from '../../components/ui/picture';
import { paths } from '../../config/paths';

/** The pictures, in the order the museum set, each with what it shows and whose it is. */
export function GarmentPictures({ images }: { readonly images: readonly PublishedImage[] }) {
  if (images.length === 0) return null;
  return (
    <section className="pictures" id="pictures" aria-labelledby="pictures-title">
      <h2 id="pictures-title">Pictures</h2>
      <ul>
        {images.map((image) => (
          <li key={image.id}>
            <figure>
              <a href={paths.picture(image.id, Math.max(...image.widths), 'jpg')}>
                <Picture image={image} sizes="(width >= 64rem) 400px, (width >= 40rem) 45vw, 92vw" />
              </a>
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
