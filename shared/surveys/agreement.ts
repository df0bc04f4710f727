import { compareCodeUnits } from './canonical.ts';
import { examinedOf, isExamined } from './examined.ts';
import type { SurveyInput } from './examined.ts';
import { quadraticKappa } from '../engineering/kappa.ts';
import type { Grade } from './record.ts';
import { criterionOf } from './rubric/index.ts';

const scale: readonly Grade[] = ['sound', 'serviceable', 'attention', 'unfit'];

const numberOf = (id: string): number => criterionOf(id)?.number ?? 0;

export interface Disagreement {
  criterionId: string;
  title: string;
  first: Grade;
  second: Grade;
  /** How many grades apart, 1–3. */
  steps: number;
}

export interface Agreement {
  /** Criteria that both surveys graded. */
  common: number;
  /** Quadratic weighted kappa, 1 for full agreement; null where it is not defined. */
  kappa: number | null;
  /** Widest apart first, then in the order of examination. */
  differences: Disagreement[];
}

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
