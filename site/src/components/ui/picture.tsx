import type { PublishedImage } from '@ellwand/shared/records/published-garment';
import { paths } from '../../config/paths';

interface PictureProps {
  readonly image: PublishedImage;
  /** How wide it will stand, as the `sizes` attribute says it. */
  readonly sizes: string;
  readonly className?: string;
  /** Above the fold: fetched first. Everything else waits until it is near. */
  readonly first?: boolean;
}

/** A picture in the forms that exist of it: AVIF where the browser knows it, else JPEG. */
export function Picture({ image, sizes, className, first = false }: PictureProps) {
  const widths = [...image.widths].sort((a, b) => a - b);
  const set = (format: 'avif' | 'jpg') =>
    widths.map((width) => `${paths.picture(image.id, width, format)} ${width}w`).join(', ');
  const fallback = widths.find((width) => width >= 640) ?? widths.at(-1) ?? 320;
  return (
    <picture>
      <source type="image/avif" srcSet={set('avif')} sizes={sizes} />
      <img
        src={paths.picture(image.id, fallback, 'jpg')}
        srcSet={set('jpg')}
        sizes={sizes}
        width={image.widthPx}
        height={image.heightPx}
        alt={image.alt}
        className={className}
        loading={first ? 'eager' : 'lazy'}
        fetchPriority={first ? 'high' : 'auto'}
        decoding="async"
      />
    </picture>
  );
}
