import { work } from './working.ts';
import type { Line } from './working.ts';

/** Classes a gauge may have: the error allowed, per cent of its span. */
export const gaugeClasses = [0.1, 0.25, 0.6, 1, 1.6, 2.5, 4] as const;

/** Most of its full scale that a gauge may show steadily, per cent. */
export const gaugeSteadyPercent = 75;

/** Where working pressure stands on the gauge. */
export const gaugeShare = (workingPa: number, fullScalePa: number): Line =>
  work({
    result: ['u', 'Working pressure stands at', 'percent'],
    formula: '100·{P} / {S}',
    terms: {
      P: ['Working pressure', 'pressure', workingPa],
      S: ['Full scale', 'pressure', fullScalePa],
    },
    compute: ({ P, S }) => (100 * P) / S,
    source: 'gauge-steady',
    holds: 'Steady pressure: at most 75 % of full scale',
    units: 'metric',
  });

/** Most a gauge of a class may be out by. */
export const gaugeErrorLimit = (fullScalePa: number, classPercent: number): Line =>
  work({
    result: ['e', 'It may be out by, either way', 'pressure'],
    formula: '{c}·{S}',
    terms: {
      c: ['Class', 'percent', classPercent],
      S: ['Full scale', 'pressure', fullScalePa],
    },
    compute: ({ c, S }) => (c * S) / 100,
    source: 'gauge-error',
    holds: 'Classes 0.1 to 4, at 20 °C',
  });
