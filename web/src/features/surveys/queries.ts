import { queryOptions, useMutation } from '@tanstack/react-query';
import type { BodyOf } from '#shared/endpoint.ts';
import * as contract from '#shared/surveys/contract.ts';
import type { Survey } from '#shared/surveys/contract.ts';
import { updatePhoto } from '#shared/listings/contract.ts';
import { call } from '#web/lib/api.ts';

export const surveyQueries = {
  all: ['surveys'] as const,
  detail: (orderId: string) =>
    queryOptions({
      queryKey: [...surveyQueries.all, 'detail', orderId] as const,
      queryFn: ({ signal }) => call(contract.getSurvey, { params: { id: orderId } }, { signal }),
    }),
};

/** Sends a survey as far as it has got. The draft store calls it; it is no mutation of its own, for nothing shows it. */
export const saveSurvey = (
  orderId: string,
  body: Pick<Survey, 'version' | 'record'>,
  isLast: boolean,
): Promise<Survey> => call(contract.saveSurvey, { params: { id: orderId }, body }, { keepalive: isLast });

export function useFileSurvey(orderId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<typeof contract.fileSurvey>) =>
      call(contract.fileSurvey, { params: { id: orderId }, body }),
    // Not waited for: the page goes on to the report at once.
    onSuccess: (_report, _body, _context, { client }) => {
      void client.invalidateQueries();
    },
  });
}

export function useDescribePhoto(orderId: string) {
  const { queryKey } = surveyQueries.detail(orderId);
  return useMutation({
    mutationFn: ({ id, alt }: { id: string; alt: string }) =>
      call(updatePhoto, { params: { id }, body: { alt } }),
    onSuccess: (photo, _input, _context, { client }) => {
      client.setQueryData(queryKey, (survey) =>
        survey === undefined
          ? undefined
          : { ...survey, photos: survey.photos.map((each) => (each.id === photo.id ? photo : each)) },
      );
    },
  });
}
