import { describe, expect, it } from 'vitest';
import { exampleSurvey } from '#shared/surveys/example.ts';
import { surveyRecord } from '#shared/surveys/record.ts';
import type { Grade } from '#shared/surveys/record.ts';
import { criteriaFor, rubricOf, rubricVersion, rubricVersions } from '#shared/surveys/rubric/index.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { unknownWords } from '#shared/surveys/vocabulary.ts';
import { defectFor, isUntouched, surveyOf, untouched, withGrade } from '#web/features/method/trial.ts';
import type { Trial } from '#web/features/method/trial.ts';

const score = (trial: Trial, version = rubricVersion) => scoreSurvey(surveyOf(trial, version));
const regrade = (id: string, grade: Grade): Trial => withGrade(untouched, id, grade, 'sound');

describe.each(rubricVersions.map(({ version }) => version))('the example under version %s', (version) => {
  it('starts in steaming order, all sound but a few serviceable', () => {
    const start = surveyOf(untouched, version);
    expect(start).toEqual(exampleSurvey(version));
    expect(surveyRecord.parse(start.record)).toEqual(start.record);
    expect(unknownWords(start.record)).toEqual([]);
    const others = start.record.findings.flatMap(({ grade }) => (grade === 'sound' ? [] : [grade]));
    expect(new Set(others)).toEqual(new Set(['serviceable']));
    expect(others.length).toBeLessThan(6);
    const result = score(untouched, version);
    expect(result.verdict.id).toBe('in-steaming-order');
    expect(result.checks.filter(({ status }) => status === 'fail')).toEqual([]);
  });

  it('says only what the method has words for, whatever is chosen', () => {
    const criteria = criteriaFor(exampleSurvey(version).facts, rubricOf(version));
    for (const grade of ['sound', 'serviceable', 'attention', 'unfit', 'notExamined', 'notFitted'] as const) {
      const grades = Object.fromEntries(criteria.map(({ id }) => [id, grade]));
      const { record } = surveyOf({ ...untouched, grades }, version);
      expect(unknownWords(record)).toEqual([]);
      expect(new Set(record.findings.map((finding) => finding.grade))).toEqual(new Set([grade]));
    }
  });
});

describe('what the reader changes', () => {
  it('takes the first catalogue defect of the grade, and the allowance moves with it', () => {
    const before = score(untouched);
    const after = score(regrade('safety.glass', 'attention'));
    expect(after.verdict.id).toBe('repair-before-steaming');
    const lines = after.allowance.groups.flatMap((group) => group.lines);
    expect(lines.find(({ criterionId }) => criterionId === 'safety.glass')?.defectCode).toBe('glass-etched');
    expect(after.allowance.total.highMinor).toBeGreaterThan(before.allowance.total.highMinor);
  });

  it('needs no defect where the catalogue has none of that grade', () => {
    const mount = criteriaFor(exampleSurvey().facts).find(({ id }) => id === 'casing.mount')!;
    expect(defectFor(mount, 'unfit')).toBeUndefined();
    expect(score(regrade('casing.mount', 'unfit')).verdict.id).toBe('in-steaming-order');
  });

  it('stops the boiler on one safety-critical item, whatever the rest', () => {
    const { verdict, reasons } = score(regrade('shell.barrel', 'unfit'));
    expect(verdict.id).toBe('do-not-steam');
    expect(reasons.map(({ rule }) => rule)).toContain('safety-critical-unfit');
  });

  it('lowers Evidence, and not Condition, by what was not examined', () => {
    const before = score(untouched);
    const after = score(regrade('shell.tubes', 'notExamined'));
    expect(after.evidence).toBeLessThan(before.evidence);
    expect(after.notExamined.map(({ criterionId }) => criterionId)).toEqual(['shell.tubes']);
  });

  it.each([
    [{ hydraulic: 'fell' }, 'do-not-steam', 'hydraulic-test-failed'],
    [{ hydraulic: 'leak' }, 'do-not-steam', 'hydraulic-test-failed'],
    [{ hydraulic: 'none' }, 'not-proven', 'no-hydraulic-test'],
    [{ steam: 'late' }, 'do-not-steam', 'valve-did-not-lift'],
    [{ steam: 'none' }, 'not-proven', 'no-steam-test'],
    [{ carbonMonoxide: 'high' }, 'do-not-steam', 'carbon-monoxide'],
  ] as const)('%o gives %s', (change, verdict, rule) => {
    const result = score({ ...untouched, ...change });
    expect(result.verdict.id).toBe(verdict);
    expect(result.reasons.map((reason) => reason.rule)).toContain(rule);
  });

  it('is forgotten when it is taken back', () => {
    const changed = regrade('shell.barrel', 'unfit');
    expect(isUntouched(changed)).toBe(false);
    expect(withGrade(changed, 'shell.barrel', 'sound', 'sound')).toEqual(untouched);
    expect(isUntouched(untouched)).toBe(true);
  });
});
