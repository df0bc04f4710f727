import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useNavigate } from 'react-router-dom';
import { listingStatusLabels } from '#shared/listings/machine.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { listingQueries, useCreateListing } from '#web/features/listings/queries.ts';
import { formatInstant, formatPence } from '#web/lib/format.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Empty, Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';
import { Photo } from '#web/ui/photo.tsx';

export function Component() {
  useSignedIn();
  const { data } = useSuspenseQuery(listingQueries.own());
  const create = useCreateListing();
  const navigate = useNavigate();
  const listings = data.items.filter(({ status }) => status !== 'discarded');
  return (
    <Page
      title="Sell"
      sub="A draft saves itself as you write. Nothing is shown to anybody until you list it."
      aside={
        <Button
          isPending={create.isPending}
          onClick={() => {
            create.mutate(undefined, { onSuccess: ({ id }) => void navigate(sitePaths.sell(id)) });
          }}
        >
          List a boiler
        </Button>
      }
    >
      {create.isError && <Notice kind="bad">{messageOf(create.error)}</Notice>}
      {listings.length === 0 ? (
        <Empty title="You have listed nothing yet">
          Have the boiler before you, a rule, a camera, and whatever papers came with it. Half an hour does
          it, in as many sittings as you like.
        </Empty>
      ) : (
        <ul className="divide-y divide-rule border-y border-rule">
          {listings.map(({ id, slug, status, draft, photos, savedAt }) => {
            const [cover] = photos;
            return (
              <li key={id} className="relative flex items-start gap-4 py-4">
                <div className="w-24 flex-none sm:w-32">
                  {cover ? (
                    <Photo photo={{ ...cover, alt: '' }} shape="4/3" sizes="8rem" />
                  ) : (
                    <div className="aspect-[4/3] bg-rule" />
                  )}
                </div>
                <div className="min-w-0 flex-1">
                  <h2 className="text-lg">
                    <Link
                      className="after:absolute after:inset-0"
                      to={status === 'draft' ? sitePaths.sell(id) : sitePaths.listing(slug)}
                    >
                      {draft.title || 'A boiler without a title yet'}
                    </Link>
                  </h2>
                  <p className="text-sm text-pencil">
                    {listingStatusLabels[status]} · saved {formatInstant(savedAt)}
                  </p>
                </div>
                <span className="font-medium">
                  {draft.askingMinor === null ? '–' : formatPence(draft.askingMinor)}
                </span>
              </li>
            );
          })}
        </ul>
      )}
    </Page>
  );
}
