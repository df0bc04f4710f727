import { keepPreviousData, useInfiniteQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { EntrySkeleton, ListingEntry } from '#web/features/listings/entry.tsx';
import { readFilter, writeFilter } from '#web/features/listings/filter-address.ts';
import { FilterForm } from '#web/features/listings/filter-form.tsx';
import { listingQueries } from '#web/features/listings/queries.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Empty, Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

export function Component() {
  const [search, setSearch] = useSearchParams();
  const filter = readFilter(search);
  const {
    data,
    error,
    isPending,
    isPlaceholderData,
    hasNextPage,
    isFetchingNextPage,
    fetchNextPage,
    refetch,
  } = useInfiniteQuery({ ...listingQueries.search(filter), placeholderData: keepPreviousData });
  const listings = data?.pages.flatMap((page) => page.items) ?? [];
  const total = data?.pages[0]?.total ?? 0;
  const form = (
    <FilterForm
      filter={filter}
      onChange={(next) => {
        setSearch(writeFilter(next), { replace: true, preventScrollReset: true });
      }}
    />
  );
  return (
    <Page
      title="Boilers"
      sub={
        <output>
          {isPending ? 'Looking…' : `${String(total)} ${total === 1 ? 'boiler' : 'boilers'} on offer`}
        </output>
      }
    >
      <div className="grid gap-8 lg:grid-cols-[14rem_minmax(0,1fr)]">
        <aside aria-label="What to look for">
          <details className="border-y border-rule lg:hidden">
            <summary className="min-h-11 py-2.5 font-medium">Narrow the list</summary>
            <div className="pb-4">{form}</div>
          </details>
          <div className="hidden lg:block">{form}</div>
        </aside>
        <div aria-busy={isPlaceholderData} className={isPlaceholderData ? 'opacity-60' : ''}>
          <h2 className="sr-only">Boilers found</h2>
          {error && (
            <Notice kind="bad">
              {messageOf(error)}{' '}
              <Button kind="plain" onClick={() => void refetch()}>
                Try again
              </Button>
            </Notice>
          )}
          {data && listings.length === 0 ? (
            <Empty title="No boiler fits that">
              Take one of the conditions away, or come back: boilers are listed every week.
            </Empty>
          ) : (
            <div className="grid gap-x-8 gap-y-10 sm:grid-cols-2 xl:grid-cols-3">
              {isPending && Array.from({ length: 6 }, (_none, index) => <EntrySkeleton key={index} />)}
              {listings.map((listing, index) => (
                <ListingEntry key={listing.id} listing={listing} isFirst={index < 3} />
              ))}
            </div>
          )}
          {hasNextPage && (
            <p className="mt-8">
              <Button kind="quiet" isPending={isFetchingNextPage} onClick={() => void fetchNextPage()}>
                Show more
              </Button>
            </p>
          )}
        </div>
      </div>
    </Page>
  );
}
