import { useId } from 'react';
import type { ReactNode } from 'react';

interface Control {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': boolean;
  className: string;
}

interface Props {
  label: string;
  hint?: ReactNode;
  error?: string | undefined;
  isOptional?: boolean;
  children: (control: Control) => ReactNode;
}

/** A label, a hint, a control and its error, tied together for everyone who cannot see how they stand. */
export function Field({ label, hint, error, isOptional = false, children }: Props) {
  const id = useId();
  const describedBy = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <div className="grid content-start gap-1">
      <label htmlFor={id} className="font-medium">
        {label}
        {isOptional && <span className="font-normal text-pencil"> (if you know)</span>}
      </label>
      {hint && (
        <div id={`${id}-hint`} className="text-sm leading-5 text-pencil">
          {hint}
        </div>
      )}
      {children({
        id,
        'aria-describedby': describedBy || undefined,
        'aria-invalid': Boolean(error),
        className: 'control',
      })}
      {error && (
        <p id={`${id}-error`} className="text-sm leading-5 font-medium text-unfit">
          {error}
        </p>
      )}
    </div>
  );
}

/** Several controls under one question. */
export function FieldGroup({
  legend,
  hint,
  error,
  children,
}: {
  legend: string;
  hint?: ReactNode;
  error?: string | undefined;
  children: ReactNode;
}) {
  const id = useId();
  return (
    <fieldset aria-describedby={error ? `${id}-error` : undefined} className="grid gap-2">
      <legend className="mb-1 font-medium">{legend}</legend>
      {hint && <p className="-mt-1 text-sm leading-5 text-pencil">{hint}</p>}
      {children}
      {error && (
        <p id={`${id}-error`} className="text-sm font-medium text-unfit">
          {error}
        </p>
      )}
    </fieldset>
  );
}
