import { paPerPsi } from './units.ts';
import { outOfRange, work } from './working.ts';
import type { Answer, Line } from './working.ts';

/** How much of the plate a lengthwise seam is reckoned to carry. */
export const seamEfficiencies = {
  seamless: { label: 'Drawn tube, no seam', efficiency: 1 },
  brazed: { label: 'Brazed seam', efficiency: 0.8 },
  welded: { label: 'Welded seam, not radiographed', efficiency: 0.7 },
  riveted: { label: 'Single-riveted seam', efficiency: 0.55 },
  unknown: { label: 'Not known', efficiency: 0.55 },
} as const;
export type SeamId = keyof typeof seamEfficiencies;

/**
 * Pressure a barrel stands by its inside radius.
 *
 * @param of.insideRadiusMm and `thicknessMm`, mm (any one unit of length serves); `joint` is in (0, 1].
 */
export function barrelPressure(of: {
  insideRadiusMm: number;
  thicknessMm: number;
  stressPa: number;
  joint: number;
}): Answer {
  if (of.thicknessMm > of.insideRadiusMm / 2)
    return outOfRange('The wall is more than half the inside radius: too thick for the thin-shell formula.');
  return work({
    result: ['P', 'The barrel stands', 'pressure'],
    formula: '{S}·{E}·{t} / ({R} + 0.6·{t})',
    terms: {
      S: ['Allowable stress', 'stress', of.stressPa],
      E: ['Seam efficiency', 'ratio', of.joint],
      t: ['Wall', 'length', of.thicknessMm],
      R: ['Inside radius', 'length', of.insideRadiusMm],
    },
    compute: ({ S, E, t, R }) => (S * E * t) / (R + 0.6 * t),
    source: 'shell-ug27',
    holds: 'Wall up to half the inside radius',
  });
}

/** Wall a barrel needs for a pressure. Refused where the pressure is beyond 0.385 of stress times efficiency. */
export function barrelThickness(of: {
  insideRadiusMm: number;
  pressurePa: number;
  stressPa: number;
  joint: number;
}): Answer {
  if (of.pressurePa > 0.385 * of.stressPa * of.joint)
    return outOfRange('The pressure is beyond what the thin-shell formula holds for.');
  return work({
    result: ['t', 'Wall the barrel needs', 'length'],
    formula: '{P}·{R} / ({S}·{E} − 0.6·{P})',
    terms: {
      P: ['Pressure', 'pressure', of.pressurePa],
      R: ['Inside radius', 'length', of.insideRadiusMm],
      S: ['Allowable stress', 'stress', of.stressPa],
      E: ['Seam efficiency', 'ratio', of.joint],
    },
    compute: ({ P, R, S, E }) => (P * R) / (S * E - 0.6 * P),
    source: 'shell-ug27',
    holds: 'Pressure up to 0.385 of stress times efficiency; nothing added for wear',
  });
}

/** What the trade’s older rule takes copper at. */
const copperUltimatePa = 25_000 * paPerPsi;
const tradeFactor = 8;
const tradeJoint = 0.8;

/** Pressure a copper barrel stands by the trade’s older rule, t = P·D·8 / (2·UTS·0.8), turned about. */
export const tradeBarrelPressure = (of: { outsideMm: number; thicknessMm: number }): Line =>
  work({
    result: ['P', 'The barrel stands, by the trade’s older rule', 'pressure'],
    formula: '2·{U}·{E}·{t} / ({D}·{F})',
    terms: {
      U: ['Breaking stress of copper', 'stress', copperUltimatePa],
      E: ['Joint', 'ratio', tradeJoint],
      t: ['Wall', 'length', of.thicknessMm],
      D: ['Outside diameter', 'length', of.outsideMm],
      F: ['Factor', 'ratio', tradeFactor],
    },
    compute: ({ U, E, t, D, F }) => (2 * U * E * t) / (D * F),
    source: 'trade-barrel',
    holds: 'Copper barrels of model boilers',
  });

/** Pressure a tube stands from inside: least wall and greatest outside diameter. */
export function tubePressure(of: { outsideMm: number; thicknessMm: number; stressPa: number }): Answer {
  if (of.thicknessMm * 2 >= of.outsideMm) return outOfRange('The wall leaves no bore in the tube.');
  return work({
    result: ['P', 'The tubes stand, from inside', 'pressure'],
    formula: '2·{S}·{t} / ({D} − 0.8·{t})',
    terms: {
      S: ['Allowable stress', 'stress', of.stressPa],
      t: ['Wall', 'length', of.thicknessMm],
      D: ['Outside diameter', 'length', of.outsideMm],
    },
    compute: ({ S, t, D }) => (2 * S * t) / (D - 0.8 * t),
    source: 'tube-b31',
    holds: 'Drawn tube with pressure inside',
  });
}
