import { useId } from 'react';
import type { ComponentProps, ReactNode } from 'react';

type InputProps = Omit<ComponentProps<'input'>, 'className' | 'type'>;

/** One box to tick, or one of several to choose; the whole row is the target. */
export function Check({
  label,
  hint,
  error,
  kind = 'checkbox',
  ...input
}: InputProps & {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  kind?: 'checkbox' | 'radio';
}) {
  const id = useId();
  return (
    <div>
      <label className="flex min-h-11 items-start gap-3 py-2">
        <input
          {...input}
          type={kind}
          className="tick mt-0.5"
          aria-invalid={Boolean(error)}
          aria-describedby={error ? `${id}-error` : undefined}
        />
        <span>
          {label}
          {hint && <span className="block text-sm leading-5 text-pencil">{hint}</span>}
        </span>
      </label>
      {error && (
        <p id={`${id}-error`} className="text-sm font-medium text-unfit">
          {error}
        </p>
      )}
    </div>
  );
}

/** A choice among a few, drawn as ruled rows. */
export function Choices<T extends string>({
  name,
  value,
  options,
  onChange,
}: {
  name: string;
  value: T | null;
  options: readonly { id: T; label: ReactNode; hint?: ReactNode }[];
  onChange: (value: T) => void;
}) {
  return (
    <div className="divide-y divide-rule border-y border-rule">
      {options.map(({ id, label, hint }) => (
        <label key={id} className="flex items-start gap-3 px-1 py-3 has-checked:bg-wash">
          <input
            type="radio"
            name={name}
            value={id}
            checked={value === id}
            onChange={() => {
              onChange(id);
            }}
            className="tick mt-0.5"
          />
          <span className="min-w-0 flex-1">
            <span className="font-medium">{label}</span>
            {hint && <span className="block text-sm leading-5 text-pencil">{hint}</span>}
          </span>
        </label>
      ))}
    </div>
  );
}
