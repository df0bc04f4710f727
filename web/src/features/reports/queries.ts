import { queryOptions } from '@tanstack/react-query';
import { checkReport, getReport, getReportAgreements } from '#shared/surveys/contract.ts';
import { call } from '#web/lib/api.ts';

export const reportQueries = {
  all: ['reports'] as const,
  detail: (id: string) =>
    queryOptions({
      queryKey: [...reportQueries.all, 'detail', id] as const,
      queryFn: ({ signal }) => call(getReport, { params: { id } }, { signal }),
    }),
  agreements: (id: string) =>
    queryOptions({
      queryKey: [...reportQueries.all, 'agreements', id] as const,
      queryFn: ({ signal }) => call(getReportAgreements, { params: { id } }, { signal }),
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
