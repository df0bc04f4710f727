import { useEffect, useState } from 'react';
import type { SurveyOrder } from '#shared/survey-orders/contract.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useOrderAct } from './queries.ts';

const everyMs = 3_000;
const mostAsks = 20;

/** Back from the card page before the payment service's notice: asks it directly for a minute, then on request. */
export function WaitingForPayment({ order }: { order: SurveyOrder }) {
  const [asked, setAsked] = useState(0);
  const { mutate, isPending, isError, error } = useOrderAct('checkPayment', order.id);
  useEffect(() => {
    if (isPending || isError || asked >= mostAsks) return undefined;
    const timer = setTimeout(
      () => {
        setAsked(asked + 1);
        mutate({});
      },
      asked === 0 ? 0 : everyMs,
    );
    return () => {
      clearTimeout(timer);
    };
  }, [asked, isPending, isError, mutate]);
  if (!isError && asked < mostAsks)
    return <Notice>Asking the payment service whether the card was charged…</Notice>;
  return (
    <Notice kind={isError ? 'bad' : 'plain'}>
      {isError
        ? messageOf(error)
        : 'The payment service has not confirmed the payment yet. You are not charged twice if you wait.'}{' '}
      <Button
        kind="plain"
        isPending={isPending}
        onClick={() => {
          mutate({});
        }}
      >
        Ask again
      </Button>
    </Notice>
  );
}
