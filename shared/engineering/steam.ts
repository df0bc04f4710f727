import { region1, region2Ideal, region2Residual, region4 } from './steam-coefficients.ts';

/** Properties of water and steam by IAPWS R7-97(2012), the Industrial Formulation 1997. */

/** Specific gas constant of water, kJ/(kg·K). */
const gasConstant = 0.461526;
/** One standard atmosphere, Pa; gauge pressures here are above this. */
export const atmospherePa = 101_325;

const [n1, n2, n3, n4, n5, n6, n7, n8, n9, n10] = region4;

/**
 * Saturation pressure, Pa absolute (eq. 30).
 * @param temperatureK 273.15 to 647.096 K.
 * @throws RangeError outside it.
 */
export function saturationPressurePaAbs(temperatureK: number): number {
  if (!(temperatureK >= 273.15 && temperatureK <= 647.096))
    throw new RangeError('No saturation at that temperature');
  const theta = temperatureK + n9 / (temperatureK - n10);
  const a = theta ** 2 + n1 * theta + n2;
  const b = n3 * theta ** 2 + n4 * theta + n5;
  const c = n6 * theta ** 2 + n7 * theta + n8;
  return ((2 * c) / (-b + Math.sqrt(b ** 2 - 4 * a * c))) ** 4 * 1e6;
}

/**
 * Saturation temperature, K (eq. 31).
 * @param pressurePaAbs 611.213 Pa to 22.064 MPa absolute.
 * @throws RangeError outside it.
 */
export function saturationTemperatureK(pressurePaAbs: number): number {
  if (!(pressurePaAbs >= 611.213 && pressurePaAbs <= 22.064e6))
    throw new RangeError('No saturation at that pressure');
  const beta = (pressurePaAbs / 1e6) ** 0.25;
  const e = beta ** 2 + n3 * beta + n6;
  const f = n1 * beta ** 2 + n4 * beta + n7;
  const g = n2 * beta ** 2 + n5 * beta + n8;
  const d = (2 * g) / (-f - Math.sqrt(f ** 2 - 4 * e * g));
  return (n10 + d - Math.sqrt((n10 + d) ** 2 - 4 * (n9 + n10 * d))) / 2;
}

export interface Properties {
  /** m³/kg. */
  specificVolume: number;
  /** kJ/kg. */
  enthalpy: number;
  /** kJ/kg. */
  internalEnergy: number;
  /** kJ/(kg·K). */
  entropy: number;
  /** kJ/(kg·K), at constant pressure. */
  heatCapacity: number;
}

/** Water, region 1 (eq. 7). Callers keep to the region: up to 623.15 K and 100 MPa, below saturation temperature. */
export function waterAt(temperatureK: number, pressurePaAbs: number): Properties {
  const p = pressurePaAbs / 16.53e6;
  const t = 1386 / temperatureK;
  let [g, gp, gt, gtt] = [0, 0, 0, 0];
  for (const [i, j, n] of region1) {
    const [a, b] = [7.1 - p, t - 1.222];
    g += n * a ** i * b ** j;
    gp -= n * i * a ** (i - 1) * b ** j;
    gt += n * j * a ** i * b ** (j - 1);
    gtt += n * j * (j - 1) * a ** i * b ** (j - 2);
  }
  return propertiesFrom(temperatureK, pressurePaAbs, { t, g, pgp: p * gp, gt, gtt });
}

/** Steam, region 2 (eqs 15 to 17). Callers keep to the region: up to 1073.15 K, below saturation pressure. */
export function steamAt(temperatureK: number, pressurePaAbs: number): Properties {
  const p = pressurePaAbs / 1e6;
  const t = 540 / temperatureK;
  let [g, pgp, gt, gtt] = [Math.log(p), 1, 0, 0];
  for (const [j, n] of region2Ideal) {
    g += n * t ** j;
    gt += n * j * t ** (j - 1);
    gtt += n * j * (j - 1) * t ** (j - 2);
  }
  for (const [i, j, n] of region2Residual) {
    const b = t - 0.5;
    g += n * p ** i * b ** j;
    pgp += n * i * p ** i * b ** j;
    gt += n * j * p ** i * b ** (j - 1);
    gtt += n * j * (j - 1) * p ** i * b ** (j - 2);
  }
  return propertiesFrom(temperatureK, pressurePaAbs, { t, g, pgp, gt, gtt });
}

/** Table 3 of the release: properties from the reduced Gibbs energy and its derivatives. */
function propertiesFrom(
  temperatureK: number,
  pressurePaAbs: number,
  { t, g, pgp, gt, gtt }: Record<'t' | 'g' | 'pgp' | 'gt' | 'gtt', number>,
): Properties {
  const rt = gasConstant * temperatureK;
  return {
    specificVolume: (pgp * rt * 1_000) / pressurePaAbs,
    enthalpy: t * gt * rt,
    internalEnergy: rt * (t * gt - pgp),
    entropy: gasConstant * (t * gt - g),
    heatCapacity: -gasConstant * t ** 2 * gtt,
  };
}

/**
 * Water and steam in a boiler at a gauge pressure, with the atmosphere at 1.01325 bar.
 * @param pressurePa gauge; 0 to 16 MPa, where the two regions used here hold.
 * @throws RangeError outside it.
 */
export function saturatedAt(pressurePa: number): {
  temperatureK: number;
  water: Properties;
  steam: Properties;
} {
  if (!(pressurePa >= 0 && pressurePa <= 16e6)) throw new RangeError('Outside 0 to 160 bar');
  const pressurePaAbs = pressurePa + atmospherePa;
  const temperatureK = saturationTemperatureK(pressurePaAbs);
  return {
    temperatureK,
    water: waterAt(temperatureK, pressurePaAbs),
    steam: steamAt(temperatureK, pressurePaAbs),
  };
}
