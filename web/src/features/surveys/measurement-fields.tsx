import { useState } from 'react';
import type { Finding, Measurement } from '#shared/surveys/record.ts';
import type { Criterion, MeasurementSpec } from '#shared/surveys/rubric/types.ts';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { FigureInput } from './figure-input.tsx';
import { setReadings } from './record-edits.ts';
import type { Edit } from './record-edits.ts';
import { WordsInput } from './words-input.tsx';
import { YesNo } from './yes-no.tsx';

interface Props {
  criterion: Criterion;
  finding: Finding | undefined;
  edit: (change: Edit) => void;
}

/** What is measured of an item. Figures of the tests are shown with their tests, and not asked twice. */
export function MeasurementFields({ criterion, finding, edit }: Props) {
  const own = criterion.measurements.filter(({ takenIn }) => takenIn === 'finding');
  const elsewhere = criterion.measurements.filter(({ takenIn }) => takenIn !== 'finding');
  if (criterion.measurements.length === 0) return null;
  return (
    <section className="grid gap-4" aria-label="Measurements">
      <h2 className="text-lg">Measurements</h2>
      {own.map((spec) => (
        <OneQuantity
          key={spec.quantity}
          spec={spec}
          values={(finding?.measurements ?? [])
            .filter(({ quantity }) => quantity === spec.quantity)
            .map(({ value }) => value)}
          onChange={(values) => {
            edit(setReadings(criterion.id, spec.quantity, values));
          }}
        />
      ))}
      {elsewhere.length > 0 && (
        <p className="text-sm text-pencil">
          Recorded with the tests: {elsewhere.map(({ label }) => label.toLowerCase()).join('; ')}.
        </p>
      )}
    </section>
  );
}

interface QuantityProps {
  spec: MeasurementSpec;
  values: readonly Measurement['value'][];
  onChange: (values: Measurement['value'][]) => void;
}

function OneQuantity({ spec, values, onChange }: QuantityProps) {
  const [first] = values;
  const { label, unit } = spec;
  if (unit === 'text')
    return (
      <WordsInput
        label={label}
        most={200}
        value={typeof first === 'string' ? first : ''}
        onChange={(value) => {
          onChange(value === '' ? [] : [value]);
        }}
      />
    );
  if (unit === 'yes-no')
    return (
      <YesNo
        label={label}
        value={typeof first === 'boolean' ? first : null}
        onChange={(value) => {
          onChange(value === null ? [] : [value]);
        }}
      />
    );
  if (unit === 'choice')
    return (
      <Field label={label}>
        {(control) => (
          <select
            {...control}
            value={typeof first === 'string' ? first : ''}
            onChange={({ target }) => {
              onChange(target.value === '' ? [] : [target.value]);
            }}
          >
            <option value="">Not said</option>
            {spec.choices.map((choice) => (
              <option key={choice.id} value={choice.id}>
                {choice.label}
              </option>
            ))}
          </select>
        )}
      </Field>
    );
  return (
    <Readings spec={spec} values={values.filter((value) => typeof value === 'number')} onChange={onChange} />
  );
}

/** One figure, or several at marked places: the least and the greatest are what the checks go by. */
function Readings({ spec, values, onChange }: QuantityProps & { values: readonly number[] }) {
  const [asked, setAsked] = useState(1);
  const shown = Math.max(asked, values.length, 1);
  const isRepeatable = spec.unit === 'mm' || spec.unit === 'ppm';
  return (
    <div className="grid gap-2">
      {Array.from({ length: shown }, (_, index) => (
        <FigureInput
          // A reading has no name but its place in the row.
          // eslint-disable-next-line react/no-array-index-key
          key={index}
          label={index === 0 ? spec.label : `${spec.label}, reading ${String(index + 1)}`}
          unit={spec.unit}
          min={spec.min}
          max={spec.max}
          value={values[index] ?? null}
          onChange={(value) => {
            const after: (number | null)[] = [...values];
            after[index] = value;
            onChange(after.filter((each) => each !== null && each !== undefined));
          }}
        />
      ))}
      {isRepeatable && values.length === shown && shown < 8 && (
        <div>
          <Button
            kind="plain"
            onClick={() => {
              setAsked(shown + 1);
            }}
          >
            Another reading
          </Button>
        </div>
      )}
    </div>
  );
}
