import { firings } from '../../boilers/boiler.ts';
import {
  bandOf,
  boilerEfficiency,
  evaporationByHeat,
  evaporationBySurface,
  factorOfEvaporation,
  heatToMake,
} from '../../engineering/evaporation.ts';
import type { Band, BandLines } from '../../engineering/evaporation.ts';
import { isRefusal, work } from '../../engineering/working.ts';
import type { Line, Refusal } from '../../engineering/working.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import type { Steps } from '../calculator.ts';
import { choice, figure, unknownFigure } from '../field.ts';
import { workingPressure } from '../ranges.ts';
import { rateBandText } from '../say.ts';

const timedFeed = (waterL: number, minutes: number): Line =>
  work({
    result: ['W', 'Steam made, timed', 'massRate'],
    formula: '{V}·{ρ} / {τ}',
    terms: {
      V: ['Water fed', 'volume', waterL],
      ρ: ['Cold water, kg in a litre', 'waterDensity', 0.998_2],
      τ: ['Time', 'minutes', minutes],
    },
    compute: ({ V, ρ, τ }) => (V * ρ * 60) / τ,
    source: 'geometry',
    holds: 'Level and pressure the same at both ends of the time',
  });

const stepsOf = (title: string, band: BandLines | Refusal): Steps =>
  steps(title, ...(isRefusal(band) ? [band] : [band.low, band.high]));

/** How much steam a boiler makes. */
export const evaporationCalculator = calculator({
  id: 'evaporation',
  title: 'How much steam it makes',
  about: 'Timed in a test, or estimated from heating surface or from the heat of the fire.',
  group: 'running',
  caution: null,
  fields: {
    pressurePa: workingPressure(),
    firing: choice('Fired by', firings, 'gas'),
    surfaceM2: unknownFigure('Heating surface', 'surface', [0.001, 20], 0.1, {
      slider: { from: 0.01, to: 0.5, step: 0.005 },
    }),
    heatKw: unknownFigure('Heat of the fire', 'power', [0.05, 500], null),
    lowPercent: figure('Share of it taken up, least', 'percent', [5, 95], boilerEfficiency.low),
    highPercent: figure('Share of it taken up, most', 'percent', [5, 95], boilerEfficiency.high),
    feedK: figure('Temperature of the feed', 'temperature', [274.15, 368.15], 293.15),
    fedL: unknownFigure('Water fed', 'volume', [0.01, 500], null, { part: 'Timed in a steam test' }),
    minutes: unknownFigure('In', 'minutes', [0.5, 600], null, { part: 'Timed in a steam test' }),
  },
  check: ({ lowPercent, highPercent }) =>
    highPercent < lowPercent ? [{ field: 'highPercent', message: 'The most cannot be under the least' }] : [],
  work: (input) => {
    const timed = input.fedL === null || input.minutes === null ? null : timedFeed(input.fedL, input.minutes);
    const surface = evaporationBySurface(input.firing, input.surfaceM2);
    const heat =
      input.heatKw === null
        ? null
        : evaporationByHeat({
            heatKw: input.heatKw,
            pressurePa: input.pressurePa,
            feedK: input.feedK,
            efficiencyPercent: { low: input.lowPercent, high: input.highPercent },
          });
    const factor = factorOfEvaporation(input.pressurePa, input.feedK);
    const best = bestOf(timed, surface, heat);
    const taken =
      best === null
        ? null
        : heatToMake({ steamKgPerH: best.band.high, pressurePa: input.pressurePa, feedK: input.feedK });
    return {
      answers: [
        ...(best === null ? [] : best.lines.map(({ result }) => result)),
        ...resultsOf(factor, ...(taken === null ? [] : [taken])),
      ],
      says: [
        best === null
          ? 'Cannot say: measure the heating surface, or time the feed in a steam test.'
          : `${rateBandText(best.band)}, ${best.how}.${timed === null ? ' A timed feed beats any estimate.' : ''}`,
      ],
      steps: [
        ...(timed === null ? [] : [steps('Timed', timed)]),
        stepsOf('By heating surface', surface),
        ...(heat === null ? [] : [stepsOf('By the heat of the fire', heat)]),
        steps('Heat', factor, ...(taken === null ? [] : [taken])),
      ],
    };
  },
  plot: (input) => {
    const estimated = evaporationBySurface(input.firing, input.surfaceM2);
    if (isRefusal(estimated) || input.surfaceM2 === null) return null;
    const at = (end: 'low' | 'high') => (surfaceM2: number) => {
      const lines = evaporationBySurface(input.firing, surfaceM2);
      return isRefusal(lines) ? null : lines[end].result.value;
    };
    const xs = spread(0.001, Math.max(0.2, input.surfaceM2 * 2));
    return {
      title: 'Steam made by heating surface',
      x: { label: 'Heating surface', quantity: 'surface' },
      y: { label: 'Steam', quantity: 'massRate' },
      series: [curve('Least', xs, at('low')), curve('Most', xs, at('high'))],
      marks: [
        { label: 'Yours, least', x: input.surfaceM2, y: estimated.low.result.value },
        { label: 'Yours, most', x: input.surfaceM2, y: estimated.high.result.value },
      ],
      levels: [],
    };
  },
});

interface Best {
  band: Band;
  lines: readonly Line[];
  how: string;
}

function bestOf(
  timed: Line | null,
  surface: BandLines | Refusal,
  heat: BandLines | Refusal | null,
): Best | null {
  if (timed !== null)
    return {
      band: { low: timed.result.value, high: timed.result.value },
      lines: [timed],
      how: 'as timed',
    };
  if (heat !== null && !isRefusal(heat))
    return { band: bandOf(heat), lines: [heat.low, heat.high], how: 'by the heat of the fire' };
  return isRefusal(surface)
    ? null
    : { band: bandOf(surface), lines: [surface.low, surface.high], how: 'by the heating surface' };
}
