import { useState } from 'react';
import type { ReactNode } from 'react';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { ReasonForm } from '#web/ui/reason-form.tsx';
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
  const doIt = useOrderAct(act, orderId);
  const close = () => {
    setIsOpen(false);
  };
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
      <Dialog title={label} isOpen={isOpen} onClose={close}>
        <ReasonForm
          hint="The others read this"
          label={label}
          reason={reason}
          onReason={setReason}
          isPending={doIt.isPending}
          error={doIt.error}
          onSubmit={() => {
            doIt.mutate({ reason }, { onSuccess: close });
          }}
        >
          {children}
        </ReasonForm>
      </Dialog>
    </>
  );
}
