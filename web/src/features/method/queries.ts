import { queryOptions } from '@tanstack/react-query';
import { getMethod } from '#shared/surveys/contract.ts';
import { call } from '#web/lib/api.ts';

export const methodQueries = {
  /** One version of the method; the current one where none is named. */
  version: (version: string | null) =>
    queryOptions({
      queryKey: ['method', version] as const,
      queryFn: ({ signal }) => call(getMethod, { query: version === null ? {} : { version } }, { signal }),
      // Published and never changed: a new version comes with a new build of the site.
      staleTime: Infinity,
    }),
};
