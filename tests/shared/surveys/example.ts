import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import type { Finding, HydraulicTest, SteamTest, SurveyRecord } from '#shared/surveys/record.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import { criteriaFor, rubricVersion, rubricVersions } from '#shared/surveys/rubric/index.ts';

const bar = 100_000;

/** An invented vertical multi-tube boiler, gas fired, 4 bar, all of it examined and well. */
export const goodFacts: BoilerFacts = {
  type: 'vertical-multi-tube',
  material: 'copper',
  construction: 'silver-brazed',
  builder: null,
  builtYear: 1998,
  builtYearSureness: 'known',
  dimensions: {
    barrelOutsideDiameterMm: 102,
    barrelLengthMm: 180,
    barrelThicknessMm: 2,
    endPlateThicknessMm: 3,
    flueDiameterMm: null,
    flueThicknessMm: null,
    tubeCount: 19,
    tubeDiameterMm: 10,
    tubeThicknessMm: 1,
    heatingSurfaceM2: 0.1,
    overallHeightMm: 320,
    weightKg: 4,
  },
  workingPressurePa: 4 * bar,
  pressureEvidence: 'stamped-plate',
  waterCapacityL: 0.7,
  fittings: [
    'safety-valve',
    'pressure-gauge',
    'siphon',
    'water-gauge',
    'blowdown-valve',
    'check-valve',
    'hand-pump',
    'engine-pump',
    'stop-valve',
    'feed-tank',
  ],
  firing: 'gas',
  papers: [],
};

export const goodHydraulic: HydraulicTest = {
  profileId: 'repeat',
  firstTest: false,
  wantedPa: 6 * bar,
  gaugeRemoved: true,
  valveGagged: true,
  filledAndVented: true,
  readings: [
    { minute: 0, pressurePa: 0 },
    { minute: 5, pressurePa: 6.1 * bar },
    { minute: 15, pressurePa: 6.08 * bar },
  ],
  holdStartMinute: 5,
  holdEndMinute: 15,
  leaks: [],
  permanentSetMm: 0,
  note: '',
};

export const goodSteam: SteamTest = {
  raisedSteam: true,
  minutesToWorkingPressure: 12,
  valveLiftsAtPa: 4 * bar,
  valveReseatsAtPa: 3.8 * bar,
  highestPressurePa: 4.2 * bar,
  gaugeBlownThrough: true,
  passagesClear: true,
  feedsDelivered: true,
  evaporationKgPerH: 2,
  flameSettled: true,
  gasTight: true,
  coPpmAtOperator: 6,
  readings: [],
  note: '',
};

const goodFinding = (criterionId: string, ways: readonly string[]): Finding => ({
  criterionId,
  grade: 'sound',
  ways: [...ways],
  defects: [],
  measurements: [],
  photoIds: [],
  note: '',
  reason: '',
});

export function goodRecord(facts: BoilerFacts = goodFacts): SurveyRecord {
  return {
    ...emptyRecord(rubricVersion),
    examinedOn: '2026-05-16',
    findings: criteriaFor(facts).map((criterion) =>
      goodFinding(
        criterion.id,
        criterion.ways.map((way) => way.id),
      ),
    ),
    instruments: [
      {
        kind: 'test-gauge',
        name: 'Test gauge',
        serial: 'T 41',
        calibratedOn: '2026-01-10',
        fullScalePa: 16 * bar,
      },
      { kind: 'co-meter', name: 'Gas meter', serial: 'C 7', calibratedOn: '2026-02-01', fullScalePa: null },
    ],
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
