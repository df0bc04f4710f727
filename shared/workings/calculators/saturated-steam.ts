import { burstWork, flashShare } from '../../engineering/hydraulic-test.ts';
import { pressureOfSteamAt, saturatedLines } from '../../engineering/saturation.ts';
import { atmospherePa, saturationTemperatureK } from '../../engineering/steam.ts';
import { isRefusal, valueOf } from '../../engineering/working.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { choice, figure } from '../field.ts';
import { workingPressure } from '../ranges.ts';

const kelvin = (pa: number): number => saturationTemperatureK(pa + atmospherePa);

interface Known {
  by: 'pressure' | 'temperature';
  pressurePa: number;
  temperatureK: number;
}

/** Gauge pressure, given or by the temperature of the steam. */
const pressureOf = ({ by, pressurePa, temperatureK }: Known): number =>
  by === 'pressure' ? pressurePa : (valueOf(pressureOfSteamAt(temperatureK)) ?? 0);

/** Steam at a pressure. */
export const saturatedSteamCalculator = calculator({
  id: 'saturated-steam',
  title: 'Steam at a pressure',
  about: 'How hot it is, how much room it takes, how much heat is in it, and what a burst would let go.',
  group: 'running',
  caution:
    'Water at this heat flashes to steam when a fitting lets go. Keep out of line with fittings; wear eye protection.',
  fields: {
    by: choice(
      'What you know',
      { pressure: 'Pressure on the gauge', temperature: 'Temperature' },
      'pressure',
    ),
    pressurePa: { ...workingPressure(), when: { field: 'by', is: ['pressure'] } },
    temperatureK: figure('Temperature of the steam', 'temperature', [373.15, 500], 424.15, {
      when: { field: 'by', is: ['temperature'] },
    }),
  },
  work: (input) => {
    const pressurePa = pressureOf(input);
    const lines = saturatedLines(pressurePa);
    if (isRefusal(lines)) return { answers: [], says: [lines.text], steps: [steps('Steam', lines)] };
    const flash = flashShare(pressurePa);
    const burst = burstWork(pressurePa);
    const times = lines.steamVolume.result.value / lines.waterVolume.result.value;
    return {
      answers: resultsOf(
        ...(input.by === 'temperature' ? [pressureOfSteamAt(input.temperatureK)] : [lines.temperature]),
        lines.absolute,
        lines.steamVolume,
        lines.waterVolume,
        lines.waterHeat,
        lines.latentHeat,
        lines.steamHeat,
      ),
      says: [
        `A volume of the hot water makes ${trim(times, 0)} volumes of steam.`,
        `Let down to the open air at once, ${trim((valueOf(flash) ?? 0) * 100, 1)} % of the water flashes to steam.`,
      ],
      steps: [
        ...(input.by === 'temperature'
          ? [steps('From the temperature', pressureOfSteamAt(input.temperatureK))]
          : []),
        steps(
          'Steam and water',
          lines.absolute,
          ...Object.values(lines).filter((each) => each !== lines.absolute),
        ),
        steps('If a shell lets go', flash, burst),
      ],
    };
  },
  plot: (input) => ({
    title: 'Temperature of steam by pressure',
    x: { label: 'Gauge pressure', quantity: 'pressure' },
    y: { label: 'Temperature', quantity: 'temperature' },
    series: [curve('Saturation', spread(0, Math.max(1_000_000, pressureOf(input) * 1.25)), kelvin)],
    marks: [{ label: 'Here', x: pressureOf(input), y: kelvin(pressureOf(input)) }],
    levels: [],
  }),
});
