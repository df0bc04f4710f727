import { useState } from 'react';
import type { Survey } from '#shared/surveys/contract.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { useGiveUpCorrection } from './correction-queries.ts';
import type { Draft } from './use-draft.ts';

interface Props {
  orderId: string;
  correction: NonNullable<Survey['correction']>;
  draft: Draft;
  onGivenUp: () => void;
}

/** While a filed report is corrected: which, why, and the way back. */
export function CorrectionNote({ orderId, correction, draft, onGivenUp }: Props) {
  const [isOpen, setIsOpen] = useState(false);
  const giveUp = useGiveUpCorrection(orderId);
  const dropIt = async () => {
    // What is unsent goes first, so that nothing is sent after the survey is closed.
    await draft.store.flush();
    giveUp.mutate(undefined, { onSuccess: onGivenUp });
  };
  return (
    <Notice>
      <p className="font-medium">You are correcting version {correction.version} of a filed report.</p>
      <p>{correction.reason}</p>
      <p className="text-pencil">Nothing of it is seen until you sign and file it as a new version.</p>
      <div className="mt-2">
        <Button
          kind="danger"
          onClick={() => {
            setIsOpen(true);
          }}
        >
          Give up the correction
        </Button>
      </div>
      <Dialog
        title="Give up the correction"
        isOpen={isOpen}
        onClose={() => {
          setIsOpen(false);
        }}
      >
        <div className="grid gap-4">
          <p>What you changed here is dropped. The report stands as you filed it.</p>
          {giveUp.isError && <Notice kind="bad">{messageOf(giveUp.error)}</Notice>}
          <div>
            <Button kind="danger" isPending={giveUp.isPending} onClick={() => void dropIt()}>
              Give it up
            </Button>
          </div>
        </div>
      </Dialog>
    </Notice>
  );
}
