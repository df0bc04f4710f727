import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { messageOf } from '#web/lib/form-problem.ts';
import { formatInstant } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';
import type { Phase } from './draft-store.ts';
import { surveyQueries } from './queries.ts';
import type { Draft } from './use-draft.ts';

const words: Record<Phase, string> = {
  saved: 'Saved',
  unsaved: 'Not saved yet',
  saving: 'Saving',
  failed: 'Not saved',
  stale: 'Not saved',
};

/** One line that always says whether the server has everything. */
export function SaveState({ draft }: { draft: Pick<Draft, 'phase' | 'uploads'> }) {
  const sending = draft.uploads.filter(({ problem }) => problem === null).length;
  const isBad = draft.phase === 'failed' || draft.phase === 'stale';
  return (
    <output className={`text-sm ${isBad ? 'font-medium text-unfit' : 'text-pencil'}`}>
      {words[draft.phase]}
      {sending > 0 && `, ${String(sending)} ${sending === 1 ? 'photo' : 'photos'} on the way`}
    </output>
  );
}

/** What keeps the survey from being saved, and the way out. */
export function SaveTrouble({ draft, orderId }: { draft: Draft; orderId: string }) {
  if (draft.phase === 'stale') return <StaleTrouble draft={draft} orderId={orderId} />;
  if (draft.phase !== 'failed' || draft.problem === null) return null;
  const { message, errors } = draft.problem;
  return (
    <Notice kind="bad">
      <p>{message} What you recorded is kept on this page; do not close it.</p>
      {errors.length > 0 && (
        <ul className="mt-1 list-disc pl-5">
          {errors.map(({ detail, pointer }) => (
            <li key={pointer}>{detail}</li>
          ))}
        </ul>
      )}
      <div className="mt-2">
        <Button kind="quiet" onClick={() => void draft.store.flush()}>
          Try again
        </Button>
      </div>
    </Notice>
  );
}

function StaleTrouble({ draft, orderId }: { draft: Draft; orderId: string }) {
  const client = useQueryClient();
  const [fault, setFault] = useState<string>();
  const choose = async (whose: 'theirs' | 'mine') => {
    setFault(undefined);
    try {
      const theirs = await client.fetchQuery({ ...surveyQueries.detail(orderId), staleTime: 0 });
      if (whose === 'theirs') draft.store.takeTheirs(theirs);
      else await draft.store.keepMine(theirs);
    } catch (error) {
      setFault(messageOf(error));
    }
  };
  const count = draft.record.findings.length;
  return (
    <Notice kind="bad">
      <p>
        This survey was saved from another device or tab since {formatInstant(draft.savedAt)}. Nothing from
        here is sent until you choose. This page holds {count} {count === 1 ? 'item' : 'items'}.
      </p>
      {fault !== undefined && <p className="mt-1 font-medium text-unfit">{fault}</p>}
      <div className="mt-2 flex flex-wrap gap-3">
        <Button kind="quiet" onClick={() => void choose('theirs')}>
          Load the other version
        </Button>
        <Button kind="danger" onClick={() => void choose('mine')}>
          Keep mine in its place
        </Button>
      </div>
    </Notice>
  );
}
