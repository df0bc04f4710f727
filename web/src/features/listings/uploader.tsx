import Uppy from '@uppy/core';
import type { Meta, UploadResult } from '@uppy/core';
import Dashboard from '@uppy/react/dashboard';
import Tus from '@uppy/tus';
import { useEffect, useState } from 'react';
import { documentMimes, photoMimes, uploadLimits } from '#shared/listings/pictures.ts';
import type { UploadMetadata } from '#shared/listings/pictures.ts';
import '@uppy/core/css/style.min.css';
import '@uppy/dashboard/css/style.min.css';
import { refusalIn } from './refusal.ts';

interface Props {
  purpose: UploadMetadata['purpose'];
  recordId: string;
  /** Named view of what is added now. */
  view: string;
  onUploaded: () => void;
}

const isDark = (): boolean => {
  const chosen = document.documentElement.dataset['theme'];
  return (
    chosen === 'dark' || (chosen === undefined && window.matchMedia('(prefers-color-scheme: dark)').matches)
  );
};

interface UploadMeta extends Meta {
  filename?: string;
  purpose: string;
  recordId: string;
  view: string;
}

function createUppy({ purpose, recordId, view }: Omit<Props, 'onUploaded'>) {
  const isDocument = purpose === 'listing-document';
  const uppy = new Uppy<UploadMeta>({
    autoProceed: true,
    restrictions: {
      maxFileSize: isDocument ? uploadLimits.documentBytes : uploadLimits.photoBytes,
      allowedFileTypes: isDocument
        ? [...documentMimes]
        : [...photoMimes, '.jpg', '.jpeg', '.png', '.webp', '.avif', '.tif', '.tiff'],
    },
    meta: { purpose, recordId, view },
    locale: {
      strings: {
        exceedsSize: '%{file} is larger than %{size}, the most we take. Make it smaller and add it again.',
        youCanOnlyUploadFileTypes: 'That kind of file cannot be used here. Send: %{types}',
      },
      pluralize: (count: number) => (count === 1 ? 0 : 1),
    },
  });
  uppy.use(Tus, {
    endpoint: '/api/files',
    allowedMetaFields: ['purpose', 'recordId', 'view', 'filename'],
    removeFingerprintOnSuccess: true,
    // What the server has looked at and refused is not sent again; a broken line is.
    retryDelays: [0, 1_000, 3_000, 5_000],
    onShouldRetry: (error, _attempt, _options, next) => {
      const status = error.originalResponse?.getStatus() ?? 0;
      return status >= 400 && status < 500 && status !== 423 && status !== 429 ? false : next(error);
    },
    limit: 3,
  });
  uppy.on('file-added', (file) => {
    uppy.setFileMeta(file.id, { ...file.meta, filename: file.name });
  });
  // Uppy shows its own words for a refusal; the server's say what is wrong with the file.
  uppy.on('upload-error', (file, error) => {
    const said = refusalIn(error);
    if (said !== undefined) uppy.info({ message: `${file?.name ?? 'The file'}: ${said}` }, 'error', 12_000);
  });
  return uppy;
}

/** Takes several files at once, resumes what was cut, and shows what the server says of each. */
export function Uploader({ purpose, recordId, view, onUploaded }: Props) {
  const [uppy] = useState(() => createUppy({ purpose, recordId, view }));
  useEffect(() => {
    uppy.setMeta({ view });
  }, [uppy, view]);
  useEffect(() => {
    // Only when the whole batch is done: a file taken out before that is taken for given up, and deleted at the server.
    const done = ({ successful }: UploadResult<UploadMeta, Record<string, never>>) => {
      for (const { id } of successful ?? []) uppy.removeFile(id);
      onUploaded();
    };
    uppy.on('complete', done);
    return () => {
      uppy.off('complete', done);
    };
  }, [uppy, onUploaded]);
  return (
    <div className="uploader">
      <Dashboard
        uppy={uppy}
        width="100%"
        height={260}
        theme={isDark() ? 'dark' : 'light'}
        proudlyDisplayPoweredByUppy={false}
        showRemoveButtonAfterComplete
        doneButtonHandler={undefined}
        note={
          purpose === 'listing-document'
            ? 'PDF, JPEG or PNG, up to 15 MB'
            : 'JPEG, PNG, WebP, AVIF or TIFF, up to 40 MB'
        }
      />
    </div>
  );
}
