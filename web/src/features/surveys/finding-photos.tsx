import { useId, useState } from 'react';
import type { Photo as PhotoData } from '#shared/listings/pictures.ts';
import type { Finding } from '#shared/surveys/record.ts';
import type { Criterion } from '#shared/surveys/rubric/types.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { Photo } from '#web/ui/photo.tsx';
import { acceptedPhotos } from './photo-uploads.ts';
import type { PhotoUpload, PhotoUploads } from './photo-uploads.ts';
import { useDescribePhoto } from './queries.ts';
import { removePhoto } from './record-edits.ts';
import type { Edit } from './record-edits.ts';
import { WordsInput } from './words-input.tsx';

interface Props {
  orderId: string;
  criterion: Criterion;
  finding: Finding | undefined;
  /** All photographs of this survey that have arrived. */
  photos: readonly PhotoData[];
  uploads: readonly PhotoUpload[];
  photoUploads: PhotoUploads;
  edit: (change: Edit) => void;
}

const tile = 'relative block size-[88px] overflow-hidden rounded border border-rule bg-sheet';

/** Photographs of a finding: taken with the phone's camera or chosen, sent at once, described or taken off by a tap. */
export function FindingPhotos({ orderId, criterion, finding, photos, uploads, photoUploads, edit }: Props) {
  const [openId, setOpenId] = useState<string>();
  const inputId = useId();
  const named = finding?.photoIds ?? [];
  const own = named.flatMap((id) => photos.find((photo) => photo.id === id) ?? []);
  const open = own.find(({ id }) => id === openId);
  const close = () => {
    setOpenId(undefined);
  };
  return (
    <section className="grid gap-2" aria-label="Photographs">
      <h2 className="text-lg">Photographs</h2>
      <p className="text-sm leading-5 text-pencil">
        Wanted: {criterion.photosWanted.join('; ').toLowerCase()}.
      </p>
      <ul className="flex flex-wrap gap-2">
        {own.map((photo) => (
          <li key={photo.id}>
            <button
              type="button"
              className={tile}
              aria-label={`Describe or take off: ${photo.alt}`}
              onClick={() => {
                setOpenId(photo.id);
              }}
            >
              <Photo photo={photo} shape="1/1" sizes="88px" />
            </button>
          </li>
        ))}
        {uploads.map((upload) => (
          <li key={upload.id}>
            <Sending upload={upload} photoUploads={photoUploads} />
          </li>
        ))}
        <li>
          <input
            id={inputId}
            type="file"
            accept={acceptedPhotos}
            capture="environment"
            multiple
            className="peer sr-only"
            onChange={({ target }) => {
              const files = [...(target.files ?? [])];
              target.value = '';
              void photoUploads.add(criterion.id, `${criterion.title}, as found`, files);
            }}
          />
          <label
            htmlFor={inputId}
            className="grid size-[88px] place-items-center rounded border border-dashed border-ink text-center text-sm leading-5 peer-focus-visible:outline-3 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-copper"
          >
            Add a photo
          </label>
        </li>
      </ul>
      <Dialog title="Photograph" isOpen={open !== undefined} onClose={close}>
        {open && (
          <PhotoForm
            orderId={orderId}
            photo={open}
            onDone={close}
            onRemove={() => {
              edit(removePhoto(criterion.id, open.id));
              close();
            }}
          />
        )}
      </Dialog>
    </section>
  );
}

function Sending({ upload, photoUploads }: { upload: PhotoUpload; photoUploads: PhotoUploads }) {
  const percent = Math.round(upload.progress * 100);
  return (
    <div className="grid max-w-64 gap-1">
      <div className={tile}>
        <img src={upload.previewUrl} alt="" className="size-full object-cover opacity-60" />
        {upload.problem === null && (
          <progress
            className="absolute inset-x-1 bottom-1 h-2 w-[calc(100%-0.5rem)] accent-copper"
            max={100}
            value={percent}
            aria-label={`Sending ${upload.name}`}
          />
        )}
      </div>
      {upload.problem !== null && (
        <div role="alert">
          <p className="text-sm leading-5 text-unfit">{upload.problem}</p>
          {upload.canRetry && (
            <Button kind="plain" onClick={() => void photoUploads.retry(upload.id)}>
              Try again
            </Button>
          )}
          <Button kind="plain" onClick={() => void photoUploads.remove(upload.id)}>
            Leave it out
          </Button>
        </div>
      )}
    </div>
  );
}

interface FormProps {
  orderId: string;
  photo: PhotoData;
  onDone: () => void;
  onRemove: () => void;
}

function PhotoForm({ orderId, photo, onDone, onRemove }: FormProps) {
  const [alt, setAlt] = useState(photo.alt);
  const describe = useDescribePhoto(orderId);
  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        describe.mutate({ id: photo.id, alt }, { onSuccess: onDone });
      }}
    >
      <Photo photo={photo} sizes="(min-width: 32rem) 30rem, 90vw" />
      <WordsInput
        label="What it shows"
        hint="For readers who cannot see it, and for the caption"
        most={300}
        rows={2}
        value={alt}
        onChange={setAlt}
      />
      {describe.isError && (
        <p role="alert" className="text-unfit">
          {messageOf(describe.error)}
        </p>
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" isPending={describe.isPending}>
          Keep
        </Button>
        <Button kind="danger" onClick={onRemove}>
          Take off this finding
        </Button>
      </div>
    </form>
  );
}
