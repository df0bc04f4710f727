import { queryOptions, useMutation } from '@tanstack/react-query';
import * as contract from '#shared/engines/contract.ts';
import type { EngineDraft } from '#shared/engines/engine.ts';
import { call } from '#web/lib/api.ts';

export const engineQueries = {
  all: ['engines'] as const,
  mine: () =>
    queryOptions({
      queryKey: [...engineQueries.all, 'mine'] as const,
      queryFn: ({ signal }) => call(contract.listEngines, {}, { signal }),
    }),
};

export function useKeepEngine() {
  return useMutation({
    mutationFn: (body: EngineDraft) => call(contract.keepEngine, { body }),
    onSuccess: (_engine, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: engineQueries.all }),
  });
}

export function useChangeEngine(id: string) {
  return useMutation({
    mutationFn: (body: EngineDraft) => call(contract.changeEngine, { params: { id }, body }),
    onSuccess: (_engine, _body, _context, { client }) =>
      client.invalidateQueries({ queryKey: engineQueries.all }),
  });
}

export function useForgetEngine(id: string) {
  return useMutation({
    mutationFn: () => call(contract.forgetEngine, { params: { id } }),
    onSuccess: (_answer, _nothing, _context, { client }) =>
      client.invalidateQueries({ queryKey: engineQueries.all }),
  });
}
