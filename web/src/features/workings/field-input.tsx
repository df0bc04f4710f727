import { quantityText } from '#shared/engineering/quantities.ts';
import type { Field } from '#shared/workings/field.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Field as LabelledField } from '#web/ui/field.tsx';
import { QuantityInput } from '#web/ui/quantity-input.tsx';
import { Select } from '#web/ui/select.tsx';

interface Props {
  field: Field;
  value: unknown;
  error: string | undefined;
  onChange: (value: unknown) => void;
}

/** One input of a calculator, whatever it is filled in with. */
export function FieldInput({ field, value, error, onChange }: Props) {
  const { units } = useUnits();
  const { control, label, hint, isOptional } = field;
  switch (control.kind) {
    case 'choice':
      return (
        <Select
          label={label}
          hint={hint ?? ''}
          error={error}
          value={typeof value === 'string' ? value : null}
          options={control.options}
          onChange={onChange}
        />
      );
    case 'day':
      return (
        <LabelledField label={label} hint={hint ?? ''} error={error} isOptional={isOptional}>
          {(shared) => (
            <input
              {...shared}
              type="date"
              value={typeof value === 'string' ? value : ''}
              onChange={({ target }) => {
                onChange(target.value === '' ? null : target.value);
              }}
            />
          )}
        </LabelledField>
      );
    case 'quantity': {
      const { quantity, slider } = control;
      const figure = typeof value === 'number' && Number.isFinite(value) ? value : null;
      return (
        <div>
          <QuantityInput
            label={label}
            quantity={quantity}
            value={figure}
            error={error}
            isOptional={isOptional}
            onChange={onChange}
            {...(hint !== null && { hint })}
          />
          {slider && (
            <input
              type="range"
              aria-label={`${label}, slide`}
              aria-valuetext={figure === null ? 'not given' : quantityText(quantity, units, figure)}
              className="no-print mt-1 h-8 w-full accent-copper"
              min={slider.from}
              max={slider.to}
              step={slider.step}
              value={figure ?? slider.from}
              onChange={({ target }) => {
                onChange(Number(Number(target.value).toPrecision(12)));
              }}
            />
          )}
        </div>
      );
    }
    default:
      return control satisfies never;
  }
}
