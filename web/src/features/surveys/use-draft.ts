import { useEffect, useState, useSyncExternalStore } from 'react';
import { useQueryClient } from '@tanstack/react-query';
import type { Survey } from '#shared/surveys/contract.ts';
import { createDraftStore } from './draft-store.ts';
import type { DraftState, DraftStore } from './draft-store.ts';
import { createPhotoUploads } from './photo-uploads.ts';
import type { PhotoUpload, PhotoUploads } from './photo-uploads.ts';
import { saveSurvey, surveyQueries } from './queries.ts';
import { addPhoto } from './record-edits.ts';

export interface Draft extends DraftState {
  store: DraftStore;
  photoUploads: PhotoUploads;
  uploads: readonly PhotoUpload[];
  /** Whether something would be lost by closing the page now. */
  isUnsent: boolean;
}

/** The survey under work: kept on this page, saved as it grows, sent once more when the page is left. */
export function useDraft(survey: Survey): Draft {
  const client = useQueryClient();
  const { orderId } = survey;
  const [store] = useState(() =>
    createDraftStore({
      record: survey.record,
      version: survey.version,
      savedAt: survey.savedAt,
      save: (body, isLast) => saveSurvey(orderId, body, isLast),
    }),
  );
  const [photoUploads] = useState(() =>
    createPhotoUploads({
      orderId,
      onArrived: (criterionId, photoId) => {
        store.edit(addPhoto(criterionId, photoId));
        void client.invalidateQueries({ queryKey: surveyQueries.detail(orderId).queryKey });
      },
    }),
  );
  const state = useSyncExternalStore(store.subscribe, store.getState);
  const uploads = useSyncExternalStore(photoUploads.subscribe, photoUploads.getUploads);
  const isUnsent = state.phase !== 'saved' || uploads.length > 0;

  useEffect(() => {
    const leave = () => {
      if (document.visibilityState === 'hidden') void store.flush(true);
    };
    const comeBack = () => void store.flush();
    document.addEventListener('visibilitychange', leave);
    window.addEventListener('pagehide', leave);
    window.addEventListener('online', comeBack);
    return () => {
      document.removeEventListener('visibilitychange', leave);
      window.removeEventListener('pagehide', leave);
      window.removeEventListener('online', comeBack);
      void store.flush();
    };
  }, [store]);

  useEffect(() => {
    if (!isUnsent) return undefined;
    const warn = (event: BeforeUnloadEvent) => {
      event.preventDefault();
    };
    window.addEventListener('beforeunload', warn);
    return () => {
      window.removeEventListener('beforeunload', warn);
    };
  }, [isUnsent]);

  return { ...state, store, photoUploads, uploads, isUnsent };
}
