import { bandOf, evaporationBySurface } from '../engineering/evaporation.ts';
import { liftShares, mostWithValveLiftingPa, napierKgPerH } from '../engineering/safety-valve.ts';
import { atmospherePa } from '../engineering/steam.ts';
import { accumulation } from './checks-steam.ts';
import { check, figure } from './check.ts';
import { figureOf, valuesOf } from './examined.ts';
import type { Examined, SurveyInput } from './examined.ts';
import type { EngineeringCheck } from './result.ts';
import { rateText } from './words.ts';

const openShare: Readonly<Record<string, number>> = liftShares;

/** Steam made, kg/h: measured where a feed was timed, else estimated; null where neither can be. */
export function evaporationOf({
  facts,
  record,
}: Pick<SurveyInput, 'facts' | 'record'>): { low: number; high: number; how: string } | null {
  const measured = record.steam?.evaporationKgPerH ?? null;
  if (measured !== null) return { low: measured, high: measured, how: 'measured' };
  const estimated = evaporationBySurface(facts.firing, facts.dimensions.heatingSurfaceM2);
  return 'refused' in estimated ? null : { ...bandOf(estimated), how: 'estimated from the heating surface' };
}

const tenths = (kgPerH: number): number => Math.round(kgPerH * 10) / 10;

/** What the safety valve passes by calculation against the steam made. A test under full fire overrules it. */
export function valveCapacity(input: SurveyInput, items: readonly Examined[]): EngineeringCheck {
  const make = check('valve-capacity', 'Safety valve capacity', 'safety.capacity');
  const bore = figureOf(items, 'safety.capacity', 'valveBoreMm');
  const valves = figureOf(items, 'safety.capacity', 'valvesFitted') ?? 1;
  const lifts = valuesOf(items, 'safety.capacity', 'valveLift').map(
    (lift) => openShare[String(lift)] ?? 1 / 6,
  );
  const evaporation = evaporationOf(input);
  const proved = accumulation(input).status === 'pass';
  if (bore === null || evaporation === null)
    return proved
      ? make.pass('Proved by the test under full fire.')
      : make.cannotSay(
          'The bore of the valve or the steam made is not known, and it was not proved by test.',
        );
  // Where the lift is not recorded the least is taken.
  const share = lifts.length === 0 ? 1 / 6 : Math.min(...lifts);
  const passes =
    napierKgPerH({
      areaMm2: (Math.PI / 4) * bore ** 2 * share,
      pressurePaAbs: mostWithValveLiftingPa(input.facts.workingPressurePa) + atmospherePa,
    }) * Math.max(1, valves);
  const figures = [
    figure('Valve passes', tenths(passes), 'kg/h'),
    figure('Steam made, low', tenths(evaporation.low), 'kg/h'),
    figure('Steam made, high', tenths(evaporation.high), 'kg/h'),
  ];
  const made =
    evaporation.low === evaporation.high
      ? rateText(evaporation.high)
      : `${rateText(evaporation.low)} to ${rateText(evaporation.high)}`;
  const told = `By calculation the valve passes ${rateText(passes)}; the fire makes ${made}, ${evaporation.how}`;
  if (proved) return make.pass(`${told}. The test under full fire overrules this, and proved it.`, figures);
  if (passes < evaporation.low) return make.fail(`${told}: too small, and not proved by test.`, figures);
  return passes < evaporation.high
    ? make.cannotSay(`${told}: it may be too small.`, figures)
    : make.pass(`${told}.`, figures);
}
