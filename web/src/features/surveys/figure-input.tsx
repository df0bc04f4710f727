import { useState } from 'react';
import type { ReactNode } from 'react';
import type { MeasureUnit } from '#shared/surveys/rubric/types.ts';
import { Field } from '#web/ui/field.tsx';
import { readNumber } from '#web/ui/quantity-input.tsx';
import { useUnits } from '#web/lib/units.tsx';
import { quantityOf, shownText } from './quantities.ts';
import type { Quantity } from './quantities.ts';

interface Props {
  label: string;
  unit: MeasureUnit | 'min';
  /** In the unit it is kept in. */
  value: number | null;
  min?: number | null;
  max?: number | null;
  hint?: ReactNode;
  onChange: (value: number | null) => void;
}

const plain: Quantity = { unit: '', places: 2, factor: 1 };

/** What is wrong with a figure in the unit it is kept in, said in the unit shown; undefined if nothing. */
function faultOf(
  si: number | null,
  quantity: Quantity,
  { unit, min = null, max = null }: Pick<Props, 'unit' | 'min' | 'max'>,
): string | undefined {
  const say = (limit: number) => `${shownText(limit, quantity)} ${quantity.unit}`.trim();
  if (si === null) return 'Give a figure, such as 6.5 or 3/32';
  if (unit === 'count' && !Number.isInteger(si)) return 'Give a whole number';
  if (min !== null && si < min) return `At least ${say(min)}`;
  if (max !== null && si > max) return `At most ${say(max)}`;
  return undefined;
}

/**
 * A figure of a survey, typed in the unit a person prefers and kept in SI. One that cannot be right stays in the field
 * with a sentence beside it, and the last good one stands.
 */
export function FigureInput({ label, unit, value, hint, onChange, ...limits }: Props) {
  const { units } = useUnits();
  const quantity = quantityOf(unit, units) ?? plain;
  const [typed, setTyped] = useState<string | null>(null);
  const text = typed ?? (value === null ? '' : shownText(value, quantity));
  const read = (from: string) => {
    const figure = readNumber(from);
    return figure === null ? null : figure * quantity.factor;
  };
  const faultIn = (from: string) =>
    from.trim() === '' ? undefined : faultOf(read(from), quantity, { unit, ...limits });
  const fault = typed === null ? undefined : faultIn(typed);

  return (
    <Field label={label} hint={hint} error={fault}>
      {(control) => (
        <div className="flex items-center gap-2">
          <input
            {...control}
            // A decimal keypad has no minus sign.
            inputMode={(limits.min ?? 0) < 0 ? 'text' : 'decimal'}
            autoComplete="off"
            value={text}
            onChange={({ target }) => {
              setTyped(target.value);
              if (faultIn(target.value) === undefined) onChange(read(target.value));
            }}
            onBlur={() => {
              if (fault === undefined) setTyped(null);
            }}
          />
          {quantity.unit !== '' && (
            <span className="min-w-8 flex-none text-pencil" aria-hidden="true">
              {quantity.unit}
            </span>
          )}
        </div>
      )}
    </Field>
  );
}
