import { firings } from '../../boilers/boiler.ts';
import { bandOf, evaporationByHeat, evaporationBySurface } from '../../engineering/evaporation.ts';
import type { Band, BandLines } from '../../engineering/evaporation.ts';
import { burningAir, gases, gasHeat, gasVolume, jetFlow } from '../../engineering/gas.ts';
import { liftLabels, valveCapacityLines } from '../../engineering/safety-valve.ts';
import { feedWanted, waterReserve } from '../../engineering/water.ts';
import { isRefusal } from '../../engineering/working.ts';
import type { Line, Refusal } from '../../engineering/working.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, resultsOf, steps } from '../calculator.ts';
import { choice, figure, labelsOf, unknownFigure, whole } from '../field.ts';
import type { InputOf } from '../field.ts';
import { workingPressure } from '../ranges.ts';
import { rateBandText, rateText } from '../say.ts';

const made = { part: 'Steam made' };
const fire = { part: 'Gas fire', when: { field: 'firing', is: ['gas'] } };
const valve = { part: 'Safety valve' };
const water = { part: 'Water' };
/** Coefficient of discharge of a drilled jet. */
const discharge = 0.85;

const fields = {
  workingPa: workingPressure(),
  firing: choice('Fired by', firings, 'gas', made),
  surfaceM2: unknownFigure('Heating surface', 'surface', [0.001, 20], 0.1, {
    ...made,
    slider: { from: 0.01, to: 0.5, step: 0.005 },
  }),
  measuredKgPerH: unknownFigure('Steam made, timed in a test', 'massRate', [0.01, 500], null, made),
  feedK: figure('Temperature of the feed', 'temperature', [274.15, 368.15], 293.15, made),
  gas: choice('Gas', labelsOf(gases), 'butane', fire),
  jetMm: unknownFigure('Jet', 'length', [0.05, 5], 0.3, fire),
  jetPa: unknownFigure('Gas pressure at the jet', 'pressure', [500, 1_000_000], 150_000, fire),
  boreMm: unknownFigure('Bore of the seat', 'length', [0.5, 50], 6, valve),
  lift: choice('How far it lifts', liftLabels, 'ordinary', valve),
  valves: whole('Valves like it', [1, 4], 1, valve),
  waterL: unknownFigure('Water between full glass and lowest level', 'volume', [0.001, 50], 0.15, water),
  feedKgPerH: unknownFigure('The feed delivers', 'massRate', [0, 500], 4, water),
};
type Input = InputOf<typeof fields>;

interface Made {
  band: Band;
  how: string;
}

function madeBy(input: Input, estimated: BandLines | Refusal): Made | null {
  if (input.measuredKgPerH !== null)
    return { band: { low: input.measuredKgPerH, high: input.measuredKgPerH }, how: 'as timed' };
  return isRefusal(estimated) ? null : { band: bandOf(estimated), how: 'by the heating surface' };
}

interface Fire {
  lines: readonly Line[];
  heatKw: number;
  airM3PerH: number;
}

function fireOf(input: Input): Fire | null {
  if (input.firing !== 'gas' || input.jetMm === null || input.jetPa === null) return null;
  const flow = jetFlow({ gas: input.gas, jetMm: input.jetMm, pressurePa: input.jetPa, discharge });
  const gasGPerH = flow.at(-1)?.result.value ?? 0;
  const heat = gasHeat(input.gas, gasGPerH);
  const volume = gasVolume(input.gas, gasGPerH);
  const air = burningAir(input.gas, volume.result.value);
  return { lines: [...flow, heat, volume, air], heatKw: heat.result.value, airM3PerH: air.result.value };
}

/** Whether what the fire could make and what was found agree. */
function agreementSays({ band }: Made, fire: Band): string {
  if (fire.high < band.low)
    return `The fire could make ${rateBandText(fire)} at most: less than the figure above. The fire is the limit, or a figure is wrong.`;
  return fire.low > band.high
    ? `The fire could make ${rateBandText(fire)}: more than the figure above. Heat is going up the chimney, or a figure is wrong.`
    : `The fire could make ${rateBandText(fire)}: the two agree.`;
}

/** Fire, steam, valve, feed, water and air in one account. */
export const steamBalanceCalculator = calculator({
  id: 'steam-balance',
  title: 'The whole steam balance',
  about: 'Fire, steam, safety valve, feed, water and air in one account, each against the rest.',
  group: 'running',
  caution:
    'The valve must pass more than the fire makes, and the feed must deliver it: prove both under steam, with your local code and your boiler inspector.',
  fields,
  work: (input) => {
    const estimated = evaporationBySurface(input.firing, input.surfaceM2);
    const steam = madeBy(input, estimated);
    const fire = fireOf(input);
    const byFire =
      fire === null
        ? null
        : evaporationByHeat({ heatKw: fire.heatKw, pressurePa: input.workingPa, feedK: input.feedK });
    const valveLines =
      input.boreMm === null
        ? null
        : valveCapacityLines({ boreMm: input.boreMm, lift: input.lift, setPa: input.workingPa });
    const passes = valveLines === null ? null : valveLines.passes.result.value * input.valves;
    const reserve =
      steam === null || input.waterL === null
        ? null
        : waterReserve({
            waterL: input.waterL,
            steamKgPerH: steam.band.high,
            feedKgPerH: 0,
            pressurePa: input.workingPa,
          });
    const wanted = steam === null ? null : feedWanted(steam.band.high);
    return {
      answers: [
        ...(input.measuredKgPerH === null && !isRefusal(estimated)
          ? resultsOf(estimated.low, estimated.high)
          : []),
        ...(valveLines === null
          ? []
          : [{ ...valveLines.passes.result, label: 'The valves pass', value: passes ?? 0 }]),
        ...resultsOf(...(wanted === null ? [] : [wanted]), ...(reserve === null ? [] : [reserve])),
      ],
      says: [
        steam === null
          ? 'Steam made: cannot say. Measure the heating surface, or time the feed in a steam test.'
          : `Steam made: ${rateBandText(steam.band)}, ${steam.how}.`,
        ...(steam !== null && byFire !== null && !isRefusal(byFire)
          ? [`Fire: ${trim(fire?.heatKw ?? 0, 2)} kW. ${agreementSays(steam, bandOf(byFire))}`]
          : []),
        ...(steam === null || passes === null
          ? []
          : [
              `Safety valve: passes ${rateText(passes)}, ${trim(passes / steam.band.high, 1)} times the most made.${passes < steam.band.high ? ' Too small by calculation: prove it under full fire or change it.' : ''}`,
            ]),
        ...(wanted === null || steam === null || input.feedKgPerH === null
          ? []
          : [
              input.feedKgPerH < steam.band.high
                ? `Feed: ${rateText(input.feedKgPerH)} does not keep up with the most made.`
                : `Feed: ${rateText(input.feedKgPerH)}, for ${rateText(wanted.result.value)} wanted.`,
            ]),
        ...(reserve === null || isRefusal(reserve)
          ? []
          : [`Water in sight lasts ${trim(reserve.result.value, 1)} minutes with no feed.`]),
        ...(fire === null ? [] : [`Air: the flame burns ${trim(fire.airM3PerH, 2)} m³ an hour.`]),
      ],
      steps: [
        steps(
          'Steam by heating surface',
          ...(isRefusal(estimated) ? [estimated] : [estimated.low, estimated.high]),
        ),
        ...(fire === null ? [] : [steps('Fire and air', ...fire.lines)]),
        ...(byFire === null
          ? []
          : [steps('Steam by the fire', ...(isRefusal(byFire) ? [byFire] : [byFire.low, byFire.high]))]),
        ...(valveLines === null
          ? []
          : [steps('Safety valve, each', valveLines.limit, valveLines.area, valveLines.passes)]),
        steps('Feed and water', ...(wanted === null ? [] : [wanted]), ...(reserve === null ? [] : [reserve])),
      ],
    };
  },
});
