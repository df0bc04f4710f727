import { describe, expect, it } from 'vitest';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import type { Finding, HydraulicTest, SurveyRecord } from '#shared/surveys/record.ts';
import { verdictRules } from '#shared/surveys/verdict-rules.ts';
import type { RuleId } from '#shared/surveys/verdict-rules.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { goodHydraulic, goodSteam, goodSurvey, withFinding } from './example.ts';

const bar = 100_000;
const defect = (code: string) => ({ code, where: '', note: '', remedy: null, allowance: null });
const steam = (change: Partial<typeof goodSteam>) => goodSurvey({ steam: { ...goodSteam, ...change } });
const hydraulic = (change: Partial<typeof goodHydraulic>) =>
  goodSurvey({ hydraulic: { ...goodHydraulic, ...change } });
const measured = (criterionId: string, quantity: string, value: number | string) =>
  withFinding(criterionId, { measurements: [{ quantity, value }] });
const leak = (place: 'seam' | 'gland', leakClass: number) => ({ place, leakClass, where: '', cured: false });
const rulesOf = (survey: SurveyInput) => {
  const { reasons, furtherReasons } = scoreSurvey(survey);
  return [...new Set([...reasons, ...furtherReasons].map(({ rule }) => rule))];
};

describe('a boiler with nothing wrong', () => {
  const result = scoreSurvey(goodSurvey());

  it('is in steaming order, with both figures full', () => {
    expect(result.verdict).toEqual({ id: 'in-steaming-order', label: 'In steaming order' });
    expect(result).toMatchObject({
      condition: 100,
      evidence: 100,
      safetyEvidence: 100,
      reasons: [],
      toProve: [],
    });
    expect(result.allowance.total).toEqual({ lowMinor: 0, highMinor: 0 });
  });
});

/** One survey for each rule, with that rule's cause and no other. */
const alone: Record<RuleId, SurveyInput> = {
  'safety-critical-unfit': withFinding('shell.barrel', { grade: 'unfit' }),
  'no-safety-valve': withFinding('safety.valve', { grade: 'notFitted' }),
  'hydraulic-test-failed': hydraulic({ leaks: [leak('seam', 2)] }),
  'crack-bulge-collapse': withFinding('shell.plates', { defects: [defect('plates-crack')] }),
  'soft-solder': measured('shell.joints', 'jointMaterial', 'soft-solder'),
  'valve-did-not-lift': steam({ valveLiftsAtPa: 4.5 * bar, highestPressurePa: null, valveReseatsAtPa: null }),
  'pressure-climbed': steam({ highestPressurePa: 4.6 * bar }),
  'passage-blocked': steam({ passagesClear: false }),
  'wall-too-thin': measured('shell.barrel', 'thinnestMm', 0.1),
  'gas-leak': steam({ gasTight: false }),
  'carbon-monoxide': steam({ coPpmAtOperator: 100 }),
  'safety-critical-attention': withFinding('shell.barrel', { grade: 'attention' }),
  'fitting-missing': withFinding('safety.gauge', { grade: 'notFitted' }),
  'check-failed': measured('safety.glass', 'lowestLevelAboveCrownMm', -3),
  'no-hydraulic-test': hydraulic({ holdEndMinute: 9 }),
  'no-steam-test': goodSurvey({ steam: null }),
  'thin-evidence': goodSurvey({
    findings: goodSurvey().record.findings.map((finding): Finding => ({
      ...finding,
      ways: finding.ways.slice(0, 1),
    })),
  }),
  'instrument-out-of-date': goodSurvey({
    instruments: goodSurvey().record.instruments.map((instrument) =>
      instrument.kind === 'co-meter' ? { ...instrument, calibratedOn: '2025-05-15' } : instrument,
    ),
  }),
};

describe('each rule of the verdict', () => {
  // Without the steam test the ways that rest on it count for nothing, so the evidence falls with it.
  const companions: Partial<Record<RuleId, readonly RuleId[]>> = { 'no-steam-test': ['thin-evidence'] };

  it.each(verdictRules.map((rule) => [rule.id, rule] as const))('%s fires alone', (id, rule) => {
    const result = scoreSurvey(alone[id]);
    expect(rulesOf(alone[id]).filter((other) => !(companions[id] ?? []).includes(other as RuleId))).toEqual([
      id,
    ]);
    expect(result.verdict.id).toBe(rule.verdict);
    expect(result.reasons[0]?.text).toMatch(/^[A-Z0-9].*\.$/s);
  });

  it('keeps the lesser reasons beside the verdict', () => {
    const result = scoreSurvey({
      ...withFinding('shell.barrel', { grade: 'unfit', defects: [defect('barrel-crack')] }),
      scope: 'external',
    });
    expect(result.reasons.map(({ rule }) => rule)).toEqual(['safety-critical-unfit', 'crack-bulge-collapse']);
    const bare = scoreSurvey({ ...goodSurvey({ hydraulic: null, steam: null }), scope: 'external' });
    expect(bare.verdict.id).toBe('not-proven');
    expect(bare.reasons[0]?.text).toContain('does not include one');
    expect(bare.toProve.map(({ rule }) => rule)).toContain('no-hydraulic-test');
  });
});

describe('the hydraulic test', () => {
  const statusOf = (change: Partial<typeof goodHydraulic>, record: Partial<SurveyRecord> = {}) => {
    const survey = goodSurvey({ hydraulic: { ...goodHydraulic, ...change }, ...record });
    return scoreSurvey(survey).checks.find(({ id }) => id === 'hydraulic-test')?.status;
  };
  const held = (startPa: number, endPa: number, minutes = 10) => ({
    readings: [
      { minute: 5, pressurePa: startPa },
      { minute: 5 + minutes, pressurePa: endPa },
    ],
    holdEndMinute: 5 + minutes,
  });

  it.each([
    // Multiples as quoted from the UK hobby code of 2012, 14.3; fall and hold common practice.
    ['reached and held', held(6 * bar, 5.95 * bar), 'pass'],
    ['fallen by two per cent with nothing wet', held(6 * bar, 5.88 * bar), 'fail'],
    [
      'fallen by two per cent through a gland',
      { ...held(6 * bar, 5.88 * bar), leaks: [leak('gland', 2)] },
      'pass',
    ],
    ['a gland running', { leaks: [leak('gland', 4)] }, 'cannot-say'],
    ['a damp seam', { leaks: [leak('seam', 1)] }, 'fail'],
    ['a permanent set', { permanentSetMm: 0.1 }, 'fail'],
    ['not reached', held(5.9 * bar, 5.9 * bar), 'cannot-say'],
    ['taken too far', held(6.5 * bar, 6.5 * bar), 'cannot-say'],
    ['held five minutes', held(6 * bar, 6 * bar, 5), 'cannot-say'],
    ['half as much again for a first test', { firstTest: true }, 'cannot-say'],
    ['air left in', { filledAndVented: false }, 'cannot-say'],
  ] as [string, Partial<HydraulicTest>, string][])('%s: %s', (_, change, status) => {
    expect(statusOf(change)).toBe(status);
  });

  // Full scale 1.5 to 4 times the test pressure: ASME practice for test gauges.
  it.each([
    [9 * bar, 'pass'],
    [24 * bar, 'pass'],
    [8.9 * bar, 'cannot-say'],
    [24.1 * bar, 'cannot-say'],
  ])('a test gauge of %d Pa full scale: %s', (fullScalePa, status) => {
    const instruments = goodSurvey().record.instruments.map((each) => ({ ...each, fullScalePa }));
    expect(statusOf({}, { instruments })).toBe(status);
  });
});

describe('evidence', () => {
  const strength = (criterionId: string, ways: string[], reason = '') => {
    const survey = withFinding(criterionId, { ways, reason });
    const only = survey.record.findings.filter((finding) => finding.criterionId === criterionId);
    return scoreSurvey({ ...survey, record: { ...survey.record, findings: only } });
  };
  // The shell section is 34; a vertical multi-tube has no stays, which are 3.
  const weight = 31;

  it('counts each way by its place, and two ways together by what they leave unknown', () => {
    const shell = (ways: string[], reason = '') =>
      strength('shell.barrel', ways, reason).sections.find(({ id }) => id === 'shell')?.evidence;
    expect(shell(['sight'], 'too thick to matter')).toBe(Math.floor((5 * 0.5 * 100) / weight));
    expect(shell(['sight', 'measure'])).toBe(Math.floor((5 * 0.875 * 100) / weight));
    expect(shell(['hydraulic'])).toBe(Math.floor((5 * 100) / weight));
    expect(shell(['sight'])).toBe(Math.floor((5 * 0.25 * 100) / weight));
  });

  it('halves what rests on a gauge out of calibration', () => {
    const good = goodSurvey();
    const instruments = good.record.instruments.map((each) => ({ ...each, calibratedOn: '2025-05-15' }));
    const result = scoreSurvey(goodSurvey({ instruments }));
    expect(result.evidence).toBeLessThan(100);
    expect(result.verdict.id).toBe('not-proven');
  });
});

describe('condition', () => {
  it('is a dash where less than a third was examined', () => {
    const { findings } = goodSurvey().record;
    const identityOnly = findings.filter(({ criterionId }) => criterionId.startsWith('identity.'));
    expect(scoreSurvey(goodSurvey({ findings: identityOnly })).condition).toBeNull();
  });

  it('is the weighted mean of the points', () => {
    // Papers weigh 3, Needs attention is 40 points, and without stays 97 applies.
    const result = scoreSurvey(withFinding('identity.papers', { grade: 'attention' }));
    expect(result.sections[0]?.mean).toBe(Math.round((5 * 100 + 3 * 40) / 8));
    expect(result.condition).toBe(Math.round((94 * 100 + 3 * 40) / 97));
  });
});

describe('the allowance', () => {
  it('adds hours at the published rate to parts, and the tests that follow a repair to the shell', () => {
    const survey = withFinding('shell.bushes', { grade: 'attention', defects: [defect('bushes-worn')] });
    const { allowance } = scoreSurvey(survey);
    // 1 to 3 hours at 35.00, 5.00 to 20.00 parts; tests 45.00 and 65.00.
    expect(allowance.groups[0]).toMatchObject({ id: 'must', lowMinor: 4_000, highMinor: 12_500 });
    expect(allowance.total).toEqual({ lowMinor: 15_000, highMinor: 23_500 });
  });

  it('lets the surveyor’s own figure win', () => {
    const own = { hoursLow: 0.5, hoursHigh: 1, partsLowMinor: 0, partsHighMinor: 700 };
    const survey = withFinding('casing.finish', {
      grade: 'serviceable',
      defects: [{ ...defect('finish-chipped'), allowance: own }],
    });
    const looks = scoreSurvey(survey).allowance.groups.find(({ id }) => id === 'looks');
    expect(looks).toMatchObject({ lowMinor: 1_750, highMinor: 4_200 });
  });
});

describe('canonical JSON', () => {
  it('sorts keys by code unit and prints numbers as JavaScript does', () => {
    // RFC 8785, 3.2.2 and 3.2.3 (from memory).
    expect(canonicalJson({ b: [1e21, 0.1, -0], a: '€\n', A: null, c: undefined })).toBe(
      '{"A":null,"a":"€\\n","b":[1e+21,0.1,0]}',
    );
  });
  it('refuses what JSON cannot hold', () => {
    expect(() => canonicalJson(Number.NaN)).toThrow(RangeError);
  });
});
