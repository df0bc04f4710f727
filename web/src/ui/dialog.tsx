import { useEffect, useId, useRef } from 'react';
import type { ReactNode } from 'react';
import { Button } from './button.tsx';

interface Props {
  title: string;
  isOpen: boolean;
  onClose: () => void;
  children: ReactNode;
  isWide?: boolean;
}

/** A modal dialog: the browser's own, which keeps the focus in and gives it back. */
export function Dialog({ title, isOpen, onClose, children, isWide = false }: Props) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (isOpen && element && !element.open) element.showModal();
    if (!isOpen && element?.open) element.close();
  }, [isOpen]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      className={`m-auto max-h-[calc(100dvh-2rem)] w-[calc(100%-2rem)] overflow-y-auto border border-ink bg-paper p-5 text-ink ${isWide ? 'max-w-5xl' : 'max-w-lg'}`}
    >
      {isOpen && (
        <>
          <div className="mb-4 flex items-start justify-between gap-4">
            <h2 id={titleId}>{title}</h2>
            <Button kind="plain" onClick={onClose}>
              Close
            </Button>
          </div>
          {children}
        </>
      )}
    </dialog>
  );
}
