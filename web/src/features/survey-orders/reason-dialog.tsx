import { useState } from 'react';
import type { ReactNode } from 'react';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { Field } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useOrderAct } from './queries.ts';

interface Props {
  act: 'decline' | 'cancel' | 'abandon';
  orderId: string;
  /** What the button says, and the dialog is headed. */
  label: string;
  /** What follows from it, in words, before anything is done. */
  children: ReactNode;
}

/** An act that ends an order: says what follows, asks why, then does it. */
export function ReasonDialog({ act, orderId, label, children }: Props) {
  const [isOpen, setIsOpen] = useState(false);
  const [reason, setReason] = useState('');
  const [isShort, setIsShort] = useState(false);
  const doIt = useOrderAct(act, orderId);
  return (
    <>
      <Button
        kind="danger"
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
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            setIsShort(reason.trim().length < 3);
            if (reason.trim().length < 3) return;
            doIt.mutate(
              { reason },
              {
                onSuccess: () => {
                  setIsOpen(false);
                },
              },
            );
          }}
        >
          <div>{children}</div>
          {doIt.isError && <Notice kind="bad">{messageOf(doIt.error)}</Notice>}
          <Field
            label="Why"
            hint="The others read this"
            error={isShort && reason.trim().length < 3 ? 'Give a reason in a few words' : undefined}
          >
            {(control) => (
              <textarea
                {...control}
                rows={3}
                maxLength={400}
                value={reason}
                onChange={(event) => {
                  setReason(event.target.value);
                }}
              />
            )}
          </Field>
          <div>
            <Button kind="danger" type="submit" isPending={doIt.isPending}>
              {label}
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}
