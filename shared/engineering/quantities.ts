import {
  celsiusZeroK,
  fahrenheitZeroK,
  joulesPerBtu,
  kelvinPerFahrenheit,
  kgPerPound,
  kmPerMile,
  litresPerPint,
  mmPerInch,
  newtonsPerPoundForce,
  paPerBar,
  paPerPsi,
} from './units.ts';

/** A way to write a quantity down: how much of the unit it is kept in makes one of this. */
export interface Unit {
  unit: string;
  per: number;
  /** What the scale's nought is in the unit it is kept in: temperatures only. */
  zero?: number;
}

/** A quantity: the SI-based unit it is kept in, what one of that is in coherent SI, and how each person writes it. */
export interface QuantitySpec {
  base: string;
  si: number;
  metric: Unit;
  imperial: Unit;
}

const same = (unit: string, si = 1, base = unit): QuantitySpec => ({
  base,
  si,
  metric: { unit, per: 1 },
  imperial: { unit, per: 1 },
});
const inch2 = mmPerInch ** 2;
const foot = (12 * mmPerInch) / 1_000;
const pressureUnits = {
  base: 'Pa',
  si: 1,
  metric: { unit: 'bar', per: paPerBar },
  imperial: { unit: 'psi', per: paPerPsi },
};

/** Every quantity the workings deal in. Lengths are kept in mm, water in litres, steam in kg/h, the rest in plain SI. */
export const quantities = {
  pressure: pressureUnits,
  absolutePressure: {
    ...pressureUnits,
    metric: { unit: 'bar abs', per: paPerBar },
    imperial: { unit: 'psi abs', per: paPerPsi },
  },
  gasPressure: { ...pressureUnits, metric: { unit: 'mbar', per: 100 } },
  stress: { ...pressureUnits, metric: { unit: 'N/mm²', per: 1e6 } },
  length: {
    base: 'mm',
    si: 1e-3,
    metric: { unit: 'mm', per: 1 },
    imperial: { unit: 'in', per: mmPerInch },
  },
  area: { base: 'mm²', si: 1e-6, metric: { unit: 'mm²', per: 1 }, imperial: { unit: 'in²', per: inch2 } },
  surface: { base: 'm²', si: 1, metric: { unit: 'm²', per: 1 }, imperial: { unit: 'ft²', per: foot ** 2 } },
  volume: {
    base: 'L',
    si: 1e-3,
    metric: { unit: 'litres', per: 1 },
    imperial: { unit: 'pints', per: litresPerPint },
  },
  sweptRate: {
    base: 'mm³/min',
    si: 1e-9 / 60,
    metric: { unit: 'cm³/min', per: 1_000 },
    imperial: { unit: 'in³/min', per: mmPerInch ** 3 },
  },
  mass: { base: 'kg', si: 1, metric: { unit: 'kg', per: 1 }, imperial: { unit: 'lb', per: kgPerPound } },
  smallMass: same('g', 1e-3),
  massRate: {
    base: 'kg/h',
    si: 1 / 3_600,
    metric: { unit: 'kg/h', per: 1 },
    imperial: { unit: 'lb/h', per: kgPerPound },
  },
  fuelRate: same('g/h', 1e-3 / 3_600),
  steamingRate: {
    base: 'kg/h·m²',
    si: 1 / 3_600,
    metric: { unit: 'kg/h·m²', per: 1 },
    imperial: { unit: 'lb/h·ft²', per: kgPerPound / foot ** 2 },
  },
  gasRate: {
    base: 'm³/h',
    si: 1 / 3_600,
    metric: { unit: 'm³/h', per: 1 },
    imperial: { unit: 'ft³/h', per: foot ** 3 },
  },
  temperature: {
    base: 'K',
    si: 1,
    metric: { unit: '°C', per: 1, zero: celsiusZeroK },
    imperial: { unit: '°F', per: kelvinPerFahrenheit, zero: fahrenheitZeroK },
  },
  temperatureRise: {
    base: 'K',
    si: 1,
    metric: { unit: '°C', per: 1 },
    imperial: { unit: '°F', per: kelvinPerFahrenheit },
  },
  absoluteTemperature: same('K'),
  enthalpy: {
    base: 'kJ/kg',
    si: 1_000,
    metric: { unit: 'kJ/kg', per: 1 },
    imperial: { unit: 'BTU/lb', per: joulesPerBtu / 1_000 / kgPerPound },
  },
  entropy: {
    base: 'kJ/kg·K',
    si: 1_000,
    metric: { unit: 'kJ/kg·K', per: 1 },
    imperial: { unit: 'BTU/lb·°F', per: joulesPerBtu / 1_000 / kgPerPound / kelvinPerFahrenheit },
  },
  specificVolume: {
    base: 'm³/kg',
    si: 1,
    metric: { unit: 'm³/kg', per: 1 },
    imperial: { unit: 'ft³/lb', per: foot ** 3 / kgPerPound },
  },
  heatingValue: {
    base: 'MJ/kg',
    si: 1e6,
    metric: { unit: 'MJ/kg', per: 1 },
    imperial: { unit: 'BTU/lb', per: joulesPerBtu / 1e6 / kgPerPound },
  },
  gasHeat: same('MJ/m³', 1e6),
  power: {
    base: 'kW',
    si: 1_000,
    metric: { unit: 'kW', per: 1 },
    imperial: { unit: 'BTU/h', per: joulesPerBtu / 3_600 / 1_000 },
  },
  energy: {
    base: 'J',
    si: 1,
    metric: { unit: 'J', per: 1 },
    imperial: { unit: 'ft·lbf', per: newtonsPerPoundForce * foot },
  },
  force: {
    base: 'N',
    si: 1,
    metric: { unit: 'N', per: 1 },
    imperial: { unit: 'lbf', per: newtonsPerPoundForce },
  },
  waterDensity: same('kg/L', 1_000),
  gasDensity: same('kg/m³'),
  gasConstant: same('J/kg·K'),
  waveSpeed: same('m/s'),
  microseconds: same('µs', 1e-6),
  distance: {
    base: 'km',
    si: 1_000,
    metric: { unit: 'km', per: 1 },
    imperial: { unit: 'miles', per: kmPerMile },
  },
  degrees: same('°', Math.PI / 180),
  speed: same('rpm', 1 / 60),
  strokes: same('strokes/min', 1 / 60),
  minutes: same('min', 60),
  months: same('months'),
  percent: same('%', 0.01),
  ppm: same('ppm'),
  count: same(''),
  ratio: same(''),
  threadsPerInch: same('tpi', 1_000 / mmPerInch),
  barLitres: same('bar·L', 100),
} as const satisfies Record<string, QuantitySpec>;
export type Quantity = keyof typeof quantities;

/** The two ways of measuring that a person may choose between. */
export type UnitSystem = 'imperial' | 'metric';

export const specOf = (quantity: Quantity): QuantitySpec => quantities[quantity];
export const unitOf = (quantity: Quantity, units: UnitSystem): string => specOf(quantity)[units].unit;

/** A kept figure as a person writes it. */
export function fromKept(quantity: Quantity, units: UnitSystem, value: number): number {
  const { per, zero = 0 } = specOf(quantity)[units];
  return (value - zero) / per;
}

/** A figure as a person writes it, in the unit it is kept in. Any one length typed in either unit comes to the same bits. */
export function toKept(quantity: Quantity, units: UnitSystem, value: number): number {
  const { per, zero = 0 } = specOf(quantity)[units];
  return Number((value * per + zero).toPrecision(12));
}

/** A kept figure in coherent SI, for a check of a formula by hand. */
export const toCoherentSi = (quantity: Quantity, value: number): number => value * specOf(quantity).si;

const locale = 'en-GB';

/** A number to so many significant figures, never with an exponent; a dash for what is no number. */
export const figureText = (value: number, significant = 4): string =>
  Number.isFinite(value)
    ? new Intl.NumberFormat(locale, { maximumSignificantDigits: significant }).format(value)
    : '–';

/** A kept figure with its unit, as a person writes it. */
export function quantityText(
  quantity: Quantity,
  units: UnitSystem,
  value: number,
  significant?: number,
): string {
  const unit = unitOf(quantity, units);
  const text = figureText(fromKept(quantity, units, value), significant);
  const isTight = unit === '' || unit === '°';
  return isTight ? `${text}${unit}` : `${text} ${unit}`;
}

/** Places after the point where a list wants its figures alike; the rest go by significant figures. */
const listPlaces: Partial<Record<Quantity, Record<UnitSystem, number>>> = {
  pressure: { imperial: 0, metric: 2 },
  length: { imperial: 3, metric: 1 },
  volume: { imperial: 2, metric: 2 },
  mass: { imperial: 1, metric: 1 },
  distance: { imperial: 0, metric: 0 },
};

/** A kept figure as it stands in a list of its like, with its unit. */
export function listedText(quantity: Quantity, units: UnitSystem, value: number): string {
  const digits = listPlaces[quantity]?.[units];
  if (digits === undefined || !Number.isFinite(value)) return quantityText(quantity, units, value);
  const figure = new Intl.NumberFormat(locale, { maximumFractionDigits: digits });
  return `${figure.format(fromKept(quantity, units, value))} ${unitOf(quantity, units)}`;
}
