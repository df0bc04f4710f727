import { queryOptions, useMutation } from '@tanstack/react-query';
import type { AnyEndpoint, BodyOf } from '#shared/endpoint.ts';
import * as contract from '#shared/survey-orders/contract.ts';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import { call } from '#web/lib/api.ts';

export const surveyOrderQueries = {
  all: ['survey-orders'] as const,
  list: () =>
    queryOptions({
      queryKey: [...surveyOrderQueries.all, 'list'] as const,
      queryFn: ({ signal }) => call(contract.listSurveyOrders, {}, { signal }),
    }),
  detail: (id: string) =>
    queryOptions({
      queryKey: [...surveyOrderQueries.all, 'detail', id] as const,
      queryFn: ({ signal }) => call(contract.getSurveyOrder, { params: { id } }, { signal }),
    }),
  quotes: (listingId: string, wanted: { scope: ScopeId; extras: ExtraId[] }) =>
    queryOptions({
      queryKey: [...surveyOrderQueries.all, 'quotes', listingId, wanted] as const,
      queryFn: ({ signal }) =>
        call(contract.quoteSurvey, { params: { id: listingId }, body: wanted }, { signal }),
      staleTime: 30_000,
    }),
};

/** What can be done to an order, each an operation of the API that answers with the order as it then is. */
export const orderActs = {
  accept: contract.acceptSurveyOrder,
  decline: contract.declineSurveyOrder,
  proposeTimes: contract.proposeTimes,
  agreeTime: contract.agreeTime,
  begin: contract.beginSurvey,
  abandon: contract.abandonSurvey,
  cancel: contract.cancelSurveyOrder,
  acceptReport: contract.acceptReport,
  checkPayment: contract.checkPayment,
} as const satisfies Record<string, AnyEndpoint>;
type OrderAct = keyof typeof orderActs;
export type ActBody<A extends OrderAct> = BodyOf<(typeof orderActs)[A]>;

/** Does one act to an order; every list that could show it is read again. */
export function useOrderAct<A extends OrderAct>(act: A, id: string) {
  return useMutation({
    mutationFn: async (body: ActBody<A>): Promise<SurveyOrder> =>
      contract.surveyOrder.parse(await call(orderActs[act] as AnyEndpoint, { params: { id }, body })),
    onSuccess: async (order, _body, _context, { client }) => {
      client.setQueryData(surveyOrderQueries.detail(id).queryKey, order);
      await Promise.all([
        client.invalidateQueries({ queryKey: surveyOrderQueries.list().queryKey }),
        client.invalidateQueries({ queryKey: ['desk'] }),
        client.invalidateQueries({ queryKey: ['reports'] }),
      ]);
    },
    // Somebody else was first: show the order as it now is.
    onError: (_error, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: surveyOrderQueries.detail(id).queryKey }),
  });
}

export const useAcceptReport = (orderId: string) => useOrderAct('acceptReport', orderId);

export function usePlaceSurveyOrder() {
  return useMutation({
    mutationFn: (body: BodyOf<typeof contract.placeSurveyOrder>) => call(contract.placeSurveyOrder, { body }),
    onSuccess: ({ order }, _body, _context, { client }) => {
      client.setQueryData(surveyOrderQueries.detail(order.id).queryKey, order);
    },
  });
}

export function usePayForSurvey(id: string) {
  return useMutation({ mutationFn: () => call(contract.payForSurvey, { params: { id } }) });
}
