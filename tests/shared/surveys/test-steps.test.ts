import { describe, expect, test } from 'vitest';
import { holdState, ownGaugeAdvice, raisingSteps, testGaugeFaults } from '#shared/surveys/test-steps.ts';
import { goodHydraulic } from './example.ts';

const bar = 100_000;
const reading = (minute: number, pressurePa: number) => ({ minute, pressurePa });

describe('raising a boiler to its test pressure', () => {
  test('by quarters, each read before the next; the last in full', () => {
    const at = (...bars: number[]) =>
      raisingSteps({
        wantedPa: 8 * bar,
        readings: bars.map((each, minute) => reading(minute, each * bar)),
      }).map(({ isReached }) => isReached);
    expect(at()).toEqual([false, false, false, false]);
    expect(at(1.98)).toEqual([true, false, false, false]);
    expect(at(2, 4, 6)).toEqual([true, true, true, false]);
    expect(at(2, 4, 6, 7.95)).toEqual([true, true, true, false]);
    expect(at(2, 4, 6, 8)).toEqual([true, true, true, true]);
  });

  test('the boiler’s own gauge comes off where the test goes beyond it', () => {
    expect(ownGaugeAdvice(8 * bar, 6 * bar)).toContain('Take the boiler’s own gauge off');
    expect(ownGaugeAdvice(8 * bar, 10 * bar)).toContain('may stay on');
    expect(ownGaugeAdvice(8 * bar, null)).toBeNull();
  });

  test('a test gauge must be there, of a suitable range, and in calibration; one good one is enough', () => {
    const gauge = {
      kind: 'test-gauge',
      name: 'TG',
      serial: '',
      calibratedOn: '2026-01-10',
      fullScalePa: 16 * bar,
    } as const;
    const faults = (
      ...gauges: (typeof gauge | (Omit<typeof gauge, 'fullScalePa'> & { fullScalePa: number }))[]
    ) => testGaugeFaults(8 * bar, gauges, '2026-12-01');
    expect(faults()).toEqual(['No test gauge is among the instruments: write it down first.']);
    expect(faults(gauge)).toEqual([]);
    expect(faults({ ...gauge, fullScalePa: 40 * bar })[0]).toContain('between 12.0 bar');
    expect(testGaugeFaults(8 * bar, [gauge], '2027-02-01')[0]).toContain('more than 12 months ago');
    expect(faults({ ...gauge, fullScalePa: 40 * bar }, gauge)).toEqual([]);
  });

  test('the hold counts down by the profile, asks for readings, and is over when it has been long enough', () => {
    const held = {
      ...goodHydraulic,
      holdStartMinute: 5,
      holdEndMinute: null,
      readings: [reading(5, 6 * bar)],
    };
    expect(holdState(held, 6)).toEqual({ leftMinutes: 9, isLongEnough: false, wantsReading: false });
    expect(holdState(held, 9)).toMatchObject({ wantsReading: true });
    expect(holdState(held, 15)).toMatchObject({ leftMinutes: 0, isLongEnough: true });
    expect(holdState({ ...held, profileId: 'hobby-long' }, 15)).toMatchObject({ leftMinutes: 20 });
    expect(holdState({ ...held, holdStartMinute: null }, 6)).toBeNull();
    expect(holdState({ ...held, holdEndMinute: 15 }, 16)).toBeNull();
  });
});
