import { queryOptions, useMutation } from '@tanstack/react-query';
import { checkReport, getReport, getReportAgreements } from '#shared/surveys/contract.ts';
import { getReportVersions, startCorrection } from '#shared/surveys/corrections-contract.ts';
import { surveyQueries } from '#web/features/surveys/queries.ts';
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
  versions: (id: string) =>
    queryOptions({
      queryKey: [...reportQueries.all, 'versions', id] as const,
      queryFn: ({ signal }) => call(getReportVersions, { params: { id } }, { signal }),
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

export function useStartCorrection(reportId: string) {
  return useMutation({
    mutationFn: (body: { reason: string }) => call(startCorrection, { params: { id: reportId }, body }),
    onSuccess: (survey, _body, _context, { client }) => {
      // The examination opens on this, not on the filed survey that may still be held.
      client.setQueryData(surveyQueries.detail(survey.orderId).queryKey, survey);
      void client.invalidateQueries({ queryKey: reportQueries.all });
    },
  });
}
