import { useState } from 'react';
import { sitePaths } from '#shared/site-paths.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button, ButtonLink } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { ReasonForm } from '#web/ui/reason-form.tsx';
import { useMoveListing } from './queries.ts';

/** What the seller may do with a listing. */
export function SellerActions({ id, events }: { id: string; events: readonly string[] }) {
  const move = useMoveListing(id);
  const [isAsking, setIsAsking] = useState(false);
  const [reason, setReason] = useState('');
  return (
    <div className="grid gap-3">
      <div className="flex flex-wrap gap-3">
        <ButtonLink to={sitePaths.sell(id)} kind="quiet">
          Edit
        </ButtonLink>
        {events.includes('withdraw') && (
          <Button
            kind="danger"
            onClick={() => {
              setIsAsking(true);
            }}
          >
            Withdraw
          </Button>
        )}
        {events.includes('relist') && (
          <Button
            isPending={move.isPending}
            onClick={() => {
              move.mutate({ event: 'relist', reason: '' });
            }}
          >
            List again
          </Button>
        )}
      </div>
      {move.isError && !isAsking && <Notice kind="bad">{messageOf(move.error)}</Notice>}
      <Dialog
        title="Withdraw this boiler"
        isOpen={isAsking}
        onClose={() => {
          setIsAsking(false);
        }}
      >
        <ReasonForm
          hint="Kept in the record"
          label="Withdraw it"
          isOptional
          reason={reason}
          onReason={setReason}
          isPending={move.isPending}
          error={move.error}
          onSubmit={() => {
            move.mutate(
              { event: 'withdraw', reason },
              {
                onSuccess: () => {
                  setIsAsking(false);
                },
              },
            );
          }}
        >
          It goes from the list at once. You can list it again. Surveys under way go on.
        </ReasonForm>
      </Dialog>
    </div>
  );
}
