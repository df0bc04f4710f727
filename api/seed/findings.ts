import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import type { Finding, FoundDefect, Grade, Measurement, SurveyRecord } from '#shared/surveys/record.ts';
import { criteriaFor, rubricVersion } from '#shared/surveys/rubric/index.ts';
import type { Criterion } from '#shared/surveys/rubric/types.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import type { ScopeId } from '#shared/surveys/scopes.ts';
import type { Day } from '#shared/time.ts';

export interface SeedFinding {
  grade: Grade;
  defects?: { code: string; where?: string; note?: string }[];
  measurements?: Measurement[];
  note?: string;
  reason?: string;
}

export interface SeedSurvey {
  scope: ScopeId;
  /** What stands out; everything else that applies is sound. */
  findings: Record<string, SeedFinding>;
  /** Picture files by criterion. */
  pictures: Record<string, { file: string; alt: string }[]>;
  hydraulic?: { firstTest: boolean; heldPa: number; fellPa: number };
  steam?: Partial<NonNullable<SurveyRecord['steam']>>;
  summary: string;
}

const defectOf = ({
  code,
  where = '',
  note = '',
}: {
  code: string;
  where?: string;
  note?: string;
}): FoundDefect => ({
  code,
  where,
  note,
  remedy: null,
  allowance: null,
});

/** Ways that this scope allows: nothing is claimed to have been seen under a pressure that was never put on. */
function waysWithin(criterion: Criterion, scope: ScopeId): string[] {
  const { hydraulic, steam } = scopes[scope];
  const needsFire = new Set(['steam', 'lit', 'co-meter', 'blow-through', 'delivery', 'leak-spray']);
  return criterion.ways
    .map(({ id }) => id)
    .filter((id) => id !== 'borescope' && id !== 'sounding')
    .filter((id) =>
      id === 'hydraulic' || id === 'comparison' ? hydraulic : needsFire.has(id) ? steam : true,
    );
}

function findingOf(criterion: Criterion, survey: SeedSurvey, photoIds: readonly string[]): Finding {
  const special = survey.findings[criterion.id];
  const ways = waysWithin(criterion, survey.scope);
  const isBlind = ways.length === 0 && special === undefined;
  const grade: Grade = special?.grade ?? (isBlind ? 'notExamined' : 'sound');
  const isLookedAt = grade !== 'notExamined' && grade !== 'notFitted';
  const restsOnFirst = criterion.safetyCritical && criterion.ways.length > 1 && ways.length < 2;
  return {
    criterionId: criterion.id,
    grade,
    ways: isLookedAt ? (ways.length > 0 ? ways : [criterion.ways[0]?.id ?? 'sight']) : [],
    defects: (special?.defects ?? []).map(defectOf),
    measurements: special?.measurements ?? [],
    photoIds: [...photoIds],
    note: special?.note ?? '',
    reason:
      special?.reason ??
      (isBlind
        ? 'Needs the boiler lit, which this scope does not include.'
        : restsOnFirst && isLookedAt
          ? 'Cold examination only, as commissioned.'
          : ''),
  };
}

const stepsTo = (heldPa: number): { minute: number; pressurePa: number }[] =>
  [0, 0.25, 0.5, 0.75, 1].map((share, step) => ({
    minute: step * 2,
    pressurePa: Math.round(heldPa * share),
  }));

/** A whole survey record as this surveyor would have filled it in. */
export function recordOf(
  facts: BoilerFacts,
  survey: SeedSurvey,
  examinedOn: Day,
  calibratedOn: Day,
  photoIds: ReadonlyMap<string, readonly string[]>,
): SurveyRecord {
  const { hydraulic, steam } = survey;
  return {
    rubricVersion,
    examinedOn,
    findings: criteriaFor(facts).map((criterion) =>
      findingOf(criterion, survey, photoIds.get(criterion.id) ?? []),
    ),
    instruments: [
      {
        kind: 'test-gauge',
        name: 'Test gauge, 100 mm',
        serial: 'TG-2',
        calibratedOn,
        fullScalePa: 2_000_000,
      },
      { kind: 'co-meter', name: 'Carbon monoxide meter', serial: 'CM-7', calibratedOn, fullScalePa: null },
      { kind: 'caliper', name: 'Vernier caliper, 200 mm', serial: '', calibratedOn: null, fullScalePa: null },
    ],
    noHydraulicReason: '',
    noSteamReason: '',
    hydraulic: hydraulic
      ? {
          profileId: 'hobby',
          firstTest: hydraulic.firstTest,
          wantedPa: Math.round(facts.workingPressurePa * (hydraulic.firstTest ? 2 : 1.5)),
          gaugeRemoved: true,
          valveGagged: true,
          filledAndVented: true,
          readings: [
            ...stepsTo(hydraulic.heldPa),
            { minute: 13, pressurePa: hydraulic.heldPa - Math.round(hydraulic.fellPa / 2) },
            { minute: 18, pressurePa: hydraulic.heldPa - hydraulic.fellPa },
          ],
          holdStartMinute: 8,
          holdEndMinute: 18,
          leaks: [],
          permanentSetMm: 0,
          note: 'Town water at 12 °C, vented at the dome.',
        }
      : null,
    steam: steam
      ? {
          raisedSteam: true,
          minutesToWorkingPressure: 9,
          valveLiftsAtPa: Math.round(facts.workingPressurePa * 1.01),
          valveReseatsAtPa: Math.round(facts.workingPressurePa * 0.94),
          highestPressurePa: Math.round(facts.workingPressurePa * 1.05),
          gaugeBlownThrough: true,
          passagesClear: true,
          feedsDelivered: true,
          evaporationKgPerH: null,
          flameSettled: true,
          gasTight: true,
          coPpmAtOperator: 6,
          readings: [0, 3, 6, 9, 14].map((minute) => ({
            minute,
            pressurePa: Math.round(facts.workingPressurePa * Math.min(1.05, (minute / 9) ** 1.4)),
          })),
          note: 'Outdoors, light wind.',
          ...steam,
        }
      : null,
    summary: survey.summary,
  };
}
