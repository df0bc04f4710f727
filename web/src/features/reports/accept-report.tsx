import { useAcceptReport } from '#web/features/survey-orders/queries.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';

/** For the buyer, while the report is in review. */
export function AcceptReport({ orderId }: { orderId: string }) {
  const accept = useAcceptReport(orderId);
  return (
    <Notice>
      <p>
        You commissioned this report. Accept it once you have read it: the fee held for it then goes to the
        surveyor.
      </p>
      {accept.isError && (
        <p role="alert" className="mt-1 font-medium text-unfit">
          {messageOf(accept.error)}
        </p>
      )}
      <div className="mt-3">
        <Button
          isPending={accept.isPending}
          onClick={() => {
            accept.mutate({});
          }}
        >
          Accept the report
        </Button>
      </div>
    </Notice>
  );
}
