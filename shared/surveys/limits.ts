import { testMultiplesPercent } from '../engineering/hydraulic-test.ts';
import { accumulationPercent } from '../engineering/safety-valve.ts';

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
  firstTestPercent: testMultiplesPercent.first,
  repeatTestPercent: testMultiplesPercent.repeat,
  testOverPercent: 6,
  /** Common practice; small heating-boiler makers print the same. */
  holdMinutes: 10,
  holdFallPercent: 1,
  /** The wettest class a gland may be and the test still stand. */
  glandLeakClass: 2,
  /** EN 837-2, steady pressure; from memory. */
  gaugeSteadyPercent: 75,
  /** EN 837-1 class assumed for a model's gauge. */
  gaugeClassPercent: 2.5,
  /** Carbon monoxide, 15-minute limit. */
  coShortTermPpm: 100,
  coSource: 'UK workplace exposure limits EH40, short-term limit; from memory',
  /** Lift and accumulation above working pressure. */
  accumulationPercent,
  /** Bar·litres from which a second means of feed is asked for; coal firing asks for one at any size. */
  secondFeedBarLitres: 3,
  secondFeedSource: 'common practice; the local code governs',
  labourMinorPerHour: 3_500,
  hydraulicRetestMinor: 4_500,
  steamRetestMinor: 6_500,
} as const;
