import type { EngineFacts } from '../engines/engine.ts';
import type { Band, BandLines } from './evaporation.ts';
import { saturatedAt } from './steam.ts';
import { work } from './working.ts';
import type { Line } from './working.ts';

/** Steam that condenses in the cylinder, per cent more than the dry volume asks for; common practice. */
export const condensationPercent: Band = { low: 20, high: 50 };

/** Volume the pistons sweep in a minute. */
export const sweptVolume = (engine: EngineFacts): Line =>
  work({
    result: ['V', 'Swept by the pistons', 'sweptRate'],
    formula: 'π / 4·{d}²·{L}·{a}·{z}·{n}',
    terms: {
      d: ['Bore', 'length', engine.boreMm],
      L: ['Stroke', 'length', engine.strokeMm],
      a: ['Ends that take steam', 'count', engine.action === 'double' ? 2 : 1],
      z: ['Cylinders', 'count', engine.cylinders],
      n: ['Speed', 'speed', engine.speedRpm],
    },
    compute: ({ d, L, a, z, n }) => (Math.PI / 4) * d ** 2 * L * a * z * n,
    source: 'geometry',
    holds: 'Of a compound, the high-pressure cylinders only; piston rod not taken off',
  });

const steamVolumeAt = (pressurePa: number): number => saturatedAt(pressurePa).steam.specificVolume;

const demandLine = (engine: EngineFacts, label: string, symbol: string, condensation: number): Line =>
  work({
    result: [symbol, label, 'massRate'],
    formula: '{V} / {v_g}·{x}·(1 + {c})',
    terms: {
      V: ['Swept by the pistons', 'sweptRate', sweptVolume(engine).result.value],
      v_g: ['Volume of the steam', 'specificVolume', steamVolumeAt(engine.pressurePa)],
      x: ['Cut-off', 'percent', engine.cutOffPercent],
      c: ['Condensation', 'percent', condensation],
    },
    compute: ({ V, v_g, x, c }) => ((V * 60e-9) / v_g) * (x / 100) * (1 + c / 100),
    source: 'engine-demand',
    holds: 'Dry saturated steam at the engine; clearance not counted',
  });

/** Steam an engine takes, as a band over the condensation. */
export const engineDemand = (engine: EngineFacts, condensation: Band = condensationPercent): BandLines => ({
  low: demandLine(engine, 'Least the engine takes', 'D_low', condensation.low),
  high: demandLine(engine, 'Most the engine takes', 'D_high', condensation.high),
});

/** Whether a boiler keeps up, in words. */
export const matches = {
  margin: 'Drives it with margin',
  just: 'Just drives it',
  doubt: 'May not keep up: the bands overlap',
  short: 'Will not keep up',
} as const;
export type MatchId = keyof typeof matches;

/** How much more than the demand counts as margin. */
const marginRatio = 1.25;

export interface EngineMatch {
  id: MatchId;
  /** Steam made over steam taken, worst and best. */
  ratio: BandLines;
  /** The fastest the engine could be kept at, rpm, worst and best. */
  speed: BandLines;
}

const ratioLine = (word: string, symbol: string, made: number, taken: number): Line =>
  work({
    result: [symbol, `Made over taken, at ${word}`, 'ratio'],
    formula: '{W} / {D}',
    terms: {
      W: ['Steam made', 'massRate', made],
      D: ['Steam taken', 'massRate', taken],
    },
    compute: ({ W, D }) => W / D,
    source: 'engine-demand',
    holds: 'Steady running; water in hand carries a short spell',
  });

/** Steam made against steam taken. */
export function matchEngine(engine: EngineFacts, steamKgPerH: Band, demand: Band): EngineMatch {
  const low = ratioLine('worst', 'm_low', steamKgPerH.low, demand.high);
  const high = ratioLine('best', 'm_high', steamKgPerH.high, demand.low);
  const speed = (word: string, symbol: string, { result }: Line): Line =>
    work({
      result: [symbol, `Fastest it could keep, at ${word}`, 'speed'],
      formula: '{n}·{m}',
      terms: {
        n: ['Speed asked for', 'speed', engine.speedRpm],
        m: ['Made over taken', 'ratio', result.value],
      },
      compute: ({ n, m }) => n * m,
      source: 'engine-demand',
      holds: 'At the same cut-off and pressure',
    });
  return {
    id: matchOf(low.result.value, high.result.value),
    ratio: { low, high },
    speed: { low: speed('worst', 'n_low', low), high: speed('best', 'n_high', high) },
  };
}

function matchOf(low: number, high: number): MatchId {
  if (low >= marginRatio) return 'margin';
  if (low >= 1) return 'just';
  return high < 1 ? 'short' : 'doubt';
}
