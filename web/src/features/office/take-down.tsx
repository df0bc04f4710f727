import { useState } from 'react';
import type { ListingStatus } from '#shared/listings/machine.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { ReasonForm } from '#web/ui/reason-form.tsx';
import { useMoveListingByOffice } from './queries.ts';

const acts = {
  takeDown: {
    label: 'Take it down',
    kind: 'danger',
    follows: 'Its page is then closed to all but its seller, the office and those with a survey of it.',
  },
  restore: { label: 'Put it back', kind: 'primary', follows: 'Its page is then open to everyone again.' },
} as const;

/** The office takes a listing down, or puts it back, with a reason for the record. */
export function TakeDown({ id, status }: { id: string; status: ListingStatus }) {
  const [isOpen, setIsOpen] = useState(false);
  const [reason, setReason] = useState('');
  const move = useMoveListingByOffice(id);
  const event = status === 'taken-down' ? 'restore' : 'takeDown';
  const { label, kind, follows } = acts[event];
  if (!['published', 'withdrawn', 'taken-down'].includes(status)) return null;
  const close = () => {
    setIsOpen(false);
  };
  return (
    <>
      <Button
        kind={kind === 'primary' ? 'quiet' : kind}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {label}
      </Button>
      <Dialog title={label} isOpen={isOpen} onClose={close}>
        <ReasonForm
          hint="Kept in the record, and shown to the seller"
          label={label}
          kind={kind}
          reason={reason}
          onReason={setReason}
          isPending={move.isPending}
          error={move.error}
          onSubmit={() => {
            move.mutate({ event, reason }, { onSuccess: close });
          }}
        >
          {follows} Surveys under way go on.
        </ReasonForm>
      </Dialog>
    </>
  );
}
