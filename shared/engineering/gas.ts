import { atmospherePa } from './steam.ts';
import { work } from './working.ts';
import type { Line } from './working.ts';

interface GasSpec {
  label: string;
  /** MJ/kg, net and gross. */
  netMjPerKg: number;
  grossMjPerKg: number;
  /** kg/kmol. */
  molarMass: number;
  /** Ratio of specific heats. */
  exponent: number;
  /** Of air, at 15 °C. */
  relativeDensity: number;
  /** MJ/m³ gross at 15 °C, EN 437. */
  grossMjPerM3: number;
  /** Molecules of oxygen that one of the gas burns with, and of carbon dioxide it makes. */
  oxygen: number;
  carbonDioxide: number;
}

export const gases = {
  propane: {
    label: 'Propane',
    netMjPerKg: 46.35,
    grossMjPerKg: 50.43,
    molarMass: 44.097,
    exponent: 1.13,
    relativeDensity: 1.55,
    grossMjPerM3: 95.65,
    oxygen: 5,
    carbonDioxide: 3,
  },
  butane: {
    label: 'Butane',
    netMjPerKg: 45.74,
    grossMjPerKg: 49.62,
    molarMass: 58.123,
    exponent: 1.1,
    relativeDensity: 2.075,
    grossMjPerM3: 125.81,
    oxygen: 6.5,
    carbonDioxide: 4,
  },
} as const satisfies Record<string, GasSpec>;
export type GasId = keyof typeof gases;

/** J/(kmol·K). */
const molarConstant = 8_314.46;
/** Gas and air at 15 °C. */
const roomK = 288.15;
/** kg/m³ at 15 °C and one atmosphere. */
const airKgPerM3 = 1.225;

const gasConstant = (gas: GasId): number => molarConstant / gases[gas].molarMass;

/** Gauge pressure, Pa, above which a jet is choked: the flow then goes with the pressure alone. */
export const chokedAbovePa = (gas: GasId): number => {
  const k = gases[gas].exponent;
  return atmospherePa * (((k + 1) / 2) ** (k / (k - 1)) - 1);
};

/** Up to this gauge pressure the gas hardly expands in the jet, and the orifice law of gas burners holds. */
const lowPressurePa = 10_000;

export interface JetInput {
  gas: GasId;
  jetMm: number;
  pressurePa: number;
  /** Coefficient of discharge: 0.8 to 0.9 for a drilled jet. */
  discharge: number;
}

/** Gas by the orifice law of burners, m³/h. */
export const orificeFlow = (of: {
  jetMm: number;
  pressurePa: number;
  relativeDensity: number;
  discharge: number;
}): Line =>
  work({
    result: ['Q', 'Gas through the jet', 'gasRate'],
    formula: '0.0361·{C}·{d}²·({p} / {s})^0.5',
    terms: {
      C: ['Coefficient of discharge', 'ratio', of.discharge],
      d: ['Jet', 'length', of.jetMm],
      p: ['Gas pressure', 'gasPressure', of.pressurePa],
      s: ['Density of the gas, air being 1', 'ratio', of.relativeDensity],
    },
    compute: ({ C, d, p, s }) => 0.036_1 * C * d ** 2 * Math.sqrt(p / 100 / s),
    source: 'gas-orifice',
    holds: 'Up to 100 mbar; d in mm, p in mbar',
    units: 'metric',
  });

/** Gas through a choked jet, g/h. */
export const chokedFlow = ({ gas, jetMm, pressurePa, discharge }: JetInput): Line =>
  work({
    result: ['m', 'Gas through the jet', 'fuelRate'],
    formula: '{C}·π / 4·{d}²·{p_0}·({k} / ({R}·{T})·(2 / ({k} + 1))^(({k} + 1) / ({k} − 1)))^0.5',
    terms: {
      C: ['Coefficient of discharge', 'ratio', discharge],
      d: ['Jet', 'length', jetMm],
      p_0: ['Gas pressure, absolute', 'absolutePressure', pressurePa + atmospherePa],
      k: ['Ratio of specific heats', 'ratio', gases[gas].exponent],
      R: ['Gas constant', 'gasConstant', gasConstant(gas)],
      T: ['Temperature of the gas', 'absoluteTemperature', roomK],
    },
    compute: ({ C, d, p_0, k, R, T }) =>
      ((C * Math.PI) / 4) *
      (d / 1_000) ** 2 *
      p_0 *
      Math.sqrt((k / (R * T)) * (2 / (k + 1)) ** ((k + 1) / (k - 1))) *
      3.6e6,
    source: 'gas-choked',
    holds: 'Pressure at which the jet is choked, about 0.75 bar gauge, and above; gas at 15 °C',
  });

/** Gas through a jet that is neither at low pressure nor choked, g/h. */
const expandingFlow = ({ gas, jetMm, pressurePa, discharge }: JetInput): Line =>
  work({
    result: ['m', 'Gas through the jet', 'fuelRate'],
    formula: '{C}·π / 4·{d}²·{p_0}·(2·{k} / (({k} − 1)·{R}·{T})·({r}^(2 / {k}) − {r}^(({k} + 1) / {k})))^0.5',
    terms: {
      C: ['Coefficient of discharge', 'ratio', discharge],
      d: ['Jet', 'length', jetMm],
      p_0: ['Gas pressure, absolute', 'absolutePressure', pressurePa + atmospherePa],
      k: ['Ratio of specific heats', 'ratio', gases[gas].exponent],
      R: ['Gas constant', 'gasConstant', gasConstant(gas)],
      T: ['Temperature of the gas', 'absoluteTemperature', roomK],
      r: ['Atmosphere over gas pressure', 'ratio', atmospherePa / (pressurePa + atmospherePa)],
    },
    compute: ({ C, d, p_0, k, R, T, r }) =>
      ((C * Math.PI) / 4) *
      (d / 1_000) ** 2 *
      p_0 *
      Math.sqrt(((2 * k) / ((k - 1) * R * T)) * (r ** (2 / k) - r ** ((k + 1) / k))) *
      3.6e6,
    source: 'gas-choked',
    holds: 'Between 100 mbar and the pressure at which the jet is choked; gas at 15 °C',
  });

/** Gas a jet passes, by whichever law holds at its pressure, always ending in g/h. */
export function jetFlow(of: JetInput): readonly Line[] {
  if (of.pressurePa >= chokedAbovePa(of.gas)) return [chokedFlow(of)];
  if (of.pressurePa > lowPressurePa) return [expandingFlow(of)];
  const { relativeDensity } = gases[of.gas];
  const volume = orificeFlow({ ...of, relativeDensity });
  const mass = work({
    result: ['m', 'Gas by weight', 'fuelRate'],
    formula: '{Q}·{s}·{ρ}',
    terms: {
      Q: ['Gas through the jet', 'gasRate', volume.result.value],
      s: ['Density of the gas, air being 1', 'ratio', relativeDensity],
      ρ: ['Density of air', 'gasDensity', airKgPerM3],
    },
    compute: ({ Q, s, ρ }) => Q * s * ρ * 1_000,
    source: 'geometry',
    holds: 'At 15 °C',
  });
  return [volume, mass];
}

/** Heat of a flow of gas. */
export const gasHeat = (gas: GasId, gasGPerH: number): Line =>
  work({
    result: ['H', 'Heat of the flame, net', 'power'],
    formula: '{m}·{N}',
    terms: {
      m: ['Gas', 'fuelRate', gasGPerH],
      N: [`Net heating value of ${gases[gas].label.toLowerCase()}`, 'heatingValue', gases[gas].netMjPerKg],
    },
    compute: ({ m, N }) => ((m / 1_000) * N) / 3.6,
    source: 'heating-values',
    holds: 'Gas burnt whole',
  });

/** Oxygen in air by volume. */
const oxygenShare = 0.209_5;

/** Air that a volume of gas burns with, m³ for each m³. */
export const airForGas = (gas: GasId): Line =>
  work({
    result: ['a', 'Air to burn one volume of gas', 'ratio'],
    formula: '{o} / 0.2095',
    terms: { o: ['Oxygen to burn one volume', 'ratio', gases[gas].oxygen] },
    compute: ({ o }) => o / oxygenShare,
    source: 'gas-air',
    holds: 'Exact burning; a burner needs a fifth to a half more',
  });

/** Gas as a volume at 15 °C, from its weight. */
export const gasVolume = (gas: GasId, gasGPerH: number): Line =>
  work({
    result: ['Q', 'Gas at the flame', 'gasRate'],
    formula: '{m} / ({s}·{ρ})',
    terms: {
      m: ['Gas', 'fuelRate', gasGPerH],
      s: ['Density of the gas, air being 1', 'ratio', gases[gas].relativeDensity],
      ρ: ['Density of air', 'gasDensity', airKgPerM3],
    },
    compute: ({ m, s, ρ }) => m / 1_000 / (s * ρ),
    source: 'geometry',
    holds: 'At 15 °C and one atmosphere',
  });

/** Air burnt in an hour. */
export const burningAir = (gas: GasId, gasM3PerH: number): Line =>
  work({
    result: ['A', 'Air the flame burns', 'gasRate'],
    formula: '{Q}·{a}',
    terms: {
      Q: ['Gas at the flame', 'gasRate', gasM3PerH],
      a: ['Air to burn one volume', 'ratio', airForGas(gas).result.value],
    },
    compute: ({ Q, a }) => Q * a,
    source: 'gas-air',
    holds: 'Exact burning',
  });

/** Carbon dioxide, as a share of the air, that a workplace may reach over eight hours; from memory. */
const carbonDioxideLimit = 0.005;

/** Fresh air that keeps the carbon dioxide of a good flame under the workplace limit, if it burns indoors. */
export const freshAir = (gas: GasId, gasM3PerH: number): Line =>
  work({
    result: ['A_f', 'Fresh air a room needs for it', 'gasRate'],
    formula: '{Q}·{c} / 0.005',
    terms: {
      Q: ['Gas at the flame', 'gasRate', gasM3PerH],
      c: ['Carbon dioxide from one volume', 'ratio', gases[gas].carbonDioxide],
    },
    compute: ({ Q, c }) => (Q * c) / carbonDioxideLimit,
    source: 'co-limits',
    holds:
      'Carbon dioxide under 0.5 % with a good flame. A bad flame makes carbon monoxide, and no airing is enough',
  });

/** Wobbe number, gross: gases of one number give one heat through one jet. */
export const wobbe = (gas: GasId): Line =>
  work({
    result: ['W', 'Wobbe number, gross', 'gasHeat'],
    formula: '{H} / {s}^0.5',
    terms: {
      H: ['Gross heating value', 'gasHeat', gases[gas].grossMjPerM3],
      s: ['Density of the gas, air being 1', 'ratio', gases[gas].relativeDensity],
    },
    compute: ({ H, s }) => H / Math.sqrt(s),
    source: 'wobbe',
    holds: 'At 15 °C and one atmosphere',
  });

/** Workplace limits of carbon monoxide, ppm: over eight hours, and over fifteen minutes. */
export const carbonMonoxideLimits = { eightHoursPpm: 20, fifteenMinutesPpm: 100 } as const;

/** When an alarm to EN 50291-1 sounds: minutes, least and most; null where it must not before two hours. */
export const alarmTimes = [
  { ppm: 30, least: 120, most: null },
  { ppm: 50, least: 60, most: 90 },
  { ppm: 100, least: 10, most: 40 },
  { ppm: 300, least: 0, most: 3 },
] as const;
