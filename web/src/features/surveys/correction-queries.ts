import { useMutation } from '@tanstack/react-query';
import { giveUpCorrection } from '#shared/surveys/corrections-contract.ts';
import { call } from '#web/lib/api.ts';

export function useGiveUpCorrection(orderId: string) {
  return useMutation({
    mutationFn: () => call(giveUpCorrection, { params: { id: orderId } }),
    // Not waited for: the page goes back to the report at once.
    onSuccess: (_done, _input, _context, { client }) => {
      void client.invalidateQueries();
    },
  });
}
