import { queryOptions, useMutation } from '@tanstack/react-query';
import * as contract from '#shared/surveyors/contract.ts';
import type { SurveyorTerms } from '#shared/surveyors/contract.ts';
import { call } from '#web/lib/api.ts';

export const surveyorQueries = {
  all: ['surveyors'] as const,
  mine: () =>
    queryOptions({
      queryKey: [...surveyorQueries.all, 'mine'] as const,
      queryFn: ({ signal }) => call(contract.getMySurveyorTerms, {}, { signal }),
      // Back from the payment service's page, its notice may be a moment behind.
      refetchInterval: ({ state }) => (state.data?.payoutsReady === false ? 10_000 : false),
    }),
};

export function useSaveTerms() {
  return useMutation({
    mutationFn: (body: SurveyorTerms) => call(contract.saveMySurveyorTerms, { body }),
    onSuccess: (_answer, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: surveyorQueries.all }),
  });
}

export function useStartPayoutSetUp() {
  return useMutation({ mutationFn: () => call(contract.startPayoutSetUp, {}) });
}
