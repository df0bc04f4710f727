import { useState } from 'react';
import type { Photo as PhotoData } from '#shared/listings/pictures.ts';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';
import { Photo } from './photo.tsx';

/** Photographs to press on; each opens in a viewer with arrow keys. */
export function PhotoViewer({
  photos,
  title,
  layout = 'lead',
}: {
  photos: readonly PhotoData[];
  title: string;
  layout?: 'lead' | 'row';
}) {
  const [open, setOpen] = useState<number>();
  const current = open === undefined ? undefined : photos[open];
  const step = (by: number) => {
    setOpen((at) => (at === undefined ? at : (at + by + photos.length) % photos.length));
  };
  return (
    <>
      <ul
        className={
          layout === 'lead'
            ? 'grid grid-cols-3 content-start gap-2 self-start [&>li:first-child]:col-span-3'
            : 'grid grid-cols-3 gap-2 sm:grid-cols-4'
        }
      >
        {photos.map((photo, index) => (
          <li key={photo.id}>
            <button
              type="button"
              className="block w-full"
              aria-label={`Open photograph: ${photo.alt}`}
              onClick={() => {
                setOpen(index);
              }}
            >
              <Photo
                photo={photo}
                isFirst={layout === 'lead' && index === 0}
                shape="4/3"
                sizes={
                  layout === 'lead' && index === 0
                    ? '(min-width: 64rem) 44rem, 100vw'
                    : '(min-width: 64rem) 14rem, 33vw'
                }
              />
            </button>
          </li>
        ))}
      </ul>
      <Dialog
        title={title}
        isOpen={current !== undefined}
        isWide
        onClose={() => {
          setOpen(undefined);
        }}
      >
        {current && (
          <div
            onKeyDown={(event) => {
              if (event.key === 'ArrowRight') step(1);
              if (event.key === 'ArrowLeft') step(-1);
            }}
            role="presentation"
          >
            <div className="max-h-[70dvh] overflow-auto">
              <Photo photo={current} sizes="(min-width: 64rem) 60rem, 100vw" />
            </div>
            <p className="mt-3 text-sm text-pencil">{current.alt}</p>
            <div className="mt-3 flex items-center justify-between gap-4">
              <Button
                kind="quiet"
                onClick={() => {
                  step(-1);
                }}
                disabled={photos.length < 2}
              >
                Previous
              </Button>
              <span className="text-sm text-pencil">
                {(open ?? 0) + 1} of {photos.length}
              </span>
              <Button
                kind="quiet"
                onClick={() => {
                  step(1);
                }}
                disabled={photos.length < 2}
              >
                Next
              </Button>
            </div>
          </div>
        )}
      </Dialog>
    </>
  );
}
