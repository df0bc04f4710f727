import { z } from 'zod';
import { quantityText, specOf } from '../engineering/quantities.ts';
import type { Quantity } from '../engineering/quantities.ts';
import { day } from '../time.ts';

/** How a field is filled in. Figures are in the unit their quantity is kept in. */
export type Control =
  | { kind: 'quantity'; quantity: Quantity; min: number; max: number; slider?: Slider }
  | { kind: 'choice'; options: Readonly<Record<string, string>> }
  | { kind: 'day' };

/** The part of a range that a person plays over. */
export interface Slider {
  from: number;
  to: number;
  step: number;
}

/** Another field on whose choice this one depends. */
export interface When {
  field: string;
  is: readonly string[];
}

/** One input of a calculator: what it is, how it is filled in, what it may be, and what it starts as. */
export interface Field<T = unknown> {
  label: string;
  hint: string | null;
  control: Control;
  schema: z.ZodType<T>;
  initial: T;
  isOptional: boolean;
  /** The heading it stands under, on a form long enough to have some. */
  part: string | null;
  when: When | null;
}
export type Fields = Readonly<Record<string, Field>>;
export type InputOf<F extends Fields> = { [K in keyof F]: F[K] extends Field<infer T> ? T : never };

interface Options {
  hint?: string;
  part?: string;
  when?: When;
  slider?: Slider;
}

const inBoth = (quantity: Quantity, value: number): string => {
  const metric = quantityText(quantity, 'metric', value);
  const imperial = quantityText(quantity, 'imperial', value);
  return metric === imperial ? metric : `${metric} (${imperial})`;
};

const figureSchema = (label: string, quantity: Quantity, min: number, max: number) =>
  z
    .number(`Give a figure: ${label.toLowerCase()}`)
    .min(min, `${label} cannot be less than ${inBoth(quantity, min)}`)
    .max(max, `${label} cannot be more than ${inBoth(quantity, max)}`)
    .meta({ description: `${label}, ${specOf(quantity).base || 'a number'}` });

const rest = ({ hint, part, when }: Options) => ({
  hint: hint ?? null,
  part: part ?? null,
  when: when ?? null,
});

/** A figure that must be given. */
export const figure = (
  label: string,
  quantity: Quantity,
  [min, max]: readonly [min: number, max: number],
  initial: number,
  options: Options = {},
): Field<number> => ({
  label,
  control: { kind: 'quantity', quantity, min, max, ...(options.slider && { slider: options.slider }) },
  schema: figureSchema(label, quantity, min, max),
  initial,
  isOptional: false,
  ...rest(options),
});

/** A figure that a person may not know. */
export const unknownFigure = (
  label: string,
  quantity: Quantity,
  [min, max]: readonly [min: number, max: number],
  initial: number | null,
  options: Options = {},
): Field<number | null> => ({
  label,
  control: { kind: 'quantity', quantity, min, max, ...(options.slider && { slider: options.slider }) },
  schema: figureSchema(label, quantity, min, max).nullable().default(null),
  initial,
  isOptional: true,
  ...rest(options),
});

/** A whole number. */
export const whole = (
  label: string,
  [min, max]: readonly [min: number, max: number],
  initial: number,
  options: Options = {},
): Field<number> => ({
  label,
  control: { kind: 'quantity', quantity: 'count', min, max },
  schema: figureSchema(label, 'count', min, max).int(`${label} is a whole number`),
  initial,
  isOptional: false,
  ...rest(options),
});

/** One of a list of words. */
export const choice = <const O extends Readonly<Record<string, string>>>(
  label: string,
  options: O,
  initial: NoInfer<keyof O & string>,
  more: Options = {},
): Field<keyof O & string> => ({
  label,
  control: { kind: 'choice', options },
  schema: z.enum(Object.keys(options), `Choose one: ${label.toLowerCase()}`).meta({ description: label }),
  initial,
  isOptional: false,
  ...rest(more),
});

/** A calendar day that a person may not know. */
export const unknownDay = (
  label: string,
  initial: string | null,
  options: Options = {},
): Field<string | null> => ({
  label,
  control: { kind: 'day' },
  schema: day.nullable().default(null).meta({ description: label }),
  initial,
  isOptional: true,
  ...rest(options),
});

/** The words of a registry, by id, for a choice. */
export const labelsOf = <K extends string>(of: Readonly<Record<K, { label: string }>>): Record<K, string> =>
  Object.fromEntries(Object.entries<{ label: string }>(of).map(([id, { label }]) => [id, label])) as Record<
    K,
    string
  >;
