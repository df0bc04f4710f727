import { describe, expect, it } from 'vitest';
import { scoreSurvey } from '#shared/surveys/score.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import { goodFacts, goodSteam, goodSurvey, withFinding } from './example.ts';

const bar = 100_000;
const checkOf = (id: string, survey: SurveyInput) =>
  scoreSurvey(survey).checks.find((each) => each.id === id);
const statusOf = (id: string, survey: SurveyInput) => checkOf(id, survey)?.status;
const valve = (boreMm: number, lift: string) =>
  withFinding('safety.capacity', {
    measurements: [
      { quantity: 'valveBoreMm', value: boreMm },
      { quantity: 'valveLift', value: lift },
    ],
  });
const unproved = (survey: SurveyInput): SurveyInput => ({
  ...survey,
  record: { ...survey.record, steam: { ...goodSteam, highestPressurePa: null } },
});

describe('strength of the parts', () => {
  it('fails on a measured wall only; on the seller’s figure it cannot say', () => {
    const thin = (value: number) =>
      withFinding('shell.barrel', { measurements: [{ quantity: 'thinnestMm', value }] });
    expect(statusOf('parts-pressure', thin(2))).toBe('pass');
    expect(statusOf('parts-pressure', thin(0.5))).toBe('fail');
    const said = goodSurvey({}, { dimensions: { ...goodFacts.dimensions, barrelThicknessMm: 0.5 } });
    expect(statusOf('parts-pressure', said)).toBe('cannot-say');
  });

  it('does not let a stout barrel hide a part that falls short on the seller’s figures', () => {
    const measured = [{ quantity: 'thinnestMm', value: 3 }];
    const dimensions = { ...goodFacts.dimensions, endPlateThicknessMm: 0.5 };
    const survey = withFinding('shell.barrel', { measurements: measured }, { dimensions });
    const wide = {
      ...survey,
      record: {
        ...survey.record,
        findings: survey.record.findings.map((finding) =>
          finding.criterionId === 'shell.plates'
            ? { ...finding, measurements: [{ quantity: 'supportPitchMm', value: 20 }] }
            : finding,
        ),
      },
    };
    const found = checkOf('parts-pressure', wide);
    expect(found?.status).toBe('cannot-say');
    expect(found?.text).toContain('End plates at 0.5 mm');
    expect(found?.text).toContain('Measure it');
  });

  it('says what each part stands, and what was not worked out', () => {
    const found = checkOf(
      'parts-pressure',
      withFinding('shell.barrel', { measurements: [{ quantity: 'thinnestMm', value: 2 }] }),
    );
    expect(found?.figures.map(({ label }) => label)).toEqual([
      'Barrel, thickness',
      'Barrel, by calculation',
      'Tubes, by calculation',
      'Claimed working pressure',
    ]);
    expect(found?.text).toContain('Not worked out: end plates.');
  });
});

describe('what version 1.0.0 worked out', () => {
  it('barrel, flue and stayed plate alone, a seam at 0.8 whatever it is, and no word of water in hand', () => {
    const good = withFinding('shell.barrel', { measurements: [{ quantity: 'thinnestMm', value: 2 }] });
    const first = { ...good, record: { ...good.record, rubricVersion: '1.0.0' } };
    const found = checkOf('parts-pressure', first);
    // By hand at 4 bar: copper at 305.5 °F, 4,623 psi; 0.8·31.88e6·2/(49 + 1.2) = 1.016e6 Pa.
    const stands = found?.figures.find(({ label }) => label === 'Barrel stands')?.value ?? 0;
    expect(Math.abs(stands / 1.016e6 - 1)).toBeLessThan(0.001);
    expect(checkOf('water-reserve', first)).toBeUndefined();
    expect(checkOf('water-reserve', good)).toBeDefined();
  });
});

describe('running', () => {
  it('minutes of water in hand by the steam made', () => {
    // 0.1 L of water at 4 bar is 91.5 g; at 2 kg/h, 2.7 minutes.
    const found = checkOf(
      'water-reserve',
      withFinding('safety.glass', { measurements: [{ quantity: 'waterInGlassL', value: 0.1 }] }),
    );
    expect(found?.status).toBe('pass');
    expect(found?.figures[0]).toMatchObject({ value: 2.7, unit: 'min' });
  });

  it('heat and air of a gas flame by its jet', () => {
    const found = checkOf(
      'gas-heat',
      withFinding('firing.fuel', {
        measurements: [
          { quantity: 'jetMm', value: 0.2 },
          { quantity: 'fuelPressurePa', value: 150_000 },
          { quantity: 'gasKind', value: 'butane' },
        ],
      }),
    );
    // The check table's GS-06: 74.8 g/h of butane, 0.95 kW.
    expect(found?.figures[0]).toMatchObject({ value: 0.95, unit: 'kW' });
    expect(found?.text).toContain('75 g of butane an hour');
  });

  it('holds a test to the profile picked', () => {
    const good = goodSurvey();
    const test = { ...good.record.hydraulic!, profileId: 'hobby-long' };
    const long = goodSurvey({ hydraulic: test });
    expect(checkOf('hydraulic-test', long)?.text).toContain('It was held for 10 minutes; 30 are asked for.');
    const law = goodSurvey({ hydraulic: { ...test, profileId: 'pressure-law', wantedPa: 5.8 * bar } });
    expect(statusOf('hydraulic-test', law)).toBe('pass');
    const hobby = goodSurvey({ hydraulic: { ...test, profileId: 'hobby', wantedPa: 5.8 * bar } });
    expect(statusOf('hydraulic-test', hobby)).toBe('cannot-say');
  });
});

describe('the safety valve', () => {
  it('passes by Napier what a full-lift bore passes', () => {
    // 6 mm bore, 28.27 mm²; 4.4 bar gauge is 541.3 kPa absolute: 28.27·541.3/190.5 = 80.3 kg/h.
    expect(checkOf('valve-capacity', valve(6, 'full'))?.figures[0]).toMatchObject({
      value: 80.3,
      unit: 'kg/h',
    });
  });

  it('fails too small only where no test proved it', () => {
    expect(statusOf('valve-capacity', unproved(valve(1, 'ordinary')))).toBe('fail');
    expect(statusOf('valve-capacity', valve(1, 'ordinary'))).toBe('pass');
    expect(statusOf('valve-capacity', unproved(valve(6, 'full')))).toBe('pass');
  });

  it.each([
    [{ valveLiftsAtPa: 4.4 * bar }, 'valve-lift', 'pass'],
    [{ valveLiftsAtPa: 4.41 * bar }, 'valve-lift', 'fail'],
    [{ valveLiftsAtPa: null, highestPressurePa: 4.5 * bar }, 'valve-lift', 'fail'],
    [{ valveLiftsAtPa: null, highestPressurePa: 3 * bar }, 'valve-lift', 'cannot-say'],
    [{ highestPressurePa: 4.4 * bar }, 'accumulation', 'pass'],
    [{ highestPressurePa: 4.41 * bar }, 'accumulation', 'fail'],
    // Indian Boiler Regulations 295: reseats not more than a tenth below its lift.
    [{ valveReseatsAtPa: 3.6 * bar }, 'valve-reseat', 'pass'],
    [{ valveReseatsAtPa: 3.5 * bar }, 'valve-reseat', 'fail'],
    [{ coPpmAtOperator: 99 }, 'carbon-monoxide', 'pass'],
    [{ coPpmAtOperator: 100 }, 'carbon-monoxide', 'fail'],
  ])('%o: %s %s', (change, id, status) => {
    expect(statusOf(id, goodSurvey({ steam: { ...goodSteam, ...change } }))).toBe(status);
  });
});

describe('the pressure gauge', () => {
  const gauge = (fullScalePa: number, errorPa = 0) =>
    withFinding('safety.gauge', {
      measurements: [
        { quantity: 'fullScalePa', value: fullScalePa },
        { quantity: 'midPointErrorPa', value: errorPa },
      ],
    });
  it.each([
    // EN 837-2: steady use at three quarters of full scale at most (from memory).
    [(4 / 0.75) * bar, 'pass'],
    [5.3 * bar, 'fail'],
  ])('full scale %d Pa for 4 bar: %s', (scale, status) => {
    expect(statusOf('gauge-range', gauge(scale))).toBe(status);
  });
  it.each([
    // EN 837-1: error limit is class times span; 2.5 % of 7 bar is 0.175 bar.
    [0.175 * bar, 'pass'],
    [-0.18 * bar, 'fail'],
  ])('out by %d Pa on 7 bar: %s', (error, status) => {
    expect(statusOf('gauge-error', gauge(7 * bar, error))).toBe(status);
  });
});

describe('feed', () => {
  const delivers = (value: number) =>
    withFinding('feed.first', { measurements: [{ quantity: 'deliveryKgPerH', value }] });
  it('fails below the steam made', () => {
    expect(statusOf('feed-rate', delivers(1.9))).toBe('fail');
    expect(statusOf('feed-rate', delivers(2))).toBe('pass');
    expect(checkOf('feed-rate', delivers(2))?.text).toContain('less than the half as much again');
  });
  it('asks for a second means where the fire is coal or the boiler large', () => {
    const without = (facts: Partial<typeof goodFacts>) =>
      withFinding('feed.second', { grade: 'notFitted', ways: [] }, facts);
    expect(statusOf('second-feed', without({}))).toBe('pass');
    expect(statusOf('second-feed', without({ firing: 'coal' }))).toBe('fail');
    expect(statusOf('second-feed', without({ waterCapacityL: 0.75 }))).toBe('fail');
  });
});
