import { z } from 'zod';
import { endpoint } from '../endpoint.ts';
import { specOf } from '../engineering/quantities.ts';
import type { Calculator } from './calculator.ts';
import { calculators } from './index.ts';
import { workedAnswer } from './wire.ts';

const nameOf = (id: string): string =>
  `work${id.replace(/(^|-)([a-z])/g, (_, __, letter: string) => letter.toUpperCase())}`;

const fieldInWords = z.strictObject({
  name: z.string(),
  label: z.string(),
  kind: z.enum(['quantity', 'choice', 'day']),
  /** For a figure: the unit it is sent in, and its range. */
  unit: z.string().nullable(),
  min: z.number().nullable(),
  max: z.number().nullable(),
  choices: z.array(z.strictObject({ id: z.string(), label: z.string() })),
  /** Null may be sent where it is not known. */
  isOptional: z.boolean(),
});

export const calculatorInWords = z.strictObject({
  id: z.string(),
  title: z.string(),
  about: z.string(),
  fields: z.array(fieldInWords),
});

/** A calculator described for a caller. */
export const describeCalculator = ({
  id,
  title,
  about,
  fields,
}: Calculator): z.infer<typeof calculatorInWords> => ({
  id,
  title,
  about,
  fields: Object.entries(fields).map(([name, { label, control, isOptional }]) => ({
    name,
    label,
    kind: control.kind,
    unit: control.kind === 'quantity' ? specOf(control.quantity).base : null,
    min: control.kind === 'quantity' ? control.min : null,
    max: control.kind === 'quantity' ? control.max : null,
    choices:
      control.kind === 'choice'
        ? Object.entries(control.options).map(([choiceId, words]) => ({ id: choiceId, label: words }))
        : [],
    isOptional,
  })),
});

export const listWorkings = endpoint({
  name: 'listWorkings',
  summary: 'The calculators: what each answers and what it asks',
  method: 'GET',
  path: '/api/workings',
  response: z.object({ items: z.array(calculatorInWords) }),
});

const work = (calculator: Calculator) =>
  endpoint({
    name: nameOf(calculator.id),
    summary: `${calculator.title}. ${calculator.about}`,
    method: 'POST',
    path: `/api/workings/${calculator.id}`,
    body: z.strictObject({
      inputs: calculator.schema,
      /** How the texts of the answer are written; figures are always in the units named beside them. */
      units: z.enum(['metric', 'imperial']).default('metric'),
    }),
    response: workedAnswer,
  });

/** One operation for each calculator, so that each one's inputs are described. */
export const workings = calculators.map((calculator) => ({ calculator, endpoint: work(calculator) }));
