import { infiniteQueryOptions, queryOptions, useMutation } from '@tanstack/react-query';
import type { BodyOf } from '#shared/endpoint.ts';
import * as contract from '#shared/office/contract.ts';
import type { OrderStatus } from '#shared/survey-orders/machine.ts';
import { call } from '#web/lib/api.ts';

export const officeQueries = {
  all: ['office'] as const,
  orders: (status: OrderStatus | undefined) =>
    queryOptions({
      queryKey: [...officeQueries.all, 'orders', status] as const,
      queryFn: ({ signal }) => call(contract.listOfficeOrders, { query: { status } }, { signal }),
    }),
  money: () =>
    queryOptions({
      queryKey: [...officeQueries.all, 'money'] as const,
      queryFn: ({ signal }) => call(contract.getOfficeMoney, {}, { signal }),
    }),
  ledger: () =>
    infiniteQueryOptions({
      queryKey: [...officeQueries.all, 'ledger'] as const,
      queryFn: ({ pageParam, signal }) =>
        call(contract.listLedger, { query: { cursor: pageParam } }, { signal }),
      initialPageParam: undefined as string | undefined,
      getNextPageParam: (last) => last.nextCursor ?? undefined,
    }),
  audit: () =>
    infiniteQueryOptions({
      queryKey: [...officeQueries.all, 'audit'] as const,
      queryFn: ({ pageParam, signal }) =>
        call(contract.listAudit, { query: { cursor: pageParam } }, { signal }),
      initialPageParam: undefined as string | undefined,
      getNextPageParam: (last) => last.nextCursor ?? undefined,
    }),
  members: (text: string) =>
    queryOptions({
      queryKey: [...officeQueries.all, 'members', text] as const,
      queryFn: ({ signal }) => call(contract.listMembers, { query: { q: text } }, { signal }),
    }),
};

export function useChangeRole(memberId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<typeof contract.changeRole>) =>
      call(contract.changeRole, { params: { id: memberId }, body }),
    onSuccess: (_member, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: officeQueries.all }),
  });
}

export function useMoveListingByOffice(listingId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<typeof contract.moveListingByOffice>) =>
      call(contract.moveListingByOffice, { params: { id: listingId }, body }),
    onSuccess: async (_answer, _body, _context, { client }) => {
      await client.invalidateQueries({ queryKey: ['listings'] });
      await client.invalidateQueries({ queryKey: officeQueries.all });
    },
  });
}
