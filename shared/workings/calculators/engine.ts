import { firings } from '../../boilers/boiler.ts';
import { actions } from '../../engines/engine.ts';
import type { EngineFacts } from '../../engines/engine.ts';
import { engineDemand, matchEngine, matches, sweptVolume } from '../../engineering/engine-demand.ts';
import { bandOf, evaporationBySurface } from '../../engineering/evaporation.ts';
import type { Band } from '../../engineering/evaporation.ts';
import { figureText } from '../../engineering/quantities.ts';
import { isRefusal } from '../../engineering/working.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { choice, figure, unknownFigure, whole } from '../field.ts';
import type { InputOf } from '../field.ts';
import { workingPressure, workingRange } from '../ranges.ts';
import { rateBandText } from '../say.ts';

const engine = { part: 'Engine' };
const boiler = { part: 'Boiler' };

const fields = {
  boreMm: figure('Bore', 'length', [2, 300], 19.05, engine),
  strokeMm: figure('Stroke', 'length', [2, 300], 19.05, engine),
  cylinders: whole('Cylinders', [1, 12], 1, {
    ...engine,
    hint: 'Of a compound, the high-pressure ones only',
  }),
  action: choice('Action', actions, 'double', engine),
  speedRpm: figure('Speed', 'speed', [10, 6_000], 400, {
    ...engine,
    slider: { from: 50, to: 2_000, step: 10 },
  }),
  cutOffPercent: figure('Cut-off, share of the stroke', 'percent', [5, 100], 75, {
    ...engine,
    slider: { from: 10, to: 100, step: 5 },
  }),
  pressurePa: figure('Steam pressure at the engine', 'pressure', workingRange, 300_000, engine),
  lowPercent: figure('Condensation, least', 'percent', [0, 200], 20, engine),
  highPercent: figure('Condensation, most', 'percent', [0, 200], 50, engine),
  workingPa: { ...workingPressure(), part: 'Boiler' },
  measuredKgPerH: unknownFigure('Steam made, timed in a test', 'massRate', [0.01, 500], null, boiler),
  firing: choice('Fired by', firings, 'gas', boiler),
  surfaceM2: unknownFigure('Heating surface', 'surface', [0.001, 20], 0.1, boiler),
};
type Input = InputOf<typeof fields>;

const factsOf = (input: Input): EngineFacts => ({
  boreMm: input.boreMm,
  strokeMm: input.strokeMm,
  cylinders: input.cylinders,
  action: input.action,
  speedRpm: input.speedRpm,
  cutOffPercent: input.cutOffPercent,
  pressurePa: input.pressurePa,
});

const condensation = ({ lowPercent, highPercent }: Input): Band => ({ low: lowPercent, high: highPercent });

function madeBy({ measuredKgPerH, firing, surfaceM2 }: Input): Band | null {
  if (measuredKgPerH !== null) return { low: measuredKgPerH, high: measuredKgPerH };
  const estimated = evaporationBySurface(firing, surfaceM2);
  return isRefusal(estimated) ? null : bandOf(estimated);
}

/** Whether a boiler drives an engine. */
export const engineCalculator = calculator({
  id: 'engine',
  title: 'Will it drive my engine',
  about: 'Steam the engine takes at its speed and cut-off, against the steam the boiler makes.',
  group: 'running',
  caution: null,
  fields,
  check: ({ lowPercent, highPercent, pressurePa, workingPa }) => [
    ...(highPercent < lowPercent
      ? [{ field: 'highPercent', message: 'The most cannot be under the least' }]
      : []),
    ...(pressurePa > workingPa
      ? [
          {
            field: 'pressurePa',
            message: 'The engine cannot have more pressure than the boiler works at',
          },
        ]
      : []),
  ],
  work: (input) => {
    const facts = factsOf(input);
    const swept = sweptVolume(facts);
    const demand = engineDemand(facts, condensation(input));
    const made = madeBy(input);
    const demandSteps = steps('What the engine takes', swept, demand.low, demand.high);
    if (made === null) {
      const estimated = evaporationBySurface(input.firing, input.surfaceM2);
      return {
        answers: resultsOf(demand.low, demand.high),
        says: [`The engine takes ${rateBandText(bandOf(demand))}. What the boiler makes is not known.`],
        steps: [demandSteps, steps('What the boiler makes', ...(isRefusal(estimated) ? [estimated] : []))],
      };
    }
    const match = matchEngine(facts, made, bandOf(demand));
    const slow = Math.floor(match.speed.low.result.value);
    const fast = Math.floor(match.speed.high.result.value);
    const estimated = evaporationBySurface(input.firing, input.surfaceM2);
    return {
      answers: resultsOf(
        match.ratio.low,
        match.ratio.high,
        match.speed.low,
        match.speed.high,
        demand.low,
        demand.high,
      ),
      says: [
        `${matches[match.id]}.`,
        `The engine takes ${rateBandText(bandOf(demand))}; the boiler makes ${rateBandText(made)}, ${input.measuredKgPerH === null ? 'as estimated' : 'as timed'}.`,
        `The fastest it could keep the engine at is ${figureText(slow)} to ${figureText(fast)} rpm.`,
      ],
      steps: [
        demandSteps,
        ...(input.measuredKgPerH === null && !isRefusal(estimated)
          ? [steps('What the boiler makes', estimated.low, estimated.high)]
          : []),
        steps('One against the other', match.ratio.low, match.ratio.high, match.speed.low, match.speed.high),
      ],
    };
  },
  plot: (input) => {
    const facts = factsOf(input);
    const at = (end: 'low' | 'high') => (speedRpm: number) =>
      engineDemand({ ...facts, speedRpm }, condensation(input))[end].result.value;
    const xs = spread(0, Math.max(800, input.speedRpm * 1.75));
    const made = madeBy(input);
    return {
      title: 'Steam taken by speed',
      x: { label: 'Speed', quantity: 'speed' },
      y: { label: 'Steam', quantity: 'massRate' },
      series: [curve('Least taken', xs, at('low')), curve('Most taken', xs, at('high'))],
      marks: [{ label: 'Your speed', x: input.speedRpm, y: at('high')(input.speedRpm) }],
      levels:
        made === null
          ? []
          : made.low === made.high
            ? [{ label: 'Steam made', y: made.high }]
            : [
                { label: 'Least made', y: made.low },
                { label: 'Most made', y: made.high },
              ],
    };
  },
});
