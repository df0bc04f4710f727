import { kappaLine } from '../../engineering/kappa.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, steps } from '../calculator.ts';
import { whole } from '../field.ts';
import type { Field } from '../field.ts';

const grades = ['Sound', 'Serviceable', 'Needs attention', 'Unfit'] as const;
const example = [
  [12, 3, 0, 0],
  [2, 6, 1, 0],
  [0, 1, 3, 0],
  [0, 0, 1, 1],
] as const;
const nameOf = (row: number, column: number): string => `n${String(row + 1)}${String(column + 1)}`;

const fields: Record<string, Field<number>> = Object.fromEntries(
  grades.flatMap((first, row) =>
    grades.map((second, column) => [
      nameOf(row, column),
      whole(second, [0, 500], example[row]?.[column] ?? 0, { part: `First said ${first}, second said` }),
    ]),
  ),
);

/** How far two surveys agree. */
export const agreementCalculator = calculator({
  id: 'agreement',
  title: 'Agreement of two surveys',
  about: 'Weighted kappa over the items that two surveyors both graded.',
  group: 'papers',
  caution: null,
  fields,
  check: (input) =>
    Object.values(input).every((count) => count === 0)
      ? [{ field: nameOf(0, 0), message: 'Give at least two items that both graded' }]
      : [],
  work: (input) => {
    const table = grades.map((_, row) => grades.map((__, column) => input[nameOf(row, column)] ?? 0));
    const line = kappaLine(table);
    return {
      answers: line === null ? [] : [line.result],
      says: [
        line === null
          ? 'Not defined: both gave one and the same grade throughout, so chance alone would agree as well.'
          : `${trim(line.result.value, 2)}, where 1 is full agreement and 0 is what chance would give. A grade two steps off counts four times one step.`,
      ],
      steps: line === null ? [] : [steps('Kappa', line)],
    };
  },
});
