import { valveCapacity } from './checks-capacity.ts';
import { gaugeError, gaugeRange } from './checks-gauge.ts';
import { hydraulicTestCheck } from './checks-hydraulic.ts';
import { partsPressureAtFirst } from './checks-parts-first.ts';
import { partsPressure } from './checks-parts.ts';
import { feedAgainstSteam, gasFlame, waterInHand } from './checks-running.ts';
import {
  accumulation,
  carbonMonoxide,
  gasTightness,
  gaugePassages,
  jointMaterial,
  valveLift,
  valveReseat,
} from './checks-steam.ts';
import { barLitresCheck, feedRate, secondFeed, waterLevel } from './checks-water.ts';
import type { Examined, SurveyInput } from './examined.ts';
import type { EngineeringCheck } from './result.ts';
import { isFrom } from './rubric/index.ts';

/** Every engineering check that feeds the verdict or the report, always in this order, as the record's version has it. */
export const checksFor = (input: SurveyInput, items: readonly Examined[]): EngineeringCheck[] =>
  isFrom(input.record.rubricVersion, '1.1.0') ? currentChecks(input, items) : firstChecks(input, items);

const currentChecks = (input: SurveyInput, items: readonly Examined[]): EngineeringCheck[] => [
  barLitresCheck(input),
  hydraulicTestCheck(input),
  partsPressure(input, items),
  jointMaterial(items),
  gaugeRange(input, items),
  gaugeError(items),
  valveLift(input),
  accumulation(input),
  valveReseat(input),
  valveCapacity(input, items),
  gaugePassages(input),
  waterLevel(items),
  waterInHand(input, items),
  feedAgainstSteam(input, items),
  secondFeed(input, items),
  gasTightness(input),
  gasFlame(input, items),
  carbonMonoxide(input),
];

/** The checks of version 1.0.0. */
const firstChecks = (input: SurveyInput, items: readonly Examined[]): EngineeringCheck[] => [
  barLitresCheck(input),
  hydraulicTestCheck(input),
  partsPressureAtFirst(input, items),
  jointMaterial(items),
  gaugeRange(input, items),
  gaugeError(items),
  valveLift(input),
  accumulation(input),
  valveReseat(input),
  valveCapacity(input, items),
  gaugePassages(input),
  waterLevel(items),
  feedRate(input, items),
  secondFeed(input, items),
  gasTightness(input),
  carbonMonoxide(input),
];
