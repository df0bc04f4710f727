import type { MaterialId } from '../boilers/boiler.ts';

const psi = 6_894.757_293;

/**
 * Allowable stress of annealed copper, by the gauge pressure of steam at the temperature it is published for
 * (250, 300, 350 and 400 °F: Copper Development Association tube handbook; saturation by steam table).
 */
const copperByPressure: readonly (readonly [pa: number, stressPa: number])[] = [
  [104_000, 4_800 * psi],
  [361_000, 4_700 * psi],
  [827_000, 4_000 * psi],
  [1_604_000, 3_000 * psi],
];

function between(table: readonly (readonly [number, number])[], at: number): number | null {
  const [first] = table;
  if (first === undefined || at <= first[0]) return first?.[1] ?? null;
  for (const [index, [right, high]] of table.entries()) {
    const before = table[index - 1];
    if (before !== undefined && at <= right)
      return before[1] + ((high - before[1]) * (at - before[0])) / (right - before[0]);
  }
  return null;
}

/**
 * Allowable stress, Pa, at the temperature of steam at this working pressure (gauge, Pa); null where none is published
 * here: brass, and copper above 16 bar. Steel and stainless are from memory: mild steel 95 MPa, type 304 110 MPa.
 */
export function allowableStressPa(material: MaterialId, workingPa: number): number | null {
  if (material === 'copper' || material === 'copper-brass') return between(copperByPressure, workingPa);
  if (material === 'steel') return 95_000_000;
  return material === 'stainless' ? 110_000_000 : null;
}

/** Trade's older rule takes a brazed longitudinal joint at this much of the plate. */
const jointEfficiency = 0.8;

/** Barrel, inside pressure: P = S·E·t/(R + 0.6 t), R the inside radius (ASME VIII-1 UG-27(c)). */
export const barrelPressurePa = (of: { outsideMm: number; thicknessMm: number; stressPa: number }): number =>
  (of.stressPa * jointEfficiency * of.thicknessMm) /
  (of.outsideMm / 2 - of.thicknessMm + 0.6 * of.thicknessMm);

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
