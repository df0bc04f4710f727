import { z } from 'zod';
import { quadraticKappa } from '../engineering/kappa.ts';
import { compareCodeUnits } from './canonical.ts';
import { examinedOf, isExamined } from './examined.ts';
import type { SurveyInput } from './examined.ts';
import { grade as gradeId } from './record.ts';
import type { Grade } from './record.ts';
import { criterionOf } from './rubric/index.ts';

const scale: readonly Grade[] = ['sound', 'serviceable', 'attention', 'unfit'];

const numberOf = (id: string): number => criterionOf(id)?.number ?? 0;

export const disagreement = z.strictObject({
  criterionId: z.string(),
  title: z.string(),
  first: gradeId,
  second: gradeId,
  /** How many grades apart, 1–3. */
  steps: z.int().min(1).max(3),
});
export type Disagreement = z.infer<typeof disagreement>;

export const agreement = z.strictObject({
  /** Criteria that both surveys graded. */
  common: z.int().min(0),
  /** Quadratic weighted kappa, 1 for full agreement; null where it is not defined. */
  kappa: z.number().max(1).nullable(),
  /** Widest apart first, then in the order of examination. */
  differences: z.array(disagreement),
});
export type Agreement = z.infer<typeof agreement>;

const gradesOf = (survey: Pick<SurveyInput, 'facts' | 'record'>): Map<string, Grade> =>
  new Map(
    examinedOf(survey)
      .filter(isExamined)
      .map(({ criterion, finding }) => [criterion.id, finding.grade]),
  );

/**
 * How far two surveys of one boiler agree over the criteria both graded.
 *
 * Kappa is not defined where fewer than two criteria are common, or where both gave one and the same grade throughout.
 */
export function agreementOf(
  first: Pick<SurveyInput, 'facts' | 'record'>,
  second: Pick<SurveyInput, 'facts' | 'record'>,
): Agreement {
  const one = gradesOf(first);
  const other = gradesOf(second);
  const table = scale.map(() => scale.map(() => 0));
  const differences: Disagreement[] = [];
  let common = 0;
  for (const [criterionId, grade] of one) {
    const against = other.get(criterionId);
    if (against === undefined) continue;
    common += 1;
    const row = table[scale.indexOf(grade)];
    const column = scale.indexOf(against);
    if (row !== undefined) row[column] = (row[column] ?? 0) + 1;
    if (grade !== against)
      differences.push({
        criterionId,
        title: criterionOf(criterionId)?.title ?? criterionId,
        first: grade,
        second: against,
        steps: Math.abs(scale.indexOf(grade) - column),
      });
  }
  return {
    common,
    kappa: common < 2 ? null : quadraticKappa(table),
    differences: differences.toSorted(
      (a, b) =>
        b.steps - a.steps ||
        numberOf(a.criterionId) - numberOf(b.criterionId) ||
        compareCodeUnits(a.criterionId, b.criterionId),
    ),
  };
}
