import { gaugeWindowPa, mustGaugeComeOff } from '../engineering/hydraulic-test.ts';
import { testProfileOf } from '../engineering/test-profiles.ts';
import { monthsLater } from '../time.ts';
import type { Day } from '../time.ts';
import { limits } from './limits.ts';
import type { HydraulicTest, Instrument } from './record.ts';
import { pressureText } from './words.ts';

/** Shares of the test pressure at which to stop, look all over, and read. */
const quarters = [0.25, 0.5, 0.75, 1] as const;

/** Within so much of a step a reading counts as taken there. */
const near = 0.97;

/** One step of raising the pressure. */
export interface RaisingStep {
  pressurePa: number;
  isReached: boolean;
}

/** The steps of raising a boiler to its test pressure, by quarters, and which have been read. */
export function raisingSteps({
  wantedPa,
  readings,
}: Pick<HydraulicTest, 'wantedPa' | 'readings'>): RaisingStep[] {
  const highest = Math.max(0, ...readings.map(({ pressurePa }) => pressurePa));
  return quarters.map((share) => {
    const pressurePa = Math.round(wantedPa * share);
    // The last must be reached in full: a test a little under is no test.
    return { pressurePa, isReached: highest >= (share === 1 ? wantedPa : pressurePa * near) };
  });
}

/** What to do with the boiler's own gauge; null where its full scale is not known. */
export function ownGaugeAdvice(wantedPa: number, fullScalePa: number | null): string | null {
  if (fullScalePa === null) return null;
  return mustGaugeComeOff(wantedPa, fullScalePa)
    ? `Take the boiler’s own gauge off: ${pressureText(wantedPa)} is beyond its ${pressureText(fullScalePa)}.`
    : `The boiler’s own gauge reaches ${pressureText(fullScalePa)}: it may stay on.`;
}

/** What is wrong with the test gauges recorded, for this test and day; empty where one of them will do. */
export function testGaugeFaults(
  wantedPa: number,
  instruments: readonly Instrument[],
  onDay: Day | null,
): string[] {
  const gauges = instruments.filter(({ kind }) => kind === 'test-gauge');
  if (gauges.length === 0) return ['No test gauge is among the instruments: write it down first.'];
  const { least, most } = gaugeWindowPa(wantedPa);
  const faultsOf = ({ name, fullScalePa, calibratedOn }: Instrument): string[] => [
    ...(fullScalePa !== null && (fullScalePa < least || fullScalePa > most)
      ? [`${name}: full scale should be between ${pressureText(least)} and ${pressureText(most)}.`]
      : []),
    ...(calibratedOn === null
      ? [`${name}: give the date of its calibration.`]
      : onDay !== null && monthsLater(calibratedOn, limits.calibrationMonths) < onDay
        ? [
            `${name}: calibrated more than ${String(limits.calibrationMonths)} months ago, so its test counts for half.`,
          ]
        : []),
  ];
  const all = gauges.map(faultsOf);
  return all.some((faults) => faults.length === 0) ? [] : all.flat();
}

/** How a hold stands at a minute of the test's clock. */
export interface HoldState {
  /** Minutes still to go; 0 once it has been long enough. */
  leftMinutes: number;
  isLongEnough: boolean;
  /** Whether a reading is wanted now: none in the last third of the hold's length. */
  wantsReading: boolean;
}

/** Null while the hold has not begun, or has been ended. */
export function holdState(
  test: Pick<HydraulicTest, 'profileId' | 'holdStartMinute' | 'holdEndMinute' | 'readings'>,
  nowMinute: number,
): HoldState | null {
  const { holdStartMinute: start, holdEndMinute: end, readings } = test;
  if (start === null || end !== null) return null;
  const { holdMinutes } = testProfileOf(test.profileId);
  const held = nowMinute - start;
  const last = Math.max(start, ...readings.map(({ minute }) => minute));
  return {
    leftMinutes: Math.max(0, holdMinutes - held),
    isLongEnough: held >= holdMinutes,
    wantsReading: nowMinute - last >= holdMinutes / 3,
  };
}
