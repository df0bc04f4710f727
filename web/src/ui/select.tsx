import { Field } from './field.tsx';

interface Props<T extends string> {
  label: string;
  value: T | null;
  /** Id → words, in order. */
  options: Readonly<Record<T, string>>;
  onChange: (value: T | null) => void;
  hint?: string;
  error?: string | undefined;
}

/** One of a list of words. */
export function Select<T extends string>({ label, value, options, onChange, hint, error }: Props<T>) {
  const ids = Object.keys(options) as T[];
  return (
    <Field label={label} hint={hint} error={error}>
      {(control) => (
        <select
          {...control}
          value={value ?? ''}
          onChange={(event) => {
            onChange(ids.find((id) => id === event.target.value) ?? null);
          }}
        >
          {value === null && <option value="">Choose</option>}
          {ids.map((id) => (
            <option key={id} value={id}>
              {options[id]}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}
