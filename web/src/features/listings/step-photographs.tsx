import { lazy, Suspense, useState } from 'react';
import { boilerTypeOf } from '#shared/boilers/boiler-types.ts';
import type { OwnListing } from '#shared/listings/contract.ts';
import { PhotoList } from './photo-list.tsx';
import { Choices } from '#web/ui/check.tsx';
import { FieldGroup } from '#web/ui/field.tsx';
import { Loading } from '#web/ui/mark.tsx';
import { Notice } from '#web/ui/notes.tsx';
import type { StepProps } from './step-props.ts';

const Uploader = lazy(async () => ({
  default: (await import('./uploader.tsx')).Uploader,
}));

/** Photographs by named view for the type, so that nobody forgets the tubeplates. */
export function StepPhotographs({
  draft,
  errors,
  listing,
  onUploaded,
}: StepProps & { listing: OwnListing; onUploaded: () => void }) {
  const views = boilerTypeOf(draft.facts.type ?? 'vertical-multi-tube').views;
  const [chosen, setChosen] = useState<string>();
  const missing = views.filter(({ id }) => !listing.photos.some((photo) => photo.view === id));
  const view = chosen ?? missing[0]?.id ?? 'whole';
  const faults = errors.filter(({ pointer }) => pointer.startsWith('#/photos'));
  return (
    <div className="grid gap-8">
      {faults.length > 0 && <Notice kind="bad">{faults.map(({ detail }) => detail).join(' ')}</Notice>}
      <p className="max-w-prose">
        Location and camera data are taken out of every photograph before anybody sees it. The originals are
        kept privately.
      </p>
      <FieldGroup legend="Which view are you adding?">
        <Choices
          name="view"
          value={view}
          options={views.map(({ id, label, hint }) => ({
            id,
            label: (
              <>
                {label}
                {listing.photos.some((photo) => photo.view === id) && (
                  <span className="font-normal text-sound"> (there is one)</span>
                )}
              </>
            ),
            hint,
          }))}
          onChange={setChosen}
        />
      </FieldGroup>
      <Suspense fallback={<Loading what="Getting the uploader ready" />}>
        <Uploader
          purpose="listing-photo"
          recordId={listing.id}
          view={view}
          onUploaded={() => {
            setChosen(undefined);
            onUploaded();
          }}
        />
      </Suspense>
      <section aria-label="Photographs so far">
        <h3 className="mb-2">
          {listing.photos.length === 0 ? 'None yet' : `${String(listing.photos.length)} so far`}
        </h3>
        <PhotoList photos={listing.photos} views={views} listingId={listing.id} />
      </section>
    </div>
  );
}
