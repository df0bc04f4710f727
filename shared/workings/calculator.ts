import { z } from 'zod';
import type { Quantity } from '../engineering/quantities.ts';
import { isRefusal } from '../engineering/working.ts';
import type { Answer, Line, Refusal, Term } from '../engineering/working.ts';
import type { Fields, InputOf } from './field.ts';

/** Some lines of a working under one heading; what could not be worked out is said in their place. */
export interface Steps {
  title: string;
  lines: readonly Line[];
  refusals: readonly Refusal[];
}

/** What comes of a calculator. */
export interface Outcome {
  /** The figures a person came for, the most wanted first. */
  answers: readonly Term[];
  /** What they mean, a sentence each. */
  says: readonly string[];
  steps: readonly Steps[];
}

/** A curve worth more than a figure. Points are in the units the quantities are kept in. */
export interface Plot {
  title: string;
  x: { label: string; quantity: Quantity };
  y: { label: string; quantity: Quantity };
  series: readonly { label: string; points: readonly (readonly [x: number, y: number])[] }[];
  /** Where the inputs stand on the curves. */
  marks: readonly { label: string; x: number; y: number }[];
  /** Heights to compare with. */
  levels: readonly { label: string; y: number }[];
}

export interface Mistake {
  field: string;
  message: string;
}

export const groups = {
  strength: 'Strength',
  tests: 'Tests and fittings',
  running: 'Steam and water',
  firing: 'Firing',
  papers: 'Papers and sundries',
} as const;
export type GroupId = keyof typeof groups;

interface Spec<F extends Fields> {
  id: string;
  title: string;
  /** One line that says what it answers. */
  about: string;
  group: GroupId;
  /** Said beside the answer, where somebody might act on it. */
  caution: string | null;
  fields: F;
  /** What cannot be of two fields together. */
  check?: (input: InputOf<F>) => readonly Mistake[];
  work: (input: InputOf<F>) => Outcome;
  plot?: (input: InputOf<F>) => Plot | null;
}

/** Inputs of any calculator, by name. */
export type Inputs = Readonly<Record<string, unknown>>;

/** A calculator as the page and the API see it: whatever its inputs, they are checked before they are worked. */
export interface Calculator extends Omit<Spec<Fields>, 'check' | 'work' | 'plot'> {
  schema: z.ZodType<Inputs>;
  initial: Inputs;
  /** Takes what `schema` gave. */
  work: (input: Inputs) => Outcome;
  plot: (input: Inputs) => Plot | null;
}

/** Makes a calculator from its fields and its rule. */
export function calculator<F extends Fields>(spec: Spec<F>): Calculator {
  const { check, work, plot, ...rest } = spec;
  const names = Object.keys(spec.fields);
  const shape = Object.fromEntries(names.map((name) => [name, spec.fields[name]?.schema ?? z.never()]));
  const schema = z.strictObject(shape).superRefine((input, context) => {
    for (const { field, message } of check?.(input as InputOf<F>) ?? [])
      context.addIssue({ code: 'custom', path: [field], message });
  });
  return {
    ...rest,
    schema,
    initial: Object.fromEntries(names.map((name) => [name, spec.fields[name]?.initial])),
    work: (input) => work(input as InputOf<F>),
    plot: (input) => plot?.(input as InputOf<F>) ?? null,
  };
}

/** Lines and refusals under a heading. */
export const steps = (title: string, ...answers: readonly Answer[]): Steps => ({
  title,
  lines: answers.filter((answer): answer is Line => !isRefusal(answer)),
  refusals: answers.filter(isRefusal),
});

/** The results of some answers; what was refused has none. */
export const resultsOf = (...answers: readonly Answer[]): Term[] =>
  answers.flatMap((answer) => (isRefusal(answer) ? [] : [answer.result]));

/** Evenly spread figures over a range, both ends with it. */
export const spread = (from: number, to: number, count = 41): number[] =>
  Array.from({ length: count }, (_, index) => from + ((to - from) * index) / (count - 1));

/** Points of a curve; where it is refused it has none. */
export const curve = (
  label: string,
  xs: readonly number[],
  at: (x: number) => number | null,
): Plot['series'][number] => ({
  label,
  points: xs.flatMap((x) => {
    const y = at(x);
    return y === null ? [] : [[x, y] as const];
  }),
});
