import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import type { Draft } from './use-draft.ts';

/** Holds a person back from leaving for another page while something is unsent; lets them go once it is. */
export function LeaveGuard({ draft }: { draft: Pick<Draft, 'isUnsent' | 'store' | 'uploads'> }) {
  const { isUnsent, store, uploads } = draft;
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => isUnsent && currentLocation.pathname !== nextLocation.pathname,
  );
  const isBlocked = blocker.state === 'blocked';
  useEffect(() => {
    if (isBlocked) void store.flush();
  }, [isBlocked, store]);
  useEffect(() => {
    if (blocker.state === 'blocked' && !isUnsent) blocker.proceed();
  }, [blocker, isUnsent]);
  return (
    <Dialog title="Not everything is saved" isOpen={isBlocked && isUnsent} onClose={() => blocker.reset?.()}>
      <p>
        {uploads.length > 0
          ? 'There are photographs that have not arrived yet. They are on this page only, and leaving loses them.'
          : 'Your last entries are on this page only, and leaving loses them.'}
      </p>
      <div className="mt-4 flex flex-wrap gap-3">
        <Button onClick={() => blocker.reset?.()}>Stay</Button>
        <Button kind="danger" onClick={() => blocker.proceed?.()}>
          Leave without them
        </Button>
      </div>
    </Dialog>
  );
}
