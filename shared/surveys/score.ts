import { allowanceOf } from './allowance.ts';
import { checksFor } from './checks.ts';
import { conditionOf, meanOf } from './condition.ts';
import { evidenceOf } from './evidence.ts';
import { examinedOf } from './examined.ts';
import type { SurveyInput } from './examined.ts';
import type { SurveyResult } from './result.ts';
import { rubricOf } from './rubric/index.ts';
import { verdictOf } from './verdict.ts';

/**
 * Scores a survey by the published method: the same findings give the same bytes, in the browser and on the server.
 *
 * Order of findings, photographs and keys does not matter. There is no clock: every date is set against the day of
 * examination. Condition and section means are rounded to the nearest whole number, halves up; Evidence is rounded
 * down; money is whole pence, each line rounded once, halves up.
 *
 * @throws Problem `invalid-input` if the record names a version of the method that was never published.
 */
export function scoreSurvey(input: SurveyInput): SurveyResult {
  const { facts, record } = input;
  const items = examinedOf(input);
  const checks = checksFor(input, items);
  const safetyEvidence =
    evidenceOf(
      items.filter(({ criterion }) => criterion.safetyCritical),
      record,
    ) ?? 0;
  return {
    rubricVersion: record.rubricVersion,
    condition: conditionOf(items),
    evidence: evidenceOf(items, record) ?? 0,
    safetyEvidence,
    sections: rubricOf(record.rubricVersion).sections.map(({ id, title }) => {
      const own = items.filter(({ criterion }) => criterion.section === id);
      return { id, title, mean: meanOf(own), evidence: evidenceOf(own, record) };
    }),
    ...verdictOf(items, input, checks, safetyEvidence),
    checks,
    allowance: allowanceOf(facts, record),
    notExamined: items
      .filter(({ finding }) => finding.grade === 'notExamined')
      .map(({ criterion, finding }) => ({
        criterionId: criterion.id,
        title: criterion.title,
        safetyCritical: criterion.safetyCritical,
        reason: finding.reason,
      })),
  };
}
