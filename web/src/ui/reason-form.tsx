import { useState } from 'react';
import type { ReactNode } from 'react';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from './button.tsx';
import { Field } from './field.tsx';
import { Notice } from './notes.tsx';

interface Props {
  /** What follows from the act, in words, before anything is done. */
  children: ReactNode;
  /** Who reads the reason. */
  hint: string;
  label: string;
  kind?: 'primary' | 'danger';
  /** Kept by the caller, so that a dialog closed by mistake loses nothing. */
  reason: string;
  onReason: (reason: string) => void;
  isOptional?: boolean;
  isPending: boolean;
  error: Error | null;
  onSubmit: () => void;
}

const fewest = 3;

/** Inside a dialog: says what follows from an act, asks why, then does it. */
export function ReasonForm({
  children,
  hint,
  label,
  kind = 'danger',
  reason,
  onReason,
  isOptional = false,
  isPending,
  error,
  onSubmit,
}: Props) {
  const [isAsked, setIsAsked] = useState(false);
  const isShort = !isOptional && reason.trim().length < fewest;
  return (
    <form
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        setIsAsked(true);
        if (!isShort) onSubmit();
      }}
    >
      <div>{children}</div>
      {error && <Notice kind="bad">{messageOf(error)}</Notice>}
      <Field label="Why" hint={hint} error={isAsked && isShort ? 'Give a reason in a few words' : undefined}>
        {(control) => (
          <textarea
            {...control}
            rows={3}
            maxLength={400}
            value={reason}
            onChange={(event) => {
              onReason(event.target.value);
            }}
          />
        )}
      </Field>
      <div>
        <Button type="submit" kind={kind} isPending={isPending}>
          {label}
        </Button>
      </div>
    </form>
  );
}
