import type { BoilerFacts, FittingId } from '../boilers/boiler.ts';
import { fittings } from '../boilers/boiler.ts';
import { pointer } from '../problem.ts';
import { checksFor } from './checks.ts';
import { examinedOf } from './examined.ts';
import type { Missing } from './completeness.ts';
import { grades } from './record.ts';
import type { Finding, Measurement, SurveyRecord } from './record.ts';
import { applies, criteriaOf, defectOf, rubricOf } from './rubric/index.ts';
import type { Criterion, MeasurementSpec } from './rubric/types.ts';
import { wayLabels } from './rubric/types.ts';
import { inSentence } from './words.ts';

/** The fitting the seller lists that a criterion examines. */
const listedFitting: Readonly<Record<string, FittingId>> = {
  'safety.valve': 'safety-valve',
  'safety.gauge': 'pressure-gauge',
  'safety.glass': 'water-gauge',
  'safety.blowdown': 'blowdown-valve',
  'feed.check': 'check-valve',
  'feed.stop': 'stop-valve',
  'feed.tank': 'feed-tank',
  'casing.lagging': 'lagging',
};

const isPassed = (finding: Finding): boolean => finding.grade === 'sound' || finding.grade === 'serviceable';

/** What is wrong with a value for its quantity, or null. */
function misfit(spec: MeasurementSpec, value: Measurement['value']): string | null {
  if (spec.unit === 'text') return typeof value === 'string' ? null : 'is put in words';
  if (spec.unit === 'yes-no') return typeof value === 'boolean' ? null : 'is a yes or a no';
  if (spec.unit === 'choice')
    return spec.choices.some((choice) => choice.id === value) ? null : 'is one of its list';
  if (typeof value !== 'number') return 'is a figure';
  const unit = spec.unit === 'count' ? '' : ` ${spec.unit}`;
  if (spec.unit === 'count' && !Number.isInteger(value)) return 'is a whole number';
  if (spec.min !== null && value < spec.min) return `is at least ${String(spec.min)}${unit}`;
  if (spec.max !== null && value > spec.max) return `is at most ${String(spec.max)}${unit}`;
  return null;
}

type Say = (field: string, sentence: string) => void;

function ofVocabulary(criterion: Criterion, finding: Finding, say: Say): void {
  for (const id of finding.ways) {
    if (!criterion.ways.some((way) => way.id === id)) say('ways', `“${id}” is not a way of examining it.`);
  }
  for (const { code } of finding.defects) {
    if (defectOf(criterion, code) === undefined) say('defects', `“${code}” is not in its defect catalogue.`);
  }
  for (const { quantity, value } of finding.measurements) {
    const spec = criterion.measurements.find((each) => each.quantity === quantity);
    if (spec === undefined || spec.takenIn !== 'finding')
      say('measurements', `“${quantity}” is not measured here.`);
    else {
      const wrong = misfit(spec, value);
      if (wrong !== null) say('measurements', `${inSentence(spec.label)} ${wrong}.`);
    }
  }
}

function ofGrade(criterion: Criterion, finding: Finding, record: SurveyRecord, say: Say): void {
  const specs = finding.defects.flatMap(({ code }) => defectOf(criterion, code) ?? []);
  const label = grades[finding.grade];
  if (!isPassed(finding) && finding.grade !== 'notExamined' && finding.grade !== 'notFitted') {
    if (specs.length === 0) say('grade', `graded ${label}, and no defect is named.`);
  }
  const stop = specs.find((spec) => spec.stop !== null);
  if (stop !== undefined && finding.grade !== 'unfit')
    say('grade', `graded ${label}, though “${inSentence(stop.label)}” is recorded.`);
  const worse = specs.find((spec) => spec.stop === null && spec.grade !== 'serviceable');
  if (worse !== undefined && finding.grade === 'sound')
    say('grade', `graded Sound, though “${inSentence(worse.label)}” is recorded.`);
  const isAbsent = finding.grade === 'notExamined' || finding.grade === 'notFitted';
  if (isAbsent && (finding.defects.length > 0 || finding.measurements.length > 0))
    say('grade', `marked ${label}, though something is recorded of it.`);
  for (const id of ['hydraulic', 'steam'] as const) {
    if (finding.ways.includes(id) && record[id] === null)
      say('ways', `${inSentence(wayLabels[id])}, but no ${id} test is recorded.`);
  }
  const bulge = finding.measurements.find((measured) => measured.quantity === 'bulgeMm');
  if (typeof bulge?.value === 'number' && bulge.value > 1 && specs.length === 0)
    say('defects', 'dished by more than 1 mm, and no defect is named.');
}

function ofTests({ hydraulic, steam }: SurveyRecord): Missing[] {
  const found: Missing[] = [];
  const say = (path: readonly string[], sentence: string) =>
    found.push({ criterionId: null, pointer: pointer(path), sentence });
  if (hydraulic !== null && hydraulic.holdStartMinute !== null && hydraulic.holdEndMinute !== null) {
    if (hydraulic.holdEndMinute <= hydraulic.holdStartMinute)
      say(['hydraulic', 'holdEndMinute'], 'Hydraulic test: the hold ends before it begins.');
  }
  if (steam !== null) {
    const { valveLiftsAtPa: lifts, valveReseatsAtPa: reseats, highestPressurePa: highest } = steam;
    if (lifts !== null && reseats !== null && reseats > lifts)
      say(['steam', 'valveReseatsAtPa'], 'Steam test: the valve reseats above the pressure it lifts at.');
    if (lifts !== null && highest !== null && highest < lifts)
      say(
        ['steam', 'highestPressurePa'],
        'Steam test: the highest pressure is below the one the valve lifts at.',
      );
    if (!steam.raisedSteam && (lifts !== null || highest !== null))
      say(['steam', 'raisedSteam'], 'Steam test: steam was not raised, yet pressures are recorded.');
  }
  return found;
}

function ofFailedChecks(facts: BoilerFacts, record: SurveyRecord): Missing[] {
  const items = examinedOf({ facts, record });
  return checksFor({ facts, record, scope: 'full' }, items)
    .filter((check) => check.status === 'fail')
    .flatMap((check): Missing[] => {
      const index = record.findings.findIndex((finding) => finding.criterionId === check.criterionId);
      const finding = record.findings[index];
      if (finding === undefined || !isPassed(finding)) return [];
      return [
        {
          criterionId: check.criterionId,
          pointer: pointer(['findings', index, 'grade']),
          sentence: `${check.title}: ${inSentence(check.text)} The item is graded ${grades[finding.grade]}.`,
        },
      ];
    });
}

/**
 * Where a record does not agree with itself, with the method or with the listing. None of it stops filing by itself:
 * the surveyor may be right, but should look again.
 *
 * @throws Problem `invalid-input` if the record names a version of the method that was never published.
 */
export function contradictions(facts: BoilerFacts, record: SurveyRecord): Missing[] {
  const rubric = rubricOf(record.rubricVersion);
  const known = new Map(criteriaOf(rubric).map((criterion) => [criterion.id, criterion]));
  const seen = new Set<string>();
  const found: Missing[] = [];
  for (const [index, finding] of record.findings.entries()) {
    const criterion = known.get(finding.criterionId);
    const say: Say = (field, sentence) =>
      found.push({
        criterionId: criterion?.id ?? null,
        pointer: pointer(['findings', index, field]),
        sentence: criterion === undefined ? sentence : `${criterion.title}: ${sentence}`,
      });
    if (criterion === undefined) {
      say('criterionId', `“${finding.criterionId}” is not in this version of the method.`);
      continue;
    }
    if (seen.has(criterion.id)) say('criterionId', 'there are two findings on it.');
    seen.add(criterion.id);
    if (!applies(criterion.appliesTo, facts)) say('criterionId', 'does not apply to this boiler.');
    ofVocabulary(criterion, finding, say);
    ofGrade(criterion, finding, record, say);
    const listed = listedFitting[criterion.id];
    if (finding.grade === 'notFitted' && listed !== undefined && facts.fittings.includes(listed))
      say('grade', `marked Not fitted, though the listing has “${inSentence(fittings[listed])}”.`);
  }
  return [...found, ...ofTests(record), ...ofFailedChecks(facts, record)];
}
