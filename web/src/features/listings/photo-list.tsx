import { useState } from 'react';
import type { PhotoView } from '#shared/boilers/boiler-types.ts';
import type { Photo as PhotoData } from '#shared/listings/pictures.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Photo } from '#web/ui/photo.tsx';
import { useDeletePhoto, useOrderPhotos, useUpdatePhoto } from './photo-queries.ts';

interface RowProps {
  photo: PhotoData;
  index: number;
  count: number;
  views: readonly PhotoView[];
  listingId: string;
  onMove: (from: number, to: number) => void;
}

function PhotoRow({ photo, index, count, views, listingId, onMove }: RowProps) {
  const update = useUpdatePhoto(listingId);
  const remove = useDeletePhoto(listingId);
  const [alt, setAlt] = useState(photo.alt);
  const [isAsking, setIsAsking] = useState(false);
  const error = update.error ?? remove.error;
  const name = `photograph ${String(index + 1)}`;
  return (
    <li className="grid gap-4 border-t border-rule py-4 sm:grid-cols-[10rem_1fr]">
      <div>
        <Photo photo={photo} shape="4/3" sizes="(min-width: 40rem) 10rem, 100vw" />
        {index === 0 && <p className="mt-1 text-label text-pencil">Cover</p>}
      </div>
      <div className="grid gap-3">
        <Field label="View">
          {(control) => (
            <select
              {...control}
              value={photo.view}
              onChange={(event) => {
                update.mutate({ id: photo.id, view: event.target.value });
              }}
            >
              {views.map(({ id, label }) => (
                <option key={id} value={id}>
                  {label}
                </option>
              ))}
              {!views.some(({ id }) => id === photo.view) && <option value={photo.view}>Another view</option>}
            </select>
          )}
        </Field>
        <Field
          label="What it shows"
          hint="For those who cannot see it, and for search"
          error={alt.trim() === '' ? 'Say in a few words what it shows' : undefined}
        >
          {(control) => (
            <input
              {...control}
              maxLength={300}
              value={alt}
              onChange={(event) => {
                setAlt(event.target.value);
              }}
              onBlur={() => {
                if (alt !== photo.alt) update.mutate({ id: photo.id, alt });
              }}
            />
          )}
        </Field>
        {error && <Notice kind="bad">{messageOf(error)}</Notice>}
        <div className="flex flex-wrap gap-2">
          <Button
            kind="quiet"
            disabled={index === 0}
            aria-label={`Move ${name} earlier`}
            onClick={() => {
              onMove(index, index - 1);
            }}
          >
            Earlier
          </Button>
          <Button
            kind="quiet"
            disabled={index === count - 1}
            aria-label={`Move ${name} later`}
            onClick={() => {
              onMove(index, index + 1);
            }}
          >
            Later
          </Button>
          <Button
            kind="quiet"
            disabled={index === 0}
            aria-label={`Make ${name} the cover`}
            onClick={() => {
              onMove(index, 0);
            }}
          >
            Make it the cover
          </Button>
          {isAsking ? (
            <Button
              kind="danger"
              isPending={remove.isPending}
              onClick={() => {
                remove.mutate(photo.id);
              }}
            >
              Yes, remove it
            </Button>
          ) : (
            <Button
              kind="plain"
              aria-label={`Remove ${name}`}
              onClick={() => {
                setIsAsking(true);
              }}
            >
              Remove
            </Button>
          )}
        </div>
      </div>
    </li>
  );
}

/** The photographs of a listing in order, each with its view and what it shows. */
export function PhotoList({
  photos,
  views,
  listingId,
}: {
  photos: readonly PhotoData[];
  views: readonly PhotoView[];
  listingId: string;
}) {
  const order = useOrderPhotos(listingId);
  const move = (from: number, to: number) => {
    const ids = photos.map(({ id }) => id);
    const [moved] = ids.splice(from, 1);
    if (moved !== undefined) order.mutate(ids.toSpliced(to, 0, moved));
  };
  return (
    <>
      {order.isError && <Notice kind="bad">{messageOf(order.error)}</Notice>}
      <ol aria-label="Photographs in order" className={order.isPending ? 'opacity-60' : ''}>
        {photos.map((photo, index) => (
          <PhotoRow
            key={photo.id}
            photo={photo}
            index={index}
            count={photos.length}
            views={views}
            listingId={listingId}
            onMove={move}
          />
        ))}
      </ol>
    </>
  );
}
