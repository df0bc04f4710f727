import { photoMimes, uploadLimits } from '#shared/listings/pictures.ts';
import { Problem } from '#shared/problem.ts';

/** A photograph on its way: shown at once from the phone's own copy. */
export interface PhotoUpload {
  id: string;
  criterionId: string;
  name: string;
  previewUrl: string;
  /** 0–1. */
  progress: number;
  /** Why it stopped; null while it is being sent. */
  problem: string | null;
  /** Whether the same file might do better later: one that was refused will be refused again. */
  canRetry: boolean;
}

interface Options {
  orderId: string;
  onArrived: (criterionId: string, photoId: string) => void;
}

const partBytes = 2 * 1024 * 1024;
const unreachable =
  'The photograph could not be sent: the server cannot be reached. It is kept on this page; try again when there is a signal.';

/** What the server said of a file it would not take, or that it could not be asked. */
function readRefusal(error: unknown): Pick<PhotoUpload, 'problem' | 'canRetry'> {
  const response =
    typeof error === 'object' && error !== null && 'originalResponse' in error
      ? (error.originalResponse as { getBody: () => string } | null)
      : null;
  if (!response) return { problem: unreachable, canRetry: true };
  try {
    const problem = Problem.fromDetails(JSON.parse(response.getBody()));
    return { problem: problem.message, canRetry: problem.status >= 500 };
  } catch {
    return { problem: unreachable, canRetry: true };
  }
}

const nothing = () => undefined;
/** Refusals are shown beside the photograph; the console is for faults. */
const silent = { debug: nothing, warn: nothing, error: nothing };

/** Sends photographs in parts that resume, several to a finding, and keeps those that failed to be tried again. */
export function createPhotoUploads({ orderId, onArrived }: Options) {
  let uploads: readonly PhotoUpload[] = [];
  const listeners = new Set<() => void>();
  const set = (after: readonly PhotoUpload[]) => {
    uploads = after;
    for (const listener of listeners) listener();
  };
  const change = (id: string, fields: Partial<PhotoUpload>) => {
    set(uploads.map((upload) => (upload.id === id ? { ...upload, ...fields } : upload)));
  };
  const drop = (id: string) => {
    const upload = uploads.find((each) => each.id === id);
    if (upload) URL.revokeObjectURL(upload.previewUrl);
    set(uploads.filter((each) => each.id !== id));
  };

  // The uploader is heavy and wanted only once there is a photograph.
  const start = async () => {
    const [{ default: Uppy }, { default: Tus }] = await Promise.all([
      import('@uppy/core'),
      import('@uppy/tus'),
    ]);
    const uppy = new Uppy<{ criterionId: string }, { xhr: XMLHttpRequest }>({
      autoProceed: true,
      logger: silent,
    });
    uppy.use(Tus, {
      endpoint: '/api/files',
      chunkSize: partBytes,
      limit: 2,
      retryDelays: [0, 1_000, 3_000, 8_000],
      // The same picture may belong to two findings, and each is a photograph of its own.
      removeFingerprintOnSuccess: true,
      allowedMetaFields: ['purpose', 'recordId', 'view', 'alt', 'filename'],
    });
    uppy.on('upload-progress', (file, { bytesUploaded, bytesTotal }) => {
      if (file && bytesTotal) change(file.id, { progress: bytesUploaded / bytesTotal });
    });
    uppy.on('upload-success', (file, { uploadURL }) => {
      const photoId = uploadURL?.split('/').at(-1);
      if (!file || photoId === undefined) return;
      onArrived(file.meta.criterionId, photoId);
      drop(file.id);
      // Later: a file removed while its success is still being told is taken for one given up, and deleted.
      queueMicrotask(() => {
        uppy.removeFile(file.id);
      });
    });
    uppy.on('upload-error', (file, error) => {
      if (file) change(file.id, readRefusal(error));
    });
    return uppy;
  };
  let starting: ReturnType<typeof start> | undefined;
  const uploader = () => (starting ??= start());

  return {
    getUploads: () => uploads,
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => {
        listeners.delete(listener);
      };
    },
    add: async (criterionId: string, alt: string, files: readonly File[]): Promise<void> => {
      const uppy = await uploader();
      for (const file of files) {
        // Uppy tells files apart by name, and a phone's camera gives every picture the same one.
        const name = `${String(Date.now())}-${String(uppy.getFiles().length)}-${file.name}`;
        const meta = {
          criterionId,
          purpose: 'survey-photo',
          recordId: orderId,
          view: criterionId,
          alt,
          filename: file.name,
        };
        const previewUrl = URL.createObjectURL(file);
        const shown = { criterionId, name: file.name, previewUrl, progress: 0, canRetry: false };
        if (file.size > uploadLimits.photoBytes) {
          const problem = `${file.name} is over ${String(uploadLimits.photoBytes / 1024 / 1024)} MB. Take it at a lower quality.`;
          set([...uploads, { ...shown, id: name, problem }]);
          continue;
        }
        // Named before the upload starts, or its first events would find nobody.
        const pending = { ...shown, id: name, problem: null };
        set([...uploads, pending]);
        const id = uppy.addFile({ name, type: file.type, data: file, meta });
        change(name, { id });
      }
    },
    retry: async (id: string): Promise<void> => {
      const uppy = await uploader();
      if (!uppy.getFile(id)) return;
      change(id, { problem: null });
      await uppy.retryUpload(id);
    },
    remove: async (id: string): Promise<void> => {
      const uppy = await uploader();
      if (uppy.getFile(id)) uppy.removeFile(id);
      drop(id);
    },
    stop: () => {
      for (const { previewUrl } of uploads) URL.revokeObjectURL(previewUrl);
      void starting?.then((uppy) => uppy.destroy());
    },
  };
}

export type PhotoUploads = ReturnType<typeof createPhotoUploads>;
export const acceptedPhotos = photoMimes.join(',');
