import { useCallback, useEffect, useRef, useState } from 'react';
import type { OwnListing } from '#shared/listings/contract.ts';
import type { ListingDraft } from '#shared/listings/draft.ts';
import { Problem } from '#shared/problem.ts';
import { useSaveListing } from './queries.ts';

export type SaveState = 'saved' | 'waiting' | 'saving' | 'failed' | 'stale';

const quietMs = 800;

/**
 * A draft that saves itself a moment after the typing stops, on leaving a step, and when the page is left.
 *
 * One save is under way at a time; what is typed meanwhile goes with the next. A save that fails keeps everything here.
 */
export function useDraft(listing: OwnListing) {
  const [draft, setDraft] = useState(listing.draft);
  const [state, setState] = useState<SaveState>('saved');
  const [problem, setProblem] = useState<string>();
  const { mutateAsync } = useSaveListing(listing.id);
  const latest = useRef(listing.draft);
  const saved = useRef(listing.draft);
  const version = useRef(listing.version);
  const busy = useRef<Promise<boolean>>(undefined);
  const timer = useRef<number>(undefined);

  const save = useCallback(
    async (isLeaving = false): Promise<boolean> => {
      window.clearTimeout(timer.current);
      while (busy.current) await busy.current;
      const sent = latest.current;
      if (sent === saved.current) return true;
      const run = async (): Promise<boolean> => {
        setState('saving');
        try {
          const answer = await mutateAsync({ version: version.current, draft: sent, isLeaving });
          version.current = answer.version;
          saved.current = sent;
          setProblem(undefined);
          setState(latest.current === sent ? 'saved' : 'waiting');
          return true;
        } catch (error) {
          setProblem(error instanceof Error ? error.message : String(error));
          setState(error instanceof Problem && error.slug === 'stale-version' ? 'stale' : 'failed');
          return false;
        }
      };
      busy.current = run().finally(() => {
        busy.current = undefined;
      });
      return busy.current;
    },
    [mutateAsync],
  );

  const change = useCallback(
    (next: ListingDraft) => {
      latest.current = next;
      setDraft(next);
      setState((now) => (now === 'stale' ? now : 'waiting'));
      window.clearTimeout(timer.current);
      timer.current = window.setTimeout(() => void save(), quietMs);
    },
    [save],
  );

  useEffect(() => {
    const leave = () => {
      if (document.visibilityState === 'hidden') void save(true);
    };
    document.addEventListener('visibilitychange', leave);
    return () => {
      document.removeEventListener('visibilitychange', leave);
      void save();
    };
  }, [save]);

  return { draft, change, save, state, problem };
}
