import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import {
  exampleFacts as goodFacts,
  exampleHydraulic as goodHydraulic,
  exampleInstruments,
  exampleSteam as goodSteam,
  soundFinding,
} from '#shared/surveys/example.ts';
import type { Finding, SurveyRecord } from '#shared/surveys/record.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import { criteriaFor, rubricVersion, rubricVersions } from '#shared/surveys/rubric/index.ts';

export { goodFacts, goodHydraulic, goodSteam };

/** The example boiler, all of it examined in every way and well. */
export function goodRecord(facts: BoilerFacts = goodFacts): SurveyRecord {
  return {
    ...emptyRecord(rubricVersion),
    examinedOn: '2026-05-16',
    findings: criteriaFor(facts).map((criterion) =>
      soundFinding(
        criterion.id,
        criterion.ways.map((way) => way.id),
      ),
    ),
    instruments: exampleInstruments,
    hydraulic: goodHydraulic,
    steam: goodSteam,
  };
}

/** A survey with nothing wrong, and a way to change one thing in it. */
export const goodSurvey = (
  change: Partial<SurveyRecord> = {},
  facts: Partial<BoilerFacts> = {},
): SurveyInput => {
  const all = { ...goodFacts, ...facts };
  return { facts: all, record: { ...goodRecord(all), ...change }, scope: 'full' };
};

/** The good survey with one finding changed. */
export function withFinding(
  criterionId: string,
  change: Partial<Finding>,
  facts: Partial<BoilerFacts> = {},
): SurveyInput {
  const good = goodSurvey({}, facts);
  return {
    ...good,
    record: {
      ...good.record,
      findings: good.record.findings.map((finding) =>
        finding.criterionId === criterionId ? { ...finding, ...change } : finding,
      ),
    },
  };
}

/** A survey as it would have been scored with a version of the method. */
const under = (version: string, survey: SurveyInput): SurveyInput => ({
  ...survey,
  record: { ...survey.record, rubricVersion: version },
});

const keptSurveys: readonly (readonly [name: string, survey: SurveyInput])[] = [
  ['nothing-wrong', goodSurvey()],
  [
    'worn-bush',
    withFinding('shell.bushes', {
      grade: 'attention',
      defects: [{ code: 'bushes-worn', where: 'filler', note: '', remedy: null, allowance: null }],
    }),
  ],
  ['carbon-monoxide', goodSurvey({ steam: { ...goodSteam, coPpmAtOperator: 120 } })],
  ['cold-by-eye', { ...goodSurvey({ hydraulic: null, steam: null }), scope: 'external' }],
];

/** Surveys whose results are kept to the byte, under every version; a name is that of its file under `published/`. */
export const publishedSurveys: [name: string, survey: SurveyInput][] = rubricVersions.flatMap(({ version }) =>
  keptSurveys.map(([name, survey]): [string, SurveyInput] => [`${version}/${name}`, under(version, survey)]),
);
