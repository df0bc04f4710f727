import { photoPath } from '#shared/listings/pictures.ts';
import type { Photo as PhotoData } from '#shared/listings/pictures.ts';

interface Props {
  photo: Pick<PhotoData, 'id' | 'alt' | 'width' | 'height' | 'widths'>;
  /** How wide it stands on the page, as in the sizes attribute. */
  sizes?: string;
  /** The first picture of a page is fetched at once; others as they come near. */
  isFirst?: boolean;
  /** Fills a frame of this shape; otherwise it keeps its own. */
  shape?: '4/3' | '1/1';
}

const set = (photo: Props['photo'], format: 'avif' | 'jpeg') =>
  photo.widths.map((width) => `${photoPath(photo.id, width, format)} ${String(width)}w`).join(', ');

/** A photograph in the format and width the browser does best with. */
export function Photo({ photo, sizes = '100vw', isFirst = false, shape }: Props) {
  const fallback = photo.widths[Math.min(1, photo.widths.length - 1)] ?? 480;
  return (
    <picture className="block">
      <source type="image/avif" srcSet={set(photo, 'avif')} sizes={sizes} />
      <img
        src={photoPath(photo.id, fallback, 'jpeg')}
        srcSet={set(photo, 'jpeg')}
        sizes={sizes}
        alt={photo.alt}
        width={photo.width}
        height={photo.height}
        loading={isFirst ? 'eager' : 'lazy'}
        fetchPriority={isFirst ? 'high' : 'auto'}
        decoding="async"
        className={`block h-auto w-full ${shape === '4/3' ? 'aspect-[4/3] object-cover' : shape === '1/1' ? 'aspect-square object-cover' : ''}`}
      />
    </picture>
  );
}
