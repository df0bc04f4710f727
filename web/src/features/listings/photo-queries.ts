import { useMutation } from '@tanstack/react-query';
import * as contract from '#shared/listings/contract.ts';
import { listingQueries } from './queries.ts';
import { call } from '#web/lib/api.ts';

export function useUpdatePhoto(listingId: string) {
  return useMutation({
    mutationFn: ({ id, ...body }: { id: string; view?: string; alt?: string }) =>
      call(contract.updatePhoto, { params: { id }, body }),
    onSuccess: (_photo, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: listingQueries.ownDetail(listingId).queryKey }),
  });
}

export function useDeletePhoto(listingId: string) {
  return useMutation({
    mutationFn: (id: string) => call(contract.deletePhoto, { params: { id } }),
    onSuccess: (_photo, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: listingQueries.ownDetail(listingId).queryKey }),
  });
}

export function useOrderPhotos(listingId: string) {
  return useMutation({
    mutationFn: (photoIds: string[]) =>
      call(contract.orderPhotos, { params: { id: listingId }, body: { photoIds } }),
    onSuccess: (_listing, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: listingQueries.ownDetail(listingId).queryKey }),
  });
}

export function useDeleteDocument(listingId: string) {
  return useMutation({
    mutationFn: (id: string) => call(contract.deleteDocument, { params: { id } }),
    onSuccess: (_done, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: listingQueries.ownDetail(listingId).queryKey }),
  });
}
