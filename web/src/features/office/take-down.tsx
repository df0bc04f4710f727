import { useState } from 'react';
import type { ListingStatus } from '#shared/listings/machine.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useMoveListing } from './queries.ts';

/** The office takes a listing down, or puts it back, with a reason for the record. */
export function TakeDown({ id, status }: { id: string; status: ListingStatus }) {
  const [isOpen, setIsOpen] = useState(false);
  const [reason, setReason] = useState('');
  const move = useMoveListing(id);
  const event = status === 'taken-down' ? 'restore' : 'takeDown';
  const label = event === 'restore' ? 'Put it back' : 'Take it down';
  if (!['published', 'withdrawn', 'taken-down'].includes(status)) return null;
  return (
    <>
      <Button
        kind={event === 'restore' ? 'quiet' : 'danger'}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {label}
      </Button>
      <Dialog
        title={label}
        isOpen={isOpen}
        onClose={() => {
          setIsOpen(false);
        }}
      >
        <form
          className="grid gap-4"
          onSubmit={(submitted) => {
            submitted.preventDefault();
            move.mutate(
              { event, reason },
              {
                onSuccess: () => {
                  setIsOpen(false);
                },
              },
            );
          }}
        >
          <p>
            Its page is then{' '}
            {event === 'restore'
              ? 'open to everyone again'
              : 'closed to all but its seller, the office and those with a survey of it'}
            . Surveys under way go on.
          </p>
          {move.isError && <Notice kind="bad">{messageOf(move.error)}</Notice>}
          <Field label="Why" hint="Kept in the record, and shown to the seller">
            {(control) => (
              <input
                {...control}
                required
                minLength={3}
                maxLength={400}
                value={reason}
                onChange={(typed) => {
                  setReason(typed.target.value);
                }}
              />
            )}
          </Field>
          <div>
            <Button
              type="submit"
              kind={event === 'restore' ? 'primary' : 'danger'}
              isPending={move.isPending}
            >
              {label}
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}
