import { queryOptions } from '@tanstack/react-query';
import { getDesk } from '#shared/desk/contract.ts';
import { call } from '#web/lib/api.ts';

export const deskQueries = {
  all: ['desk'] as const,
  items: () =>
    queryOptions({
      queryKey: [...deskQueries.all, 'items'] as const,
      queryFn: ({ signal }) => call(getDesk, {}, { signal }),
    }),
};
