import { atmospherePa } from './steam.ts';
import { work } from './working.ts';
import type { Line } from './working.ts';

/** Share of the bore's area that each class of lift opens: D/24, D/12, D/4 (Indian Boiler Regulations). */
export const liftShares = { ordinary: 1 / 6, high: 1 / 3, full: 1 } as const;
export type LiftId = keyof typeof liftShares;
export const liftLabels: Readonly<Record<LiftId, string>> = {
  ordinary: 'Ordinary: a twenty-fourth of the bore',
  high: 'High: a twelfth of the bore',
  full: 'Full: a quarter of the bore',
};

/** How far above working pressure full fire may take it with the valve lifting, per cent. */
export const accumulationPercent = 10;
/** How far a valve's lift may be from its set pressure, per cent; common practice. */
export const liftTolerancePercent = 3;
/** How far below its lift a valve may reseat, per cent (Indian Boiler Regulations, regulation 295). */
export const reseatPercent = 10;

/** Pressure that full fire may reach with the valve lifting: working pressure and a tenth (UK hobby code, IBR). */
export const mostWithValveLiftingPa = (workingPa: number): number =>
  (workingPa * (100 + accumulationPercent)) / 100;

/** The same, line by line. */
export const accumulationLimit = (workingPa: number): Line =>
  work({
    result: ['P_a', 'Most with the valve lifting and full fire', 'pressure'],
    formula: '1.1·{P}',
    terms: { P: ['Working pressure', 'pressure', workingPa] },
    compute: ({ P }) => mostWithValveLiftingPa(P),
    source: 'accumulation',
    holds: 'Stop valve and feed shut',
  });

/** Least pressure at which it should have shut again. */
export const reseatLimit = (setPa: number): Line =>
  work({
    result: ['P_r', 'Should have shut again by', 'pressure'],
    formula: '0.9·{P}',
    terms: { P: ['Set pressure', 'pressure', setPa] },
    compute: ({ P }) => (P * (100 - reseatPercent)) / 100,
    source: 'valve-reseat',
    holds: 'Bore under 32 mm, or set at 2 bar or less',
  });

/** Area through which a valve passes steam: its bore, or the part of it that its lift opens. */
export const valveArea = (boreMm: number, lift: LiftId): Line =>
  work({
    result: ['A', 'Area the lift opens', 'area'],
    formula: 'π·{d}² / 4·{s}',
    terms: { d: ['Bore', 'length', boreMm], s: ['Share that the lift opens', 'ratio', liftShares[lift]] },
    compute: ({ d, s }) => ((Math.PI * d ** 2) / 4) * s,
    source: 'lift-class',
    holds: 'Spring-loaded valves of no measured lift',
  });

/**
 * Steam that a nozzle passes, kg/h: Napier's rule.
 * @param of.pressurePaAbs at the valve, absolute: its set pressure and the rise allowed.
 * @throws RangeError unless both are positive.
 */
export function napier(of: { areaMm2: number; pressurePaAbs: number }): Line {
  if (!(of.areaMm2 > 0 && of.pressurePaAbs > 0)) throw new RangeError('Area and pressure must be positive');
  return work({
    result: ['W', 'The valve passes', 'massRate'],
    formula: '{A}·{P} / 1.905',
    terms: {
      A: ['Area', 'area', of.areaMm2],
      P: ['Pressure at the valve, absolute', 'absolutePressure', of.pressurePaAbs],
    },
    compute: ({ A, P }) => (A * P) / 100_000 / 1.905,
    source: 'napier',
    holds:
      'Dry steam, A in mm², P in bar; the same as 51.5·A·P in pounds, inches and hours. The test under full fire overrules it',
    units: 'metric',
  });
}

export const napierKgPerH = (of: { areaMm2: number; pressurePaAbs: number }): number =>
  napier(of).result.value;

/** Isentropic exponent of dry saturated steam. */
const steamExponent = 1.135;

/** Steam by ISO 4126-1, as a cross-check of Napier: `0.2883·C·A·√(P/v)`. */
export const isoCapacity = (of: { areaMm2: number; pressurePaAbs: number; volumeM3PerKg: number }): Line =>
  work({
    result: ['Q', 'By ISO 4126-1', 'massRate'],
    formula: '0.2883·3.948·({k}·(2 / ({k} + 1))^(({k} + 1) / ({k} − 1)))^0.5·{A}·({P} / {v})^0.5',
    terms: {
      k: ['Isentropic exponent', 'ratio', steamExponent],
      A: ['Area', 'area', of.areaMm2],
      P: ['Pressure at the valve, absolute', 'absolutePressure', of.pressurePaAbs],
      v: ['Volume of the steam', 'specificVolume', of.volumeM3PerKg],
    },
    compute: ({ k, A, P, v }) =>
      0.288_3 * 3.948 * Math.sqrt(k * (2 / (k + 1)) ** ((k + 1) / (k - 1))) * A * Math.sqrt(P / 100_000 / v),
    source: 'valve-iso',
    holds: 'Dry saturated steam; coefficient of discharge 1',
    units: 'metric',
  });

/** What a valve of one bore passes at its accumulation, with each line. */
export function valveCapacityLines(of: { boreMm: number; lift: LiftId; setPa: number }): {
  limit: Line;
  area: Line;
  passes: Line;
} {
  const limit = accumulationLimit(of.setPa);
  const area = valveArea(of.boreMm, of.lift);
  const passes = napier({
    areaMm2: area.result.value,
    pressurePaAbs: limit.result.value + atmospherePa,
  });
  return { limit, area, passes };
}
