import { queryOptions, useMutation } from '@tanstack/react-query';
import { acceptReport } from '#shared/survey-orders/contract.ts';
import { checkReport, getReport } from '#shared/surveys/contract.ts';
import { call } from '#web/lib/api.ts';

export const reportQueries = {
  all: ['reports'] as const,
  detail: (id: string) =>
    queryOptions({
      queryKey: [...reportQueries.all, 'detail', id] as const,
      queryFn: ({ signal }) => call(getReport, { params: { id } }, { signal }),
    }),
  /** Asked afresh each time: what is wanted is how the report stands now. */
  check: (code: string) =>
    queryOptions({
      queryKey: [...reportQueries.all, 'check', code] as const,
      queryFn: ({ signal }) => call(checkReport, { params: { code } }, { signal }),
      staleTime: 0,
      gcTime: 0,
    }),
};

/** The buyer has read the report; the fee goes to the surveyor. */
export function useAcceptReport(orderId: string) {
  return useMutation({
    mutationFn: () => call(acceptReport, { params: { id: orderId } }),
    onSuccess: (_order, _input, _context, { client }) => client.invalidateQueries(),
  });
}
