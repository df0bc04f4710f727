import { burstWork, flashShare } from '../../engineering/hydraulic-test.ts';
import { saturatedLines } from '../../engineering/saturation.ts';
import { atmospherePa, saturationTemperatureK } from '../../engineering/steam.ts';
import { isRefusal, valueOf } from '../../engineering/working.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { workingPressure } from '../ranges.ts';

const kelvin = (pa: number): number => saturationTemperatureK(pa + atmospherePa);

/** Steam at a pressure. */
export const saturatedSteamCalculator = calculator({
  id: 'saturated-steam',
  title: 'Steam at a pressure',
  about: 'How hot it is, how much room it takes, how much heat is in it, and what a burst would let go.',
  group: 'running',
  caution:
    'Water at this heat flashes to steam when a fitting lets go. Keep out of line with fittings; wear eye protection.',
  fields: { pressurePa: workingPressure() },
  work: ({ pressurePa }) => {
    const lines = saturatedLines(pressurePa);
    if (isRefusal(lines)) return { answers: [], says: [lines.text], steps: [steps('Steam', lines)] };
    const flash = flashShare(pressurePa);
    const burst = burstWork(pressurePa);
    const times = lines.steamVolume.result.value / lines.waterVolume.result.value;
    return {
      answers: resultsOf(
        lines.temperature,
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
        steps(
          'Steam and water',
          lines.absolute,
          ...Object.values(lines).filter((each) => each !== lines.absolute),
        ),
        steps('If a shell lets go', flash, burst),
      ],
    };
  },
  plot: ({ pressurePa }) => ({
    title: 'Temperature of steam by pressure',
    x: { label: 'Gauge pressure', quantity: 'pressure' },
    y: { label: 'Temperature', quantity: 'temperature' },
    series: [curve('Saturation', spread(0, Math.max(1_000_000, pressurePa * 1.25)), kelvin)],
    marks: [{ label: 'Here', x: pressurePa, y: kelvin(pressurePa) }],
    levels: [],
  }),
});
