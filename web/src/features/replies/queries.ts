import { queryOptions, useMutation } from '@tanstack/react-query';
import type { BodyOf } from '#shared/endpoint.ts';
import * as contract from '#shared/surveys/replies-contract.ts';
import { call } from '#web/lib/api.ts';

export const replyQueries = {
  all: ['replies'] as const,
  ofReport: (id: string) =>
    queryOptions({
      queryKey: [...replyQueries.all, id] as const,
      queryFn: ({ signal }) => call(contract.getReportReplies, { params: { id } }, { signal }),
    }),
};

export function useReplyToFinding(reportId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<typeof contract.replyToFinding>) =>
      call(contract.replyToFinding, { params: { id: reportId }, body }),
    onSuccess: (replies, _body, _context, { client }) => {
      client.setQueryData(replyQueries.ofReport(reportId).queryKey, replies);
    },
  });
}

export function useListRepair(reportId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<typeof contract.listRepair>) =>
      call(contract.listRepair, { params: { id: reportId }, body }),
    onSuccess: (replies, _body, _context, { client }) => {
      client.setQueryData(replyQueries.ofReport(reportId).queryKey, replies);
    },
  });
}
