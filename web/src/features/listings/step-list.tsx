import { useState } from 'react';
import type { OwnListing } from '#shared/listings/contract.ts';
import type { ListingDraft } from '#shared/listings/draft.ts';
import { photoFaults } from '#shared/listings/policy.ts';
import { Problem } from '#shared/problem.ts';
import type { FieldError } from '#shared/problem.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Caution, ErrorSummary, Notice } from '#web/ui/notes.tsx';
import { useMoveListing } from './queries.ts';
import { missingFrom, sellSteps, stepOf } from './sell-steps.ts';

interface Props {
  draft: ListingDraft;
  listing: OwnListing;
  /** Saves what has not been saved; false if it could not be. */
  save: () => Promise<boolean>;
  onErrors: (errors: readonly FieldError[]) => void;
  onListed: (slug: string) => void;
  onDiscarded: () => void;
}

const labelOf = (pointer: string): string => sellSteps.find(({ id }) => id === stepOf(pointer))?.label ?? '';

/** What is still missing, each leading to its step; and the button that lists it. */
export function StepList({ draft, listing, save, onErrors, onListed, onDiscarded }: Props) {
  const move = useMoveListing(listing.id);
  const [isAsking, setIsAsking] = useState(false);
  const [isSaving, setIsSaving] = useState(false);
  const missing = [...missingFrom(draft), ...photoFaults(listing.photos)];
  const isDraft = listing.status === 'draft';
  const list = async () => {
    onErrors(missing);
    setIsSaving(true);
    const isSaved = await save();
    setIsSaving(false);
    if (!isSaved || missing.length > 0) return;
    if (!isDraft) {
      onListed(listing.slug);
      return;
    }
    move.mutate(
      { event: 'publish', reason: '' },
      {
        onSuccess: ({ slug }) => {
          onListed(slug);
        },
        onError: (error) => {
          if (error instanceof Problem) onErrors(error.errors);
        },
      },
    );
  };
  return (
    <div className="grid gap-6">
      {missing.length > 0 ? (
        <ErrorSummary
          title={isDraft ? 'Before it can be listed' : 'A listed boiler must stay complete'}
          mistakes={missing.map(({ detail, pointer }) => ({
            message: `${labelOf(pointer)}: ${detail}`,
            href: `?step=${stepOf(pointer)}`,
          }))}
        />
      ) : (
        <Notice kind="good">Nothing is missing.</Notice>
      )}
      <Caution title="What you sell can scald and kill.">
        Say what you know. Do not write that it is fit to steam: that is for an inspector to say, under the
        local code.
      </Caution>
      {move.isError && <Notice kind="bad">{messageOf(move.error)}</Notice>}
      <div className="flex flex-wrap gap-4">
        <Button isPending={move.isPending || isSaving} onClick={() => void list()}>
          {isDraft ? 'List it' : 'Done'}
        </Button>
        {isDraft &&
          (isAsking ? (
            <Button
              kind="danger"
              isPending={move.isPending}
              onClick={() => {
                move.mutate({ event: 'discard', reason: '' }, { onSuccess: onDiscarded });
              }}
            >
              Yes, throw the draft away
            </Button>
          ) : (
            <Button
              kind="plain"
              onClick={() => {
                setIsAsking(true);
              }}
            >
              Throw the draft away
            </Button>
          ))}
      </div>
    </div>
  );
}
