import { describe, expect, it } from 'vitest';
import { scoreSurvey } from '#shared/surveys/score.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import {
  allowableStressPa,
  barrelPressurePa,
  fluePressurePa,
  stayedPlatePressurePa,
} from '#shared/engineering/strength.ts';
import { goodFacts, goodSteam, goodSurvey, withFinding } from './example.ts';

const bar = 100_000;
const psi = 6_894.757_293;
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
  it('takes copper’s stress from the published table, falling as it gets hotter', () => {
    // Copper Development Association tube handbook: 4700 psi at 300 °F, which is steam at 3.61 bar gauge.
    expect(Math.abs((allowableStressPa('copper', 361_000) ?? 0) / (4_700 * psi) - 1)).toBeLessThan(0.001);
    const stresses = [1, 3, 6, 9, 12, 16].map((bars) => allowableStressPa('copper', bars * bar) ?? 0);
    expect(stresses).toEqual(stresses.toSorted((a, b) => b - a));
    expect(allowableStressPa('copper', 17 * bar)).toBeNull();
    expect(allowableStressPa('brass', bar)).toBeNull();
  });

  it('works a barrel, a flue and a stayed plate as the formulas say', () => {
    // By hand, 30 MPa: 0.8·30e6·2/(49 + 1.2) = 956,175; 2·30e6·1.5/40 = 2.25e6; 3²·30e6·2.1/30² = 630,000.
    expect(barrelPressurePa({ outsideMm: 102, thicknessMm: 2, stressPa: 30e6 })).toBeCloseTo(956_175.3, 0);
    const flue = { insideMm: 37, thicknessMm: 1.5, stressPa: 30e6, material: 'copper' as const };
    expect(fluePressurePa(flue)).toBeCloseTo(2_250_000, 3);
    expect(stayedPlatePressurePa({ pitchMm: 30, thicknessMm: 3, stressPa: 30e6 })).toBeCloseTo(630_000, 3);
  });

  it('fails on a measured wall only; on the seller’s figure it cannot say', () => {
    const thin = (value: number) =>
      withFinding('shell.barrel', { measurements: [{ quantity: 'thinnestMm', value }] });
    expect(statusOf('parts-pressure', thin(2))).toBe('pass');
    expect(statusOf('parts-pressure', thin(0.5))).toBe('fail');
    const said = goodSurvey({}, { dimensions: { ...goodFacts.dimensions, barrelThicknessMm: 0.5 } });
    expect(statusOf('parts-pressure', said)).toBe('cannot-say');
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
