import { valveCapacity } from './checks-capacity.ts';
import { gaugeError, gaugeRange } from './checks-gauge.ts';
import { hydraulicTestCheck } from './checks-hydraulic.ts';
import { partsPressure } from './checks-parts.ts';
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

/** Every engineering check that feeds the verdict or the report, always in this order. */
export const checksFor = (input: SurveyInput, items: readonly Examined[]): EngineeringCheck[] => [
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
  feedRate(input, items),
  secondFeed(input, items),
  gasTightness(input),
  carbonMonoxide(input),
];
