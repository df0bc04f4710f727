import { QueryClient } from '@tanstack/react-query';
import { Problem } from '#shared/problem.ts';

/** A refusal is not asked for again; a fault of the server or the line is, twice. */
const isWorthAnother = (count: number, error: unknown): boolean =>
  count < 2 && !(error instanceof Problem && error.status < 500);

export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: { retry: isWorthAnother, staleTime: 5_000 },
      mutations: { retry: false },
    },
  });
