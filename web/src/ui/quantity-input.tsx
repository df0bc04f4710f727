import { useState } from 'react';
import type { Units } from '#shared/accounts/contract.ts';
import { fromSi, toSi, unitOf } from '#web/lib/format.ts';
import type { Quantity } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Field } from './field.tsx';

interface Props {
  label: string;
  quantity: Quantity;
  /** In Pa, mm, litres, kg or km; null where nothing is given. */
  value: number | null;
  onChange: (value: number | null) => void;
  hint?: string;
  error?: string | undefined;
  isOptional?: boolean;
}

/** Decimal, or a fraction of an inch as the trade writes it: 3/32, 1 1/4. */
export function readNumber(text: string): number | null {
  const [, whole = '0', top, bottom] = /^(?:(\d+)\s+)?(\d+)\s*\/\s*(\d+)$/.exec(text.trim()) ?? [];
  if (top !== undefined && bottom !== undefined && Number(bottom) > 0)
    return Number(whole) + Number(top) / Number(bottom);
  const plain = text.trim().replace(',', '.');
  return plain !== '' && /^-?\d*\.?\d+$/.test(plain) ? Number(plain) : null;
}

/** As fine as the trade reads: a thou, a tenth of a pound; other figures to five places. */
const places: Partial<Record<Quantity, Record<Units, number>>> = {
  pressure: { imperial: 1, metric: 2 },
  length: { imperial: 3, metric: 2 },
};

function shown(quantity: Quantity, units: Units, value: number | null): string {
  if (value === null) return '';
  const figure = fromSi(quantity, units, value);
  const digits = places[quantity]?.[units];
  return String(Number(digits === undefined ? figure.toPrecision(5) : figure.toFixed(digits)));
}

/** A figure in the person's own units, kept in SI. What was typed stays as typed, even when it is not a figure. */
export function QuantityInput({ label, quantity, value, onChange, hint, error, isOptional = false }: Props) {
  const { units } = useUnits();
  const [typed, setTyped] = useState<{ text: string; value: number | null; units: Units }>();
  const isOwn = typed !== undefined && typed.units === units && typed.value === value;
  const text = isOwn ? typed.text : shown(quantity, units, value);
  const isNoFigure = isOwn && typed.text.trim() !== '' && typed.value === null;
  return (
    <Field
      label={label}
      hint={hint}
      isOptional={isOptional}
      error={isNoFigure ? 'Give a figure, such as 6.5 or 3/32' : error}
    >
      {(control) => (
        <div className="flex items-center gap-2">
          <input
            {...control}
            inputMode="decimal"
            autoComplete="off"
            value={text}
            onChange={(event) => {
              const next = event.target.value;
              const read = readNumber(next);
              const si = read === null ? null : toSi(quantity, units, read);
              setTyped({ text: next, value: si, units });
              onChange(si);
            }}
          />
          <span className="w-14 flex-none text-pencil" aria-hidden="true">
            {unitOf(quantity, units)}
          </span>
        </div>
      )}
    </Field>
  );
}

/** Money typed in pounds, kept in pence. */
export function MoneyInput({
  label,
  value,
  onChange,
  hint,
  error,
}: {
  label: string;
  value: number | null;
  onChange: (minor: number | null) => void;
  hint?: string;
  error?: string | undefined;
}) {
  const [typed, setTyped] = useState<{ text: string; value: number | null }>();
  const isOwn = typed !== undefined && typed.value === value;
  const text = isOwn ? typed.text : value === null ? '' : (value / 100).toFixed(value % 100 === 0 ? 0 : 2);
  const isNoSum = isOwn && typed.text.trim() !== '' && typed.value === null;
  return (
    <Field
      label={label}
      hint={hint}
      error={isNoSum ? 'Give a sum in pounds and pence, such as 480 or 62.50' : error}
    >
      {(control) => (
        <div className="flex items-center gap-2">
          <span className="text-pencil" aria-hidden="true">
            £
          </span>
          <input
            {...control}
            inputMode="decimal"
            autoComplete="off"
            value={text}
            onChange={(event) => {
              const next = event.target.value;
              const plain = next.trim().replaceAll(',', '').replace('£', '');
              const minor = /^\d{1,9}(\.\d{1,2})?$/.test(plain) ? Math.round(Number(plain) * 100) : null;
              setTyped({ text: next, value: minor });
              onChange(minor);
            }}
          />
        </div>
      )}
    </Field>
  );
}
