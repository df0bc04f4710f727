import type { Calculator } from './calculator.ts';
import { agreementCalculator } from './calculators/agreement.ts';
import { barLitresCalculator } from './calculators/bar-litres.ts';
import { distanceCalculator } from './calculators/distance.ts';
import { dueDatesCalculator } from './calculators/due-dates.ts';
import { engineCalculator } from './calculators/engine.ts';
import { evaporationCalculator } from './calculators/evaporation.ts';
import { gasJetCalculator } from './calculators/gas-jet.ts';
import { hydraulicTestCalculator } from './calculators/hydraulic-test.ts';
import { jointsCalculator } from './calculators/joints.ts';
import { metalStressCalculator } from './calculators/metal-stress.ts';
import { platesAndStaysCalculator } from './calculators/plates-and-stays.ts';
import { pressureByPartsCalculator } from './calculators/pressure-by-parts.ts';
import { pressureGaugeCalculator } from './calculators/pressure-gauge.ts';
import { safetyValveCalculator } from './calculators/safety-valve.ts';
import { saturatedSteamCalculator } from './calculators/saturated-steam.ts';
import { scaleCalculator } from './calculators/scale.ts';
import { steamBalanceCalculator } from './calculators/steam-balance.ts';
import { threadsCalculator } from './calculators/threads.ts';
import { wallMeterCalculator } from './calculators/wall-meter.ts';
import { waterAndFeedCalculator } from './calculators/water-and-feed.ts';

/** Every calculator, in the order the Workings page lists them. */
export const calculators: readonly Calculator[] = [
  pressureByPartsCalculator,
  metalStressCalculator,
  platesAndStaysCalculator,
  jointsCalculator,
  hydraulicTestCalculator,
  pressureGaugeCalculator,
  safetyValveCalculator,
  wallMeterCalculator,
  saturatedSteamCalculator,
  evaporationCalculator,
  engineCalculator,
  waterAndFeedCalculator,
  steamBalanceCalculator,
  gasJetCalculator,
  barLitresCalculator,
  dueDatesCalculator,
  scaleCalculator,
  threadsCalculator,
  agreementCalculator,
  distanceCalculator,
];

export const calculatorOf = (id: string): Calculator | undefined =>
  calculators.find((calculator) => calculator.id === id);
