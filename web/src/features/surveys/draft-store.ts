import { Problem } from '#shared/problem.ts';
import type { SurveyRecord } from '#shared/surveys/record.ts';
import type { Edit } from './record-edits.ts';

export type Phase = 'saved' | 'unsaved' | 'saving' | 'failed' | 'stale';

export interface DraftState {
  record: SurveyRecord;
  /** The version on the server that this record grew from. */
  version: number;
  savedAt: string;
  phase: Phase;
  problem: Problem | null;
}

interface Saved {
  version: number;
  savedAt: string;
}

interface Options extends Saved {
  record: SurveyRecord;
  /** @param isLast the page is going away: the request must outlive it. */
  save: (body: { version: number; record: SurveyRecord }, isLast: boolean) => Promise<Saved>;
  delayMs?: number;
  retryMs?: number;
}

/**
 * Keeps a survey while it is worked on and saves it a moment after each change. What could not be sent stays here,
 * is tried again, and is said to be unsaved until the server has it.
 */
export function createDraftStore({
  record,
  version,
  savedAt,
  save,
  delayMs = 1_200,
  retryMs = 8_000,
}: Options) {
  let state: DraftState = { record, version, savedAt, phase: 'saved', problem: null };
  let timer: ReturnType<typeof setTimeout> | undefined;
  let sending: Promise<void> | undefined;
  const listeners = new Set<() => void>();

  const set = (change: Partial<DraftState>) => {
    state = { ...state, ...change };
    for (const listener of listeners) listener();
  };
  const later = (ms: number) => {
    clearTimeout(timer);
    timer = setTimeout(() => void flush(), ms);
  };

  async function send(isLast: boolean): Promise<void> {
    const sent = state.record;
    set({ phase: 'saving' });
    try {
      const saved = await save({ version: state.version, record: sent }, isLast);
      const isWhole = state.record === sent;
      set({
        version: saved.version,
        savedAt: saved.savedAt,
        phase: isWhole ? 'saved' : 'unsaved',
        problem: null,
      });
      if (!isWhole) later(delayMs);
    } catch (error) {
      const problem =
        error instanceof Problem ? error : new Problem('unexpected', 'The server could not be reached.');
      if (problem.slug === 'stale-version') set({ phase: 'stale', problem });
      else {
        set({ phase: 'failed', problem });
        // What the server refuses for its content will be refused again until somebody mends it.
        if (problem.slug !== 'invalid-input') later(retryMs);
      }
    }
  }

  /** Sends what is unsaved now; true once the server has all of it. */
  async function flush(isLast = false): Promise<boolean> {
    clearTimeout(timer);
    if (sending) {
      await sending;
      return flush(isLast);
    }
    if (state.phase === 'unsaved' || state.phase === 'failed') {
      sending = send(isLast).finally(() => {
        sending = undefined;
      });
      await sending;
    }
    return state.phase === 'saved';
  }

  return {
    getState: () => state,
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => {
        listeners.delete(listener);
      };
    },
    edit: (change: Edit) => {
      const after = change(state.record);
      if (after === state.record) return;
      // A stale record may still be changed; it is sent only once its owner has chosen which version stands.
      set({
        record: after,
        phase: state.phase === 'stale' || state.phase === 'saving' ? state.phase : 'unsaved',
      });
      if (state.phase === 'unsaved') later(delayMs);
    },
    flush,
    /** Gives up what is here for what the server has. */
    takeTheirs: (theirs: Saved & { record: SurveyRecord }) => {
      clearTimeout(timer);
      set({ ...theirs, phase: 'saved', problem: null });
    },
    /** Puts what is here in place of the version the server has. */
    keepMine: (theirs: Saved) => {
      set({ version: theirs.version, phase: 'unsaved', problem: null });
      return flush();
    },
    stop: () => {
      clearTimeout(timer);
    },
  };
}

export type DraftStore = ReturnType<typeof createDraftStore>;
