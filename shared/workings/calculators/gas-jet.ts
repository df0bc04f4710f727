import {
  airForGas,
  alarmTimes,
  burningAir,
  carbonMonoxideLimits,
  chokedAbovePa,
  freshAir,
  gases,
  gasHeat,
  gasVolume,
  jetFlow,
  wobbe,
} from '../../engineering/gas.ts';
import type { GasId } from '../../engineering/gas.ts';
import { figureText } from '../../engineering/quantities.ts';
import { pressureText } from '../../surveys/words.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { choice, figure, labelsOf } from '../field.ts';

const heatAt = (of: { gas: GasId; jetMm: number; pressurePa: number; discharge: number }) => {
  const flow = jetFlow(of);
  return { flow, heat: gasHeat(of.gas, flow.at(-1)?.result.value ?? 0) };
};

const alarmSays = alarmTimes
  .map(({ ppm, least, most }) =>
    most === null
      ? `${String(ppm)} ppm not before ${String(least)} minutes`
      : least === 0
        ? `${String(ppm)} ppm within ${String(most)}`
        : `${String(ppm)} ppm between ${String(least)} and ${String(most)}`,
  )
  .join('; ');

/** Heat of a gas jet, and the air it wants. */
export const gasJetCalculator = calculator({
  id: 'gas-jet',
  title: 'Gas jet, heat and air',
  about: 'Gas through a jet, the heat it gives, the air it burns and the fresh air a room would need.',
  group: 'firing',
  caution:
    'Carbon monoxide cannot be smelt, and it kills. Steam outdoors or with wide airing, with an alarm beside you; if it sounds, shut the gas and leave. The gas is heavier than air and gathers in the lowest place.',
  fields: {
    gas: choice('Gas', labelsOf(gases), 'butane'),
    jetMm: figure('Jet', 'length', [0.05, 5], 0.2, { slider: { from: 0.1, to: 1, step: 0.01 } }),
    pressurePa: figure('Gas pressure at the jet', 'pressure', [500, 1_000_000], 150_000, {
      slider: { from: 5_000, to: 400_000, step: 5_000 },
    }),
    discharge: figure('Coefficient of discharge', 'ratio', [0.4, 1], 0.85, {
      hint: '0.8 to 0.9 for a drilled jet',
    }),
  },
  work: (input) => {
    const { flow, heat } = heatAt(input);
    const gasGPerH = flow.at(-1)?.result.value ?? 0;
    const volume = gasVolume(input.gas, gasGPerH);
    const air = burningAir(input.gas, volume.result.value);
    const fresh = freshAir(input.gas, volume.result.value);
    const choke = chokedAbovePa(input.gas);
    return {
      answers: [heat.result, ...resultsOf(...flow.slice(-1), air, fresh)],
      says: [
        input.pressurePa >= choke
          ? `The jet is choked, as it is above ${pressureText(choke)}: the flow goes up with the pressure.`
          : `The jet is not choked: it would be above ${pressureText(choke)}.`,
        `The flame alone burns ${figureText(air.result.value, 3)} m³ of air an hour. Indoors a room would need ${figureText(fresh.result.value, 3)} m³ an hour to keep even a good flame’s carbon dioxide under the workplace limit.`,
        `Workplace limits of carbon monoxide: ${String(carbonMonoxideLimits.eightHoursPpm)} ppm over eight hours, ${String(carbonMonoxideLimits.fifteenMinutesPpm)} ppm over fifteen minutes (EH40, from memory). An alarm to EN 50291-1 sounds at ${alarmSays} minutes.`,
      ],
      steps: [
        steps('Gas', ...flow),
        steps('Heat', heat),
        steps('Air', volume, airForGas(input.gas), air, fresh),
        steps('Changing gas', wobbe(input.gas)),
      ],
    };
  },
  plot: (input) => ({
    title: 'Heat by gas pressure',
    x: { label: 'Gas pressure', quantity: 'pressure' },
    y: { label: 'Heat', quantity: 'power' },
    series: [
      curve(
        'Heat of the flame',
        spread(1_000, Math.max(300_000, input.pressurePa * 1.5)),
        (pressurePa) => heatAt({ ...input, pressurePa }).heat.result.value,
      ),
    ],
    marks: [{ label: 'Here', x: input.pressurePa, y: heatAt(input).heat.result.value }],
    levels: [],
  }),
});
