import { saturatedAt } from './steam.ts';
import { outOfRange, work } from './working.ts';
import type { Answer, Line } from './working.ts';

/** Minutes until water in sight is boiled off. Refused where the feed keeps up: the level does not fall. */
export function waterReserve(of: {
  waterL: number;
  steamKgPerH: number;
  feedKgPerH: number;
  pressurePa: number;
}): Answer {
  if (of.steamKgPerH <= of.feedKgPerH)
    return outOfRange('The feed keeps up with the steam made: the level does not fall while it runs.');
  return work({
    result: ['τ', 'From full glass to the lowest level', 'minutes'],
    formula: '{V} / {v_f} / ({W} − {F})',
    terms: {
      V: ['Water between the levels', 'volume', of.waterL],
      v_f: ['Volume of the water, hot', 'specificVolume', saturatedAt(of.pressurePa).water.specificVolume],
      W: ['Steam made', 'massRate', of.steamKgPerH],
      F: ['Feed', 'massRate', of.feedKgPerH],
    },
    compute: ({ V, v_f, W, F }) => (V / 1_000 / v_f / (W - F)) * 60,
    source: 'water-reserve',
    holds: 'Steady steaming',
  });
}

/** Share of its stroke that a small pump delivers, per cent; common practice. */
export const pumpSlipPercent = 80;

export interface PumpInput {
  ramMm: number;
  strokeMm: number;
  strokesPerMinute: number;
  deliveredPercent?: number;
}

/** What a feed pump delivers. */
export const pumpDelivery = (of: PumpInput): Line =>
  work({
    result: ['q', 'The pump delivers', 'sweptRate'],
    formula: 'π / 4·{d}²·{s}·{n}·{η}',
    terms: {
      d: ['Ram', 'length', of.ramMm],
      s: ['Stroke', 'length', of.strokeMm],
      n: ['Strokes', 'strokes', of.strokesPerMinute],
      η: ['Share delivered', 'percent', of.deliveredPercent ?? pumpSlipPercent],
    },
    compute: ({ d, s, n, η }) => (Math.PI / 4) * d ** 2 * s * n * (η / 100),
    source: 'feed-pump',
    holds: 'Single-acting pump; worn valves deliver less',
  });

/** Cold water, kg/L. */
const coldKgPerL = 0.998_2;

/** A volume of cold water in a minute as weight in an hour. */
export const feedByWeight = (sweptMm3PerMin: number): Line =>
  work({
    result: ['F', 'Feed by weight', 'massRate'],
    formula: '{q}·{ρ}',
    terms: {
      q: ['The pump delivers', 'sweptRate', sweptMm3PerMin],
      ρ: ['Cold water, kg in a litre', 'waterDensity', coldKgPerL],
    },
    compute: ({ q, ρ }) => (q * 60 * ρ) / 1e6,
    source: 'geometry',
    holds: 'Water at 20 °C',
  });

/** How much more than is evaporated a feed should deliver. */
export const feedMargin = 1.5;

/** Feed wanted for the steam made. */
export const feedWanted = (steamKgPerH: number): Line =>
  work({
    result: ['F_w', 'Feed wanted', 'massRate'],
    formula: '1.5·{W}',
    terms: { W: ['Steam made', 'massRate', steamKgPerH] },
    compute: ({ W }) => feedMargin * W,
    source: 'feed-margin',
    holds: 'Each means of feed by itself',
  });
