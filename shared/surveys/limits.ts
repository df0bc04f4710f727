import { mainPartBarLitres } from '../engineering/papers.ts';
import { gaugeSteadyPercent } from '../engineering/pressure-gauge.ts';
import { accumulationPercent } from '../engineering/safety-valve.ts';
import { testProfiles } from '../engineering/test-profiles.ts';
import { carbonMonoxideLimits } from '../engineering/gas.ts';

/** Figures of the method that are policy rather than physics, with where each comes from. Published with the method. */
export const limits = {
  gradePoints: { sound: 100, serviceable: 75, attention: 40, unfit: 0 },
  /** Below this share of the applicable weight no Condition is given: one part in three. */
  leastExaminedParts: 3,
  /** Evidence wanted over the safety-critical criteria, per cent. */
  evidenceWantedPercent: 80,
  /** A test whose instrument is out of calibration counts this much. */
  outOfDateFactor: 0.5,
  /** Sound or Serviceable on the weakest way alone, with no reason given, counts this much. */
  oneWayFactor: 0.5,
  calibrationMonths: 12,
  /** Hydraulic test: multiples of working pressure as quoted from the UK hobby code of 2012; the local code governs. */
  firstTestPercent: testProfiles.hobby.firstPercent,
  repeatTestPercent: testProfiles.hobby.repeatPercent,
  testOverPercent: 6,
  /** Common practice; small heating-boiler makers print the same. */
  holdMinutes: testProfiles.hobby.holdMinutes,
  holdFallPercent: testProfiles.hobby.fallPercent,
  /** The wettest class a gland may be and the test still stand. */
  glandLeakClass: 2,
  /** EN 837-2, steady pressure; from memory. */
  gaugeSteadyPercent,
  /** EN 837-1 class assumed for a model's gauge. */
  gaugeClassPercent: 2.5,
  /** Carbon monoxide, 15-minute limit. */
  coShortTermPpm: carbonMonoxideLimits.fifteenMinutesPpm,
  coSource: 'UK workplace exposure limits EH40, short-term limit; from memory',
  /** Lift and accumulation above working pressure. */
  accumulationPercent,
  /** Bar·litres from which a second means of feed is asked for; coal firing asks for one at any size. */
  secondFeedBarLitres: mainPartBarLitres,
  secondFeedSource: 'common practice; the local code governs',
  labourMinorPerHour: 3_500,
  hydraulicRetestMinor: 4_500,
  steamRetestMinor: 6_500,
} as const;
