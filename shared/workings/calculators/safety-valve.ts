import { firings } from '../../boilers/boiler.ts';
import { bandOf, evaporationBySurface } from '../../engineering/evaporation.ts';
import {
  isoCapacity,
  liftLabels,
  liftTolerancePercent,
  reseatLimit,
  valveCapacityLines,
} from '../../engineering/safety-valve.ts';
import { atmospherePa, saturatedAt } from '../../engineering/steam.ts';
import { isRefusal, valueOf, work } from '../../engineering/working.ts';
import { pressureText } from '../../surveys/words.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { choice, figure, unknownFigure, whole } from '../field.ts';
import { workingPressure } from '../ranges.ts';
import { rateBandText, rateText } from '../say.ts';

/** What a safety valve passes, against what the fire makes. */
export const safetyValveCalculator = calculator({
  id: 'safety-valve',
  title: 'The safety valve',
  about: 'What it passes by calculation against the steam the fire makes, and when it should lift and shut.',
  group: 'tests',
  caution:
    'The test under full fire overrules the formula. Stand clear of the outlet, wear eye protection, and put the fire out if pressure passes the mark.',
  fields: {
    workingPa: workingPressure(),
    boreMm: figure('Bore of the seat', 'length', [0.5, 50], 5, { slider: { from: 1, to: 20, step: 0.1 } }),
    lift: choice('How far it lifts', liftLabels, 'ordinary', {
      hint: 'Ordinary where nobody has measured it',
    }),
    valves: whole('Valves like it', [1, 4], 1),
    measuredKgPerH: unknownFigure('Steam made, timed in a test', 'massRate', [0.01, 500], null),
    firing: choice('Fired by', firings, 'gas'),
    surfaceM2: unknownFigure('Heating surface', 'surface', [0.001, 20], 0.1),
  },
  work: ({ workingPa, boreMm, lift, valves, measuredKgPerH, firing, surfaceM2 }) => {
    const { limit, area, passes } = valveCapacityLines({ boreMm, lift, setPa: workingPa });
    const iso = isoCapacity({
      areaMm2: area.result.value,
      pressurePaAbs: limit.result.value + atmospherePa,
      volumeM3PerKg: saturatedAt(limit.result.value).steam.specificVolume,
    });
    const all = work({
      result: ['W_a', 'All the valves pass', 'massRate'],
      formula: '{N}·{W}',
      terms: { N: ['Valves', 'count', valves], W: ['One passes', 'massRate', passes.result.value] },
      compute: ({ N, W }) => N * W,
      source: 'napier',
      holds: 'Valves alike, set alike',
    });
    const estimated = evaporationBySurface(firing, surfaceM2);
    const made =
      measuredKgPerH === null
        ? isRefusal(estimated)
          ? null
          : bandOf(estimated)
        : { low: measuredKgPerH, high: measuredKgPerH };
    const reseat = reseatLimit(workingPa);
    const passed = all.result.value;
    const tolerance = (workingPa * liftTolerancePercent) / 100;
    return {
      answers: resultsOf(all, limit, reseat),
      says: [
        made === null
          ? 'The steam made is not known: time a feed in a steam test, or give firing and heating surface.'
          : compareSays(passed, made, measuredKgPerH !== null),
        `It should lift between ${pressureText(workingPa - tolerance)} and ${pressureText(workingPa + tolerance)}, hold pressure under ${pressureText(limit.result.value)} with full fire and everything shut, and have shut again by ${pressureText(reseat.result.value)}.`,
      ],
      steps: [
        steps('What it passes', limit, area, passes, all),
        steps('A second formula', iso),
        ...(measuredKgPerH === null
          ? [steps('Steam made', ...(isRefusal(estimated) ? [estimated] : [estimated.low, estimated.high]))]
          : []),
        steps('Shutting', reseat),
      ],
    };
  },
  plot: ({ workingPa, boreMm, lift, valves, measuredKgPerH, firing, surfaceM2 }) => {
    const at = (bore: number) =>
      valveCapacityLines({ boreMm: bore, lift, setPa: workingPa }).passes.result.value * valves;
    const estimated = evaporationBySurface(firing, surfaceM2);
    const high = measuredKgPerH ?? (isRefusal(estimated) ? null : valueOf(estimated.high));
    return {
      title: 'What it passes by its bore',
      x: { label: 'Bore', quantity: 'length' },
      y: { label: 'Steam', quantity: 'massRate' },
      series: [curve('Valves pass', spread(0.5, Math.max(8, boreMm * 2)), at)],
      marks: [{ label: 'Yours', x: boreMm, y: at(boreMm) }],
      levels: high === null ? [] : [{ label: 'Most steam made', y: high }],
    };
  },
});

function compareSays(passed: number, made: { low: number; high: number }, isMeasured: boolean): string {
  const told = `The valves pass ${rateText(passed)}; the fire makes ${rateBandText(made)}, ${isMeasured ? 'as timed' : 'as estimated'}.`;
  if (passed >= made.high) return `${told} By calculation they pass it all; prove it under full fire.`;
  return passed < made.low
    ? `${told} They are too small by calculation: do not rely on them unless a test under full fire has proved them.`
    : `${told} They may be too small: prove them under full fire.`;
}
