import { queryOptions } from '@tanstack/react-query';
import { getMethod } from '#shared/surveys/contract.ts';
import { call } from '#web/lib/api.ts';

export const methodQueries = {
  current: () =>
    queryOptions({
      queryKey: ['method'] as const,
      queryFn: ({ signal }) => call(getMethod, {}, { signal }),
      // Published and never changed: a new version comes with a new build of the site.
      staleTime: Infinity,
    }),
};
