import { Field } from '#web/ui/field.tsx';

interface Props {
  label: string;
  value: string;
  most: number;
  rows?: number;
  hint?: string;
  onChange: (value: string) => void;
}

/** A few words, or a few lines of them. The limit holds as it is typed, and is said once it is near. */
export function WordsInput({ label, value, most, rows = 1, hint, onChange }: Props) {
  const left = most - value.length;
  return (
    <Field label={label} hint={left < most * 0.15 ? `${String(left)} characters left` : hint}>
      {(control) => {
        const shared = {
          ...control,
          value,
          maxLength: most,
          onChange: ({ target }: { target: { value: string } }) => {
            onChange(target.value);
          },
        };
        return rows === 1 ? <input type="text" {...shared} /> : <textarea rows={rows} {...shared} />;
      }}
    </Field>
  );
}
