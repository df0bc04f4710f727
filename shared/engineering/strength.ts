import type { MaterialId } from '../boilers/boiler.ts';
import { atmospherePa, saturationTemperatureK } from './steam.ts';
import { paPerPsi } from './units.ts';

/**
 * Allowable stress of annealed copper, psi, by metal temperature, °F (Copper Development Association, Copper Tube
 * Handbook, rated pressures). Brazed work is always annealed. Straight lines between.
 */
const annealedCopper: readonly (readonly [fahrenheit: number, psi: number])[] = [
  [100, 6_000],
  [150, 5_100],
  [200, 4_900],
  [250, 4_800],
  [300, 4_700],
  [350, 4_000],
  [400, 3_000],
];

/**
 * Allowable stress of annealed copper, Pa, at a metal temperature; null above 400 °F (477.6 K), where none is published.
 * Below 100 °F the figure for 100 °F holds.
 */
export function annealedCopperStressPa(temperatureK: number): number | null {
  // To a millionth of a degree, so that a figure on the table is found there however it was converted.
  const fahrenheit = Math.round((temperatureK * 1.8 - 459.67) * 1e6) / 1e6;
  const [first] = annealedCopper;
  if (first === undefined || Number.isNaN(fahrenheit)) return null;
  if (fahrenheit <= first[0]) return first[1] * paPerPsi;
  for (const [index, [right, high]] of annealedCopper.entries()) {
    const before = annealedCopper[index - 1];
    if (before !== undefined && fahrenheit <= right) {
      const share = (fahrenheit - before[0]) / (right - before[0]);
      return (before[1] + (high - before[1]) * share) * paPerPsi;
    }
  }
  return null;
}

/**
 * Allowable stress, Pa, of metal at the temperature of steam at this working pressure (gauge, Pa); null where none is
 * published here: brass, and copper hotter than 400 °F. Steel and stainless are from memory: mild steel 95 MPa, type
 * 304 110 MPa.
 */
export function allowableStressPa(material: MaterialId, workingPa: number): number | null {
  if (material === 'copper' || material === 'copper-brass') {
    return annealedCopperStressPa(saturationTemperatureK(workingPa + atmospherePa));
  }
  if (material === 'steel') return 95_000_000;
  return material === 'stainless' ? 110_000_000 : null;
}

/** Barrel by its inside radius, any one unit of length: P = S·E·t/(R + 0.6 t) (ASME VIII-1 UG-27(c)(1)). */
export const cylinderPressurePa = (of: {
  insideRadius: number;
  thickness: number;
  stressPa: number;
  joint: number;
}): number => (of.stressPa * of.joint * of.thickness) / (of.insideRadius + 0.6 * of.thickness);

/** Thickness a barrel needs: t = P·R/(S·E − 0.6 P), in the unit of the radius (ASME VIII-1 UG-27(c)(1)). */
export const cylinderThickness = (of: {
  insideRadius: number;
  pressurePa: number;
  stressPa: number;
  joint: number;
}): number => (of.pressurePa * of.insideRadius) / (of.stressPa * of.joint - 0.6 * of.pressurePa);

/** Copper tube: P = 2·S·t/(D − 0.8 t), least wall and greatest outside diameter in one unit (ASME B31 form). */
export const tubePressurePa = (of: { outside: number; thickness: number; stressPa: number }): number =>
  (2 * of.stressPa * of.thickness) / (of.outside - 0.8 * of.thickness);

/** Trade's older rule takes a brazed longitudinal joint at this much of the plate. */
const jointEfficiency = 0.8;

/** Barrel by its outside diameter, with the joint efficiency of a brazed longitudinal seam. */
export const barrelPressurePa = (of: { outsideMm: number; thicknessMm: number; stressPa: number }): number =>
  cylinderPressurePa({
    insideRadius: of.outsideMm / 2 - of.thicknessMm,
    thickness: of.thicknessMm,
    stressPa: of.stressPa,
    joint: jointEfficiency,
  });

const elasticPa: Record<MaterialId, readonly [youngPa: number, poisson: number]> = {
  copper: [117e9, 0.34],
  'copper-brass': [117e9, 0.34],
  brass: [105e9, 0.34],
  steel: [200e9, 0.3],
  stainless: [190e9, 0.3],
};

/**
 * Flue, outside pressure: the less of yield, 2 S t/D, and a third of a long tube's elastic collapse,
 * 2E/(1 − ν²)(t/D)³ (Roark). A short flue stands more; this errs on the low side.
 */
export function fluePressurePa(of: {
  insideMm: number;
  thicknessMm: number;
  stressPa: number;
  material: MaterialId;
}): number {
  const outsideMm = of.insideMm + 2 * of.thicknessMm;
  const [young, poisson] = elasticPa[of.material];
  const slenderness = of.thicknessMm / outsideMm;
  const collapse = ((2 * young) / (1 - poisson ** 2)) * slenderness ** 3;
  return Math.min(2 * of.stressPa * slenderness, collapse / 3);
}

/** Flat plate on square-pitched stays: P = t² S C/p², C 2.1 (ASME I PG-46). */
export const stayedPlatePressurePa = (of: {
  pitchMm: number;
  thicknessMm: number;
  stressPa: number;
}): number => (of.thicknessMm ** 2 * of.stressPa * 2.1) / of.pitchMm ** 2;
