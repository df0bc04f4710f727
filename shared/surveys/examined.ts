import type { BoilerFacts } from '../boilers/boiler.ts';
import { compareCanonical, compareCodeUnits } from './canonical.ts';
import type { Finding, Grade, Measurement, SurveyRecord } from './record.ts';
import { criteriaFor, rubricOf } from './rubric/index.ts';
import type { Criterion } from './rubric/types.ts';
import type { ScopeId } from './scopes.ts';

/** All that a score rests on. */
export interface SurveyInput {
  facts: BoilerFacts;
  record: SurveyRecord;
  scope: ScopeId;
}

/** A criterion that applies, with what was found of it. */
export interface Examined {
  criterion: Criterion;
  finding: Finding;
}

/** Grades that say the thing was looked at, worst first; the order a doubled finding is settled by. */
const worstFirst: readonly Grade[] = [
  'unfit',
  'attention',
  'serviceable',
  'sound',
  'notExamined',
  'notFitted',
];
const examinedGrades: ReadonlySet<Grade> = new Set(['unfit', 'attention', 'serviceable', 'sound']);

export const isExamined = ({ finding }: Examined): boolean => examinedGrades.has(finding.grade);
export const isFitted = ({ finding }: Examined): boolean => finding.grade !== 'notFitted';

const nothingFound = (criterionId: string): Finding => ({
  criterionId,
  grade: 'notExamined',
  ways: [],
  defects: [],
  measurements: [],
  photoIds: [],
  note: '',
  reason: '',
});

// Two devices may each have saved a finding on one criterion: the worse grade stands, and nothing found is dropped.
function merge(criterionId: string, findings: readonly Finding[]): Finding {
  const [only] = findings;
  if (only === undefined) return nothingFound(criterionId);
  const grade = worstFirst.find((each) => findings.some((finding) => finding.grade === each)) ?? only.grade;
  return {
    criterionId,
    grade,
    ways: [...new Set(findings.flatMap((finding) => finding.ways))].toSorted(compareCodeUnits),
    defects: findings.flatMap((finding) => finding.defects).toSorted(compareCanonical),
    measurements: findings.flatMap((finding) => finding.measurements).toSorted(compareCanonical),
    photoIds: [...new Set(findings.flatMap((finding) => finding.photoIds))].toSorted(compareCodeUnits),
    note: '',
    reason: findings
      .map((finding) => finding.reason)
      .toSorted(compareCodeUnits)
      .filter(Boolean)
      .join('; '),
  };
}

/** Every criterion that applies, in the order of examination, whatever the order the findings came in. */
export function examinedOf({ facts, record }: Pick<SurveyInput, 'facts' | 'record'>): Examined[] {
  const byCriterion = new Map<string, Finding[]>();
  for (const finding of record.findings) {
    byCriterion.set(finding.criterionId, [...(byCriterion.get(finding.criterionId) ?? []), finding]);
  }
  return criteriaFor(facts, rubricOf(record.rubricVersion)).map((criterion) => ({
    criterion,
    finding: merge(criterion.id, byCriterion.get(criterion.id) ?? []),
  }));
}

/** What was measured of one quantity, in the order of the values. */
export const valuesOf = (
  examined: readonly Examined[],
  criterionId: string,
  quantity: string,
): Measurement['value'][] =>
  examined
    .filter(({ criterion }) => criterion.id === criterionId)
    .flatMap(({ finding }) => finding.measurements)
    .filter((measured) => measured.quantity === quantity)
    .map((measured) => measured.value);

/** The least (or the greatest) figure measured of one quantity; null where there is none. */
export function figureOf(
  examined: readonly Examined[],
  criterionId: string,
  quantity: string,
  which: 'least' | 'most' = 'least',
): number | null {
  const figures = valuesOf(examined, criterionId, quantity).filter((value) => typeof value === 'number');
  if (figures.length === 0) return null;
  return which === 'least' ? Math.min(...figures) : Math.max(...figures);
}
