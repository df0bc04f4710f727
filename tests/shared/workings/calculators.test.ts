import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Calculator, Inputs } from '#shared/workings/calculator.ts';
import type { Field } from '#shared/workings/field.ts';
import { calculators } from '#shared/workings/index.ts';
import { wiredAnswer, workedAnswer } from '#shared/workings/wire.ts';
import { saidBy, workedByHand } from './by-hand.ts';

/** Anything a field may take, its ends with it; rarely nothing, where it may be unknown. */
function anyOf({ control, isOptional }: Field): fc.Arbitrary<unknown> {
  const some = (() => {
    if (control.kind === 'choice') return fc.constantFrom(...Object.keys(control.options));
    if (control.kind === 'day')
      return fc
        .date({ min: new Date('1950-01-01'), max: new Date('2090-01-01'), noInvalidDate: true })
        .map((day) => day.toISOString().slice(0, 10));
    const { min, max, quantity } = control;
    return quantity === 'count'
      ? fc.integer({ min, max })
      : fc.oneof(
          { weight: 8, arbitrary: fc.double({ min, max, noNaN: true }) },
          { weight: 1, arbitrary: fc.constantFrom(min, max) },
        );
  })();
  return isOptional
    ? fc.oneof({ weight: 5, arbitrary: some }, { weight: 1, arbitrary: fc.constant(null) })
    : some;
}

const anyInputs = ({ fields }: Calculator): fc.Arbitrary<Inputs> =>
  fc.record(Object.fromEntries(Object.entries(fields).map(([name, field]) => [name, anyOf(field)])));

const noNumber = /NaN|Infinity|undefined|null|\d[eE][+-]?\d/;

const textsOf = (calculator: Calculator, inputs: Inputs): string[] => {
  const outcome = calculator.work(inputs);
  return (['metric', 'imperial'] as const).flatMap((units) => {
    const wired = wiredAnswer(calculator, outcome, units);
    return [
      ...wired.says,
      ...wired.answers.map(({ text }) => text),
      ...wired.steps.flatMap(({ title, lines, refusals }) => [
        title,
        ...lines.flatMap((line) => [
          line.substituted,
          line.result.text,
          ...line.inputs.map(({ text }) => text),
        ]),
        ...refusals.map(({ text }) => text),
      ]),
    ];
  });
};

describe.each(calculators.map((calculator) => [calculator.id, calculator] as const))(
  '%s',
  (_, calculator) => {
    const example = calculator.schema.parse(calculator.initial);

    test('starts with an example that works out', () => {
      const outcome = calculator.work(example);
      expect(outcome.answers.length + outcome.says.length).toBeGreaterThan(0);
      expect(outcome.steps.flatMap(({ refusals }) => refusals)).toEqual([]);
      expect(workedAnswer.safeParse(wiredAnswer(calculator, outcome, 'metric')).success).toBe(true);
    });

    test('every line says what it does: the printed formula, worked from its text, gives the result', () => {
      for (const { lines } of calculator.work(example).steps) {
        for (const line of lines) {
          const said = saidBy(line);
          const byHand = workedByHand(line);
          expect(
            Math.abs(byHand - said),
            `${line.formula} gives ${String(byHand)}, not ${String(said)}`,
          ).toBeLessThanOrEqual(Math.abs(said) * 1e-6 + 1e-12);
        }
      }
    });

    test('whatever is given in range is refused in words or worked out in figures, never in nonsense', () => {
      fc.assert(
        fc.property(anyInputs(calculator), (inputs) => {
          const read = calculator.schema.safeParse(inputs);
          // What is refused is refused by a field's name and in words; there is nothing to work out.
          const issues = read.error?.issues ?? [];
          expect(
            issues.every(({ path, message }) => String(path[0]) in calculator.fields && message !== ''),
          ).toBe(true);
          if (!read.success) return;
          for (const text of textsOf(calculator, read.data)) expect(text).not.toMatch(noNumber);
          for (const { lines } of calculator.work(read.data).steps)
            for (const line of lines) {
              const said = saidBy(line);
              expect(Math.abs(workedByHand(line) - said)).toBeLessThanOrEqual(Math.abs(said) * 1e-5 + 1e-8);
            }
          const plot = calculator.plot(read.data);
          const figures =
            plot === null
              ? []
              : [
                  ...plot.series.flatMap(({ points }) => points.flat()),
                  ...plot.marks.flatMap(({ x, y }) => [x, y]),
                  ...plot.levels.map(({ y }) => y),
                ];
          expect(figures.every(Number.isFinite)).toBe(true);
        }),
        { numRuns: 250 },
      );
    });

    test('each field refuses what is outside its range, in a sentence with the limit in it', () => {
      for (const [name, { control, label }] of Object.entries(calculator.fields)) {
        if (control.kind !== 'quantity') continue;
        for (const outside of [
          control.min - Math.abs(control.min) - 1,
          control.max * 2 + 1,
          Number.NaN,
          Infinity,
        ]) {
          const read = calculator.schema.safeParse({ ...example, [name]: outside });
          expect(read.success).toBe(false);
          const said = read.error?.issues.find(({ path }) => path[0] === name)?.message ?? '';
          expect(said).toMatch(new RegExp(`^(Give a figure: |${label} (cannot be|is a whole number))`, 'u'));
          expect(said).not.toMatch(noNumber);
        }
      }
    });
  },
);

test('ids are unique', () => {
  expect(new Set(calculators.map(({ id }) => id)).size).toBe(calculators.length);
});
