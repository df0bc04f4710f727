import { infiniteQueryOptions, queryOptions, useMutation } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import * as contract from '#shared/listings/contract.ts';
import type { ListingSearch, OwnListing } from '#shared/listings/contract.ts';
import type { ListingDraft } from '#shared/listings/draft.ts';
import { call } from '#web/lib/api.ts';

export type Filter = Partial<Omit<ListingSearch, 'cursor' | 'limit'>>;

export const listingQueries = {
  all: ['listings'] as const,
  search: (filter: Filter) =>
    infiniteQueryOptions({
      queryKey: [...listingQueries.all, 'search', filter] as const,
      queryFn: ({ pageParam, signal }) =>
        call(contract.listListings, { query: { ...filter, cursor: pageParam, limit: 12 } }, { signal }),
      initialPageParam: undefined as string | undefined,
      getNextPageParam: (last) => last.nextCursor ?? undefined,
    }),
  newest: (limit: number) =>
    queryOptions({
      queryKey: [...listingQueries.all, 'newest', limit] as const,
      queryFn: ({ signal }) => call(contract.listListings, { query: { limit } }, { signal }),
    }),
  detail: (slug: string) =>
    queryOptions({
      queryKey: [...listingQueries.all, 'detail', slug] as const,
      queryFn: ({ signal }) => call(contract.getListing, { params: { slug } }, { signal }),
    }),
  own: () =>
    queryOptions({
      queryKey: [...listingQueries.all, 'own'] as const,
      queryFn: ({ signal }) => call(contract.listOwnListings, {}, { signal }),
    }),
  ownDetail: (id: string) =>
    queryOptions({
      queryKey: [...listingQueries.all, 'own', id] as const,
      queryFn: ({ signal }) => call(contract.getOwnListing, { params: { id } }, { signal }),
    }),
  towns: (text: string) =>
    queryOptions({
      queryKey: ['towns', text] as const,
      queryFn: ({ signal }) => call(contract.searchTowns, { query: { q: text } }, { signal }),
      enabled: text.trim().length >= 2,
      staleTime: Infinity,
    }),
};

const keep = (client: QueryClient, listing: OwnListing): void => {
  client.setQueryData(listingQueries.ownDetail(listing.id).queryKey, listing);
};

export function useCreateListing() {
  return useMutation({
    mutationFn: () => call(contract.createListing, {}),
    onSuccess: (listing, _body, _context, { client }) => {
      keep(client, listing);
    },
  });
}

/** Saves a draft; also when the page is being left, when nothing waits for the answer. */
export function useSaveListing(id: string) {
  return useMutation({
    mutationFn: ({
      version,
      draft,
      isLeaving = false,
    }: {
      version: number;
      draft: ListingDraft;
      isLeaving?: boolean;
    }) => call(contract.saveListing, { params: { id }, body: { version, draft } }, { keepalive: isLeaving }),
    onSuccess: (listing, _body, _context, { client }) => {
      keep(client, listing);
    },
  });
}

export function useMoveListing(id: string) {
  return useMutation({
    mutationFn: (body: { event: 'publish' | 'withdraw' | 'relist' | 'discard'; reason: string }) =>
      call(contract.moveListing, { params: { id }, body }),
    onSuccess: async (listing, _body, _context, { client }) => {
      keep(client, listing);
      await client.invalidateQueries({ queryKey: listingQueries.all });
    },
  });
}
