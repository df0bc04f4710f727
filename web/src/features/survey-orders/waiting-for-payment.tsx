import { useEffect, useRef } from 'react';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useOrderAct } from './queries.ts';

/** Back from the card page before the payment service's notice: asks it directly, once, and again on request. */
export function WaitingForPayment({ order }: { order: SurveyOrder }) {
  const check = useOrderAct('checkPayment', order.id);
  const hasAsked = useRef(false);
  const { mutate } = check;
  useEffect(() => {
    if (hasAsked.current) return;
    hasAsked.current = true;
    mutate({});
  }, [mutate]);
  if (check.isPending) return <Notice>Asking the payment service whether the card was charged…</Notice>;
  return (
    <Notice kind={check.isError ? 'bad' : 'plain'}>
      {check.isError
        ? messageOf(check.error)
        : 'The payment service has not confirmed the payment yet. You are not charged twice if you wait.'}{' '}
      <Button
        kind="plain"
        onClick={() => {
          mutate({});
        }}
      >
        Ask again
      </Button>
    </Notice>
  );
}
