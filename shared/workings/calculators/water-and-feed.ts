import {
  feedByWeight,
  feedWanted,
  pumpDelivery,
  pumpSlipPercent,
  waterReserve,
} from '../../engineering/water.ts';
import { isRefusal } from '../../engineering/working.ts';
import { trim } from '../../surveys/words.ts';
import { calculator, curve, resultsOf, spread, steps } from '../calculator.ts';
import { figure } from '../field.ts';
import { workingPressure } from '../ranges.ts';
import { rateText } from '../say.ts';

const pump = { part: 'Feed pump' };

/** Water in hand, and whether a pump keeps up. */
export const waterAndFeedCalculator = calculator({
  id: 'water-and-feed',
  title: 'Water in hand, and feed',
  about: 'Minutes from full glass to the lowest level, and whether a pump keeps up.',
  group: 'running',
  caution:
    'Never let the water leave the glass with a fire lit. If it does, put the fire out and let it cool: cold water on hot metal bursts boilers.',
  fields: {
    pressurePa: workingPressure(),
    waterL: figure('Water between full glass and lowest level', 'volume', [0.001, 50], 0.15),
    steamKgPerH: figure('Steam made', 'massRate', [0.01, 500], 2, {
      slider: { from: 0.2, to: 15, step: 0.1 },
    }),
    ramMm: figure('Ram', 'length', [1, 60], 6.35, pump),
    strokeMm: figure('Stroke', 'length', [1, 200], 9.525, pump),
    strokesPerMinute: figure('Strokes', 'strokes', [0, 2_000], 100, pump),
    deliveredPercent: figure('Share delivered', 'percent', [10, 100], pumpSlipPercent, pump),
  },
  work: (input) => {
    const swept = pumpDelivery(input);
    const feed = feedByWeight(swept.result.value);
    const wanted = feedWanted(input.steamKgPerH);
    const alone = waterReserve({ ...input, feedKgPerH: 0 });
    const running = waterReserve({ ...input, feedKgPerH: feed.result.value });
    const fed = feed.result.value;
    return {
      answers: resultsOf(alone, feed, wanted, swept),
      says: [
        isRefusal(alone)
          ? alone.text
          : `With no feed the water in sight lasts ${trim(alone.result.value, 1)} minutes.`,
        fed >= wanted.result.value
          ? `The pump delivers ${rateText(fed)}: the half as much again that is wanted, or more.`
          : fed >= input.steamKgPerH
            ? `The pump delivers ${rateText(fed)}: it keeps up, with less than the ${rateText(wanted.result.value)} usually wanted.`
            : `The pump delivers ${rateText(fed)}: it cannot keep up with ${rateText(input.steamKgPerH)}.${isRefusal(running) ? '' : ` With it running the water lasts ${trim(running.result.value, 1)} minutes.`}`,
      ],
      steps: [
        steps('Water in hand', alone, ...(fed > 0 ? [running] : [])),
        steps('Feed', swept, feed, wanted),
      ],
    };
  },
  plot: ({ pressurePa, waterL, steamKgPerH }) => {
    const at = (rate: number) => {
      const minutes = waterReserve({ waterL, steamKgPerH: rate, feedKgPerH: 0, pressurePa });
      return isRefusal(minutes) ? null : minutes.result.value;
    };
    const here = at(steamKgPerH);
    return {
      title: 'Minutes of water by steam made',
      x: { label: 'Steam made', quantity: 'massRate' },
      y: { label: 'Time', quantity: 'minutes' },
      series: [curve('No feed', spread(steamKgPerH / 4, steamKgPerH * 3), at)],
      marks: here === null ? [] : [{ label: 'Here', x: steamKgPerH, y: here }],
      levels: [],
    };
  },
});
