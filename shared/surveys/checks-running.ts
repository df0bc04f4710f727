import { burningAir, gasHeat, gases, gasVolume, jetFlow } from '../engineering/gas.ts';
import type { GasId } from '../engineering/gas.ts';
import { feedMargin, waterReserve } from '../engineering/water.ts';
import { isRefusal } from '../engineering/working.ts';
import { check, figure } from './check.ts';
import { evaporationOf } from './checks-capacity.ts';
import { figureOf, valuesOf } from './examined.ts';
import type { Examined, SurveyInput } from './examined.ts';
import type { EngineeringCheck } from './result.ts';
import { rateText, trim } from './words.ts';

const tenths = (value: number): number => Math.round(value * 10) / 10;
const hundredths = (value: number): number => Math.round(value * 100) / 100;

/** How long the water in sight lasts with no feed, at the most that the fire makes. */
export function waterInHand(input: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const make = check('water-reserve', 'Water in hand', 'safety.glass');
  const waterL = figureOf(items, 'safety.glass', 'waterInGlassL');
  const steam = evaporationOf(input);
  if (waterL === null || steam === null)
    return make.cannotSay(
      'Measure the water drawn between full glass and its lowest level, and the steam made.',
    );
  const minutes = waterReserve({
    waterL,
    steamKgPerH: steam.high,
    feedKgPerH: 0,
    pressurePa: input.facts.workingPressurePa,
  });
  if (isRefusal(minutes)) return make.cannotSay('The steam made is not known.');
  const whole = Math.floor(minutes.result.value);
  return make.pass(
    `From full glass to the lowest level in ${String(whole)} ${whole === 1 ? 'minute' : 'minutes'} at ${rateText(steam.high)} with no feed. Watch it at least that often.`,
    [figure('Full glass to lowest level', tenths(minutes.result.value), 'min')],
  );
}

/** Delivery of the first means of feed against the steam made, measured or estimated. */
export function feedAgainstSteam(input: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const make = check('feed-rate', 'Feed against evaporation', 'feed.first');
  const delivered = figureOf(items, 'feed.first', 'deliveryKgPerH');
  const steam = evaporationOf(input);
  if (delivered === null || steam === null)
    return make.cannotSay('Delivery was not measured, or the steam made is not known.');
  const figures = [
    figure('Delivered', delivered, 'kg/h'),
    figure('Steam made, low', tenths(steam.low), 'kg/h'),
    figure('Steam made, high', tenths(steam.high), 'kg/h'),
  ];
  const made =
    steam.low === steam.high ? rateText(steam.high) : `${rateText(steam.low)} to ${rateText(steam.high)}`;
  const told = `The first feed delivers ${rateText(delivered)}; the fire makes ${made}, ${steam.how}`;
  if (delivered < steam.low) return make.fail(`${told}: it cannot keep up.`, figures);
  if (delivered < steam.high) return make.cannotSay(`${told}: it may not keep up.`, figures);
  return delivered < feedMargin * steam.high
    ? make.pass(`${told}: it keeps up, with less than the half as much again usually wanted.`, figures)
    : make.pass(`${told}.`, figures);
}

/** Coefficient of discharge of a drilled jet. */
const discharge = 0.85;

const isGas = (value: unknown): value is GasId => typeof value === 'string' && value in gases;

/** Heat of a gas flame by its jet and pressure, and the air it burns. */
export function gasFlame({ facts }: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const make = check('gas-heat', 'Heat and air of the flame', 'firing.fuel');
  if (facts.firing !== 'gas') return make.pass('It is not fired by gas.');
  const jetMm = figureOf(items, 'firing.fuel', 'jetMm');
  const pressurePa = figureOf(items, 'firing.fuel', 'fuelPressurePa');
  if (jetMm === null || pressurePa === null || jetMm <= 0 || pressurePa <= 0)
    return make.cannotSay('Measure the jet and the gas pressure at it.');
  const kind = valuesOf(items, 'firing.fuel', 'gasKind').find(isGas) ?? 'propane';
  const gasGPerH = jetFlow({ gas: kind, jetMm, pressurePa, discharge }).at(-1)?.result.value ?? 0;
  const heatKw = hundredths(gasHeat(kind, gasGPerH).result.value);
  const air = hundredths(burningAir(kind, gasVolume(kind, gasGPerH).result.value).result.value);
  return make.pass(
    `By its jet it burns ${trim(gasGPerH, 0)} g of ${gases[kind].label.toLowerCase()} an hour: ${trim(heatKw, 2)} kW and ${trim(air, 2)} m³ of air an hour for the flame alone. Steam it outdoors or with wide airing.`,
    [figure('Heat of the flame', heatKw, 'kW')],
  );
}
