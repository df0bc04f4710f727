import type { BoilerFacts } from '../boilers/boiler.ts';
import { pointer } from '../problem.ts';
import { instrumentsOf, instrumentsThatMatter } from './instruments.ts';
import { instrumentKinds } from './record.ts';
import type { Finding, SurveyRecord } from './record.ts';
import { criteriaFor, rubricOf } from './rubric/index.ts';
import type { Criterion } from './rubric/types.ts';
import { scopes } from './scopes.ts';
import type { ScopeId } from './scopes.ts';
import { inSentence } from './words.ts';

/** One thing that keeps a survey from being filed; `pointer` is a JSON pointer into the record. */
export interface Missing {
  criterionId: string | null;
  pointer: string;
  sentence: string;
}

const needsCause = (finding: Finding): boolean => finding.grade === 'attention' || finding.grade === 'unfit';

function missingOf(criterion: Criterion, finding: Finding, index: number, photoIds: ReadonlySet<string>) {
  const at = (field: string, sentence: string): Missing => ({
    criterionId: criterion.id,
    pointer: pointer(['findings', index, field]),
    sentence: `${criterion.title}: ${sentence}`,
  });
  const missing: Missing[] = [];
  if (needsCause(finding)) {
    if (finding.defects.length === 0) missing.push(at('defects', 'name the defect behind the grade.'));
    const hasPhoto = finding.photoIds.some((id) => photoIds.has(id));
    if (!hasPhoto && finding.measurements.length === 0)
      missing.push(at('photoIds', 'add a photograph or a measurement that shows it.'));
  }
  if (finding.grade === 'notExamined' && finding.reason.trim() === '')
    missing.push(at('reason', 'say why it was not examined.'));
  const isExamined = finding.grade !== 'notExamined' && finding.grade !== 'notFitted';
  if (isExamined && !criterion.ways.some((way) => finding.ways.includes(way.id)))
    missing.push(at('ways', 'say how it was examined.'));
  if (finding.photoIds.some((id) => !photoIds.has(id)))
    missing.push(at('photoIds', 'a photograph has not arrived yet.'));
  return missing;
}

function missingTests(record: SurveyRecord, scope: ScopeId): Missing[] {
  const missing: Missing[] = [];
  const need = (field: 'hydraulic' | 'steam', reason: 'noHydraulicReason' | 'noSteamReason') => {
    if (!scopes[scope][field] || record[field] !== null || record[reason].trim() !== '') return;
    missing.push({
      criterionId: null,
      pointer: pointer([field]),
      sentence: `Record the ${field} test, or say why there was none.`,
    });
  };
  need('hydraulic', 'noHydraulicReason');
  need('steam', 'noSteamReason');
  const { hydraulic } = record;
  if (hydraulic !== null && (hydraulic.holdStartMinute === null || hydraulic.holdEndMinute === null))
    missing.push({
      criterionId: null,
      pointer: pointer(['hydraulic', 'holdEndMinute']),
      sentence: 'Hydraulic test: mark when the hold began and ended.',
    });
  if (hydraulic !== null && hydraulic.readings.length === 0)
    missing.push({
      criterionId: null,
      pointer: pointer(['hydraulic', 'readings']),
      sentence: 'Hydraulic test: record the readings of the test gauge.',
    });
  return missing;
}

const missingInstruments = (record: SurveyRecord): Missing[] =>
  instrumentsThatMatter(record)
    .filter(({ kind }) => instrumentsOf(record, kind).length === 0)
    .map(({ kind, usedFor }) => ({
      criterionId: null,
      pointer: pointer(['instruments']),
      sentence: `Name the ${inSentence(instrumentKinds[kind])} used for ${usedFor}.`,
    }));

/**
 * What must still be recorded before a survey can be filed, in the order of the form.
 *
 * @param held the photographs that have arrived; a finding that names another is not complete.
 * @throws Problem `invalid-input` if the record names a version of the method that was never published.
 */
export function missingForFiling(
  facts: BoilerFacts,
  record: SurveyRecord,
  scope: ScopeId,
  held: { photoIds: readonly string[] },
): Missing[] {
  const photoIds = new Set(held.photoIds);
  const missing: Missing[] = [];
  if (record.examinedOn === null)
    missing.push({
      criterionId: null,
      pointer: pointer(['examinedOn']),
      sentence: 'Give the day of examination.',
    });
  missing.push(...missingInstruments(record));
  for (const criterion of criteriaFor(facts, rubricOf(record.rubricVersion))) {
    const index = record.findings.findIndex((finding) => finding.criterionId === criterion.id);
    const finding = record.findings[index];
    if (finding === undefined)
      missing.push({
        criterionId: criterion.id,
        pointer: pointer(['findings']),
        sentence: `${criterion.title}: grade it, or mark it not examined or not fitted.`,
      });
    else missing.push(...missingOf(criterion, finding, index, photoIds));
  }
  return [...missing, ...missingTests(record, scope)];
}
