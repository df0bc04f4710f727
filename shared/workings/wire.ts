import { z } from 'zod';
import { specOf } from '../engineering/quantities.ts';
import type { UnitSystem } from '../engineering/quantities.ts';
import { surenesses } from '../engineering/sources.ts';
import type { Sureness } from '../engineering/sources.ts';
import { formulaText, resultText, sourceOf, substitutedText, termText } from '../engineering/working.ts';
import type { Line, Term } from '../engineering/working.ts';
import type { Calculator, Outcome } from './calculator.ts';

const figure = z.strictObject({
  symbol: z.string(),
  label: z.string(),
  value: z.number(),
  /** The unit `value` is in. */
  unit: z.string(),
  /** The same as a reader of the units asked for writes it. */
  text: z.string(),
});

const line = z.strictObject({
  formula: z.string(),
  substituted: z.string(),
  inputs: z.array(figure),
  result: figure,
  holds: z.string(),
  source: z.strictObject({
    title: z.string(),
    sureness: z.enum(Object.keys(surenesses) as [Sureness, ...Sureness[]]),
  }),
});

/** The answer of a calculator on the wire: figures, what they mean, and every line of the working. */
export const workedAnswer = z.strictObject({
  calculator: z.string(),
  answers: z.array(figure),
  says: z.array(z.string()),
  caution: z.string().nullable(),
  steps: z.array(
    z.strictObject({
      title: z.string(),
      lines: z.array(line),
      refusals: z.array(
        z.strictObject({ code: z.enum(['out-of-range', 'not-published', 'measure-it']), text: z.string() }),
      ),
    }),
  ),
});
export type WorkedAnswer = z.infer<typeof workedAnswer>;

const figureOf = (term: Term, units: UnitSystem): z.infer<typeof figure> => ({
  symbol: term.symbol,
  label: term.label,
  value: term.value,
  unit: specOf(term.quantity).base,
  text: termText(term, units),
});

const lineOf = (of: Line, units: UnitSystem): z.infer<typeof line> => ({
  formula: formulaText(of),
  substituted: `${of.result.symbol} = ${substitutedText(of, units)} = ${resultText(of, units)}`,
  inputs: of.terms.map((term) => figureOf(term, units)),
  result: figureOf(of.result, units),
  holds: of.holds,
  source: { ...sourceOf(of) },
});

/** An outcome as it is sent. */
export const wiredAnswer = (
  { id, caution }: Calculator,
  outcome: Outcome,
  units: UnitSystem,
): WorkedAnswer => ({
  calculator: id,
  answers: outcome.answers.map((term) => figureOf(term, units)),
  says: [...outcome.says],
  caution,
  steps: outcome.steps.map(({ title, lines, refusals }) => ({
    title,
    lines: lines.map((each) => lineOf(each, units)),
    refusals: refusals.map(({ refused, text }) => ({ code: refused, text })),
  })),
});
