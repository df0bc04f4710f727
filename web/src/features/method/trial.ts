import { exampleSurvey } from '#shared/surveys/example.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import type { Finding, Grade, HydraulicTest, SteamTest } from '#shared/surveys/record.ts';
import { criteriaFor, rubricOf } from '#shared/surveys/rubric/index.ts';
import type { Criterion, DefectSpec } from '#shared/surveys/rubric/types.ts';

export const hydraulicChoices = {
  held: 'Made: it held',
  fell: 'Made: pressure fell',
  leak: 'Made: a seam wept',
  none: 'Not made',
} as const;
export type HydraulicChoice = keyof typeof hydraulicChoices;

export const steamChoices = {
  made: 'Made: all in order',
  late: 'Made: valve lifts late',
  none: 'Not made',
} as const;
export type SteamChoice = keyof typeof steamChoices;

export const carbonMonoxideChoices = { low: 'Low: 6 ppm', high: 'High: 140 ppm' } as const;
export type CarbonMonoxideChoice = keyof typeof carbonMonoxideChoices;

/** What the reader has changed in the example. */
export interface Trial {
  /** Grades other than those the example starts with, by criterion. */
  grades: Readonly<Partial<Record<string, Grade>>>;
  hydraulic: HydraulicChoice;
  steam: SteamChoice;
  carbonMonoxide: CarbonMonoxideChoice;
}

/** The example as it starts. */
export const untouched: Trial = { grades: {}, hydraulic: 'held', steam: 'made', carbonMonoxide: 'low' };

export const isUntouched = ({ grades, hydraulic, steam, carbonMonoxide }: Trial): boolean =>
  Object.keys(grades).length === 0 && hydraulic === 'held' && steam === 'made' && carbonMonoxide === 'low';

/** The defect that stands for a grade in the example: the catalogue's first of that grade, if it has one. */
export const defectFor = ({ defects }: Criterion, grade: Grade): DefectSpec | undefined =>
  grade === 'attention' || grade === 'unfit' ? defects.find((each) => each.grade === grade) : undefined;

function regraded(finding: Finding, grade: Grade, criterion: Criterion | undefined): Finding {
  if (grade === finding.grade) return finding;
  const isExamined = grade !== 'notExamined' && grade !== 'notFitted';
  const defect = criterion && defectFor(criterion, grade);
  return {
    ...finding,
    grade,
    ways: isExamined ? finding.ways : [],
    measurements: isExamined ? finding.measurements : [],
    defects: defect ? [{ code: defect.code, where: '', note: '', remedy: null, allowance: null }] : [],
  };
}

/** A hydraulic test as chosen, from the one that held. */
function hydraulicAs(choice: HydraulicChoice, held: HydraulicTest | null): HydraulicTest | null {
  if (held === null || choice === 'none') return null;
  if (choice === 'leak')
    return {
      ...held,
      leaks: [{ place: 'seam', leakClass: 2, where: 'longitudinal seam', cured: false }],
    };
  if (choice === 'fell') {
    const readings = held.readings.map((reading, index) =>
      index === held.readings.length - 1
        ? { ...reading, pressurePa: Math.round(reading.pressurePa * 0.85) }
        : reading,
    );
    return { ...held, readings };
  }
  return held;
}

/** Where a valve lifts that lifts late: well above working pressure and a tenth. */
const lateFactor = 1.16;
const highPpm = 140;

/** A steam test as chosen, from the one in which everything did as it should. */
function steamAs(
  { steam, carbonMonoxide }: Pick<Trial, 'steam' | 'carbonMonoxide'>,
  made: SteamTest | null,
  workingPressurePa: number,
): SteamTest | null {
  if (made === null || steam === 'none') return null;
  const latePa = Math.round(workingPressurePa * lateFactor);
  return {
    ...made,
    ...(steam === 'late' ? { valveLiftsAtPa: latePa, highestPressurePa: latePa } : {}),
    ...(carbonMonoxide === 'high' ? { coPpmAtOperator: highPpm } : {}),
  };
}

/** The example with the reader's changes, as a survey to be scored under a version of the method. */
export function surveyOf(trial: Trial, version: string): SurveyInput {
  const start = exampleSurvey(version);
  const criteria = new Map(criteriaFor(start.facts, rubricOf(version)).map((each) => [each.id, each]));
  return {
    ...start,
    record: {
      ...start.record,
      findings: start.record.findings.map((finding) =>
        regraded(
          finding,
          trial.grades[finding.criterionId] ?? finding.grade,
          criteria.get(finding.criterionId),
        ),
      ),
      hydraulic: hydraulicAs(trial.hydraulic, start.record.hydraulic),
      steam: steamAs(trial, start.record.steam, start.facts.workingPressurePa),
    },
  };
}

/** One item graded by the reader; taking it back to the grade it started with leaves no trace. */
export function withGrade(trial: Trial, criterionId: string, grade: Grade, startedAs: Grade): Trial {
  const { [criterionId]: _was, ...others } = trial.grades;
  return { ...trial, grades: grade === startedAs ? others : { ...others, [criterionId]: grade } };
}
