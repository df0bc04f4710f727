import { useState } from 'react';
import { allowanceOverride } from '#shared/surveys/record.ts';
import type { AllowanceOverride } from '#shared/surveys/record.ts';
import { Button } from '#web/ui/button.tsx';
import { Field, FieldGroup } from '#web/ui/field.tsx';
import { readNumber } from '#web/ui/quantity-input.tsx';
import { bandText } from './band-text.ts';

interface Props {
  /** What the catalogue allows. */
  band: AllowanceOverride;
  value: AllowanceOverride | null;
  onChange: (value: AllowanceOverride | null) => void;
}

const fields = [
  { key: 'hoursLow', label: 'Hours, low', scale: 1 },
  { key: 'hoursHigh', label: 'Hours, high', scale: 1 },
  { key: 'partsLowMinor', label: 'Parts £, low', scale: 100 },
  { key: 'partsHighMinor', label: 'Parts £, high', scale: 100 },
] as const;
type Typed = Record<(typeof fields)[number]['key'], string>;

const asTyped = (band: AllowanceOverride): Typed => ({
  hoursLow: String(band.hoursLow),
  hoursHigh: String(band.hoursHigh),
  partsLowMinor: String(band.partsLowMinor / 100),
  partsHighMinor: String(band.partsHighMinor / 100),
});

const read = (typed: Typed) =>
  allowanceOverride.safeParse(
    Object.fromEntries(
      fields.map(({ key, scale }) => {
        const figure = readNumber(typed[key]) ?? Number.NaN;
        return [key, scale === 100 ? Math.round(figure * scale) : figure];
      }),
    ),
  );

/** The surveyor's own figures in place of the catalogue's; kept once all four make sense together. */
export function AllowanceFields({ band, value, onChange }: Props) {
  const [typed, setTyped] = useState<Typed | null>(value && asTyped(value));
  if (typed === null)
    return (
      <div>
        <p>The catalogue allows {bandText(band)}.</p>
        <Button
          kind="plain"
          onClick={() => {
            setTyped(asTyped(band));
            onChange(band);
          }}
        >
          Give my own figures
        </Button>
      </div>
    );
  const faults = new Map(read(typed).error?.issues.map(({ path, message }) => [String(path[0]), message]));
  return (
    <FieldGroup legend={`My own figures, in place of ${bandText(band)}`}>
      <div className="grid grid-cols-2 gap-3">
        {fields.map(({ key, label }) => (
          <Field key={key} label={label} error={faults.get(key)}>
            {(control) => (
              <input
                {...control}
                inputMode="decimal"
                value={typed[key]}
                onChange={({ target }) => {
                  const after = { ...typed, [key]: target.value };
                  setTyped(after);
                  const { data } = read(after);
                  if (data) onChange(data);
                }}
              />
            )}
          </Field>
        ))}
      </div>
      <div>
        <Button
          kind="plain"
          onClick={() => {
            setTyped(null);
            onChange(null);
          }}
        >
          Go back to the catalogue’s
        </Button>
      </div>
    </FieldGroup>
  );
}
