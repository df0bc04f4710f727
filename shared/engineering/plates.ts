import { mmPerInch, paPerPsi } from './units.ts';
import { measureIt, outOfRange, work } from './working.ts';
import type { Answer, Line, Refusal } from './working.ts';

/** How stays end, and what PG-46 takes the plate at for it. */
export const stayEndings = {
  headed: { label: 'Screwed through or brazed, heads riveted over', factor: 2.1 },
  'headed-thick': { label: 'The same, plate over 7/16 in', factor: 2.2 },
  nutted: { label: 'Screwed through, nut outside', factor: 2.5 },
  'nutted-both': { label: 'Nuts inside and outside, no washers', factor: 2.8 },
  washers: { label: 'Nuts inside and outside, washers of half the pitch', factor: 3.2 },
} as const;
export type StayEndingId = keyof typeof stayEndings;

const thickPlateMm = (7 / 16) * mmPerInch;

/** PG-46’s factor for an ending; riveted-over stays get the better figure in plate over 7/16 in. */
export const stayFactor = (ending: StayEndingId, thicknessMm: number): number =>
  ending === 'headed' && thicknessMm > thickPlateMm
    ? stayEndings['headed-thick'].factor
    : stayEndings[ending].factor;

/** Flat plate on stays at one pitch. */
export function stayedPlatePressure(of: {
  thicknessMm: number;
  pitchMm: number;
  stressPa: number;
  ending?: StayEndingId;
}): Answer {
  if (of.thicknessMm * 4 > of.pitchMm)
    return outOfRange('The plate is more than a quarter of the pitch: too thick for the flat-plate formula.');
  return work({
    result: ['P', 'The plate stands between its supports', 'pressure'],
    formula: '{t}²·{S}·{C} / {p}²',
    terms: {
      t: ['Plate', 'length', of.thicknessMm],
      S: ['Allowable stress', 'stress', of.stressPa],
      C: ['Factor for the stay ends', 'ratio', stayFactor(of.ending ?? 'headed', of.thicknessMm)],
      p: ['Widest pitch', 'length', of.pitchMm],
    },
    compute: ({ t, S, C, p }) => (t ** 2 * S * C) / p ** 2,
    source: 'stayed-plate',
    holds: 'Flat plate, stays at an even pitch; plate up to a quarter of the pitch',
  });
}

/** Flat plate on stays at two pitches: the diagonal of the rectangle counts. */
export function rectangularPlatePressure(of: {
  thicknessMm: number;
  lengthwiseMm: number;
  crosswiseMm: number;
  stressPa: number;
  ending?: StayEndingId;
}): Answer {
  if (of.thicknessMm * 4 > Math.min(of.lengthwiseMm, of.crosswiseMm))
    return outOfRange('The plate is more than a quarter of the pitch: too thick for the flat-plate formula.');
  return work({
    result: ['P', 'The plate stands between its stays', 'pressure'],
    formula: '2·{t}²·{S}·{C} / ({l}² + {w}²)',
    terms: {
      t: ['Plate', 'length', of.thicknessMm],
      S: ['Allowable stress', 'stress', of.stressPa],
      C: ['Factor for the stay ends', 'ratio', stayFactor(of.ending ?? 'headed', of.thicknessMm)],
      l: ['Pitch one way', 'length', of.lengthwiseMm],
      w: ['Pitch the other way', 'length', of.crosswiseMm],
    },
    compute: ({ t, S, C, l, w }) => (2 * t ** 2 * S * C) / (l ** 2 + w ** 2),
    source: 'stayed-plate',
    holds: 'Flat plate, stays in even rows; plate up to a quarter of the pitch',
  });
}

/** A ring of flat plate between barrel and flue: a strip fixed along both edges. */
export function ringPlatePressure(of: { thicknessMm: number; widthMm: number; stressPa: number }): Answer {
  if (of.thicknessMm * 4 > of.widthMm)
    return outOfRange('The plate is more than a quarter of the width: too thick for the flat-plate formula.');
  return work({
    result: ['P', 'The plate stands between barrel and flue', 'pressure'],
    formula: '2·{S}·{t}² / {w}²',
    terms: {
      S: ['Allowable stress', 'stress', of.stressPa],
      t: ['Plate', 'length', of.thicknessMm],
      w: ['Width of the ring', 'length', of.widthMm],
    },
    compute: ({ S, t, w }) => (2 * S * t ** 2) / w ** 2,
    source: 'stayed-strip',
    holds: 'Flat ring held along both edges; plate up to a quarter of its width',
  });
}

/** A flat round end with nothing to stay it. */
export function unstayedPlatePressure(of: {
  thicknessMm: number;
  diameterMm: number;
  stressPa: number;
}): Answer {
  if (of.thicknessMm * 4 > of.diameterMm)
    return outOfRange(
      'The plate is more than a quarter of its diameter: too thick for the flat-plate formula.',
    );
  return work({
    result: ['P', 'The flat end stands', 'pressure'],
    formula: '{S}·{t}² / (0.33·{d}²)',
    terms: {
      S: ['Allowable stress', 'stress', of.stressPa],
      t: ['Plate', 'length', of.thicknessMm],
      d: ['Inside diameter', 'length', of.diameterMm],
    },
    compute: ({ S, t, d }) => (S * t ** 2) / (0.33 * d ** 2),
    source: 'unstayed-plate',
    holds: 'Flat round end without stays; a dished end stands more, and has no rule here',
  });
}

/** Core of a Whitworth-form thread. */
export const threadCore = (of: { outsideMm: number; tpi: number }): Line =>
  work({
    result: ['d_c', 'Core of the thread', 'length'],
    formula: '{d} − 1.28066 / {n}',
    terms: {
      d: ['Outside of the thread', 'length', of.outsideMm],
      n: ['Threads', 'threadsPerInch', of.tpi],
    },
    compute: ({ d, n }) => d - (1.280_66 * mmPerInch) / n,
    source: 'whitworth-core',
    holds: 'Whitworth form, as ME threads are',
  });

export interface StayInput {
  pitchMm: number;
  /** Outside, over the thread if there is one. */
  diameterMm: number;
  /** Threads to the inch; null for a plain or brazed stay. */
  tpi: number | null;
  stressPa: number;
  isCopper: boolean;
}

/** What the stays stand: by stress on the core and, for screwed copper, by the Indian rule; the least governs. */
export interface StayWorking {
  lines: readonly Line[];
  least: Line;
}

/** Load on one stay: the plate it holds, less the stay itself. */
export const stayLoad = (of: { pressurePa: number; pitchMm: number; diameterMm: number }): Line =>
  work({
    result: ['F', 'Load on one stay', 'force'],
    formula: '{P}·({p}² − π·{d}² / 4)',
    terms: {
      P: ['Pressure', 'pressure', of.pressurePa],
      p: ['Pitch', 'length', of.pitchMm],
      d: ['Diameter of the stay', 'length', of.diameterMm],
    },
    compute: ({ P, p, d }) => (P * (p ** 2 - (Math.PI * d ** 2) / 4)) / 1e6,
    source: 'statics',
    holds: 'Stays at an even square pitch',
  });

/** Diameter a rod stay needs to hold an area of plate. */
export const rodStayDiameter = (of: { pressurePa: number; areaMm2: number; stressPa: number }): Line =>
  work({
    result: ['d', 'Diameter a stay needs', 'length'],
    formula: '(4·{P}·{a} / (π·{S}))^0.5',
    terms: {
      P: ['Pressure', 'pressure', of.pressurePa],
      a: ['Plate held by one stay', 'area', of.areaMm2],
      S: ['Allowable stress', 'stress', of.stressPa],
    },
    compute: ({ P, a, S }) => Math.sqrt((4 * P * a) / (Math.PI * S)),
    source: 'statics',
    holds: 'Plain rod in tension',
  });

/** Indian regulation’s constant for screwed copper stays, psi. */
const copperStayPa = 4_700 * paPerPsi;

/** Pressure screwed copper stays stand by the Indian regulation: `C (D − 1.28/N)² / A`. */
export const copperStayPressure = (of: { diameterMm: number; tpi: number; areaMm2: number }): Line =>
  work({
    result: ['P', 'Screwed copper stays stand, by the Indian regulation', 'pressure'],
    formula: '{C}·({d} − 1.28 / {n})² / {a}',
    terms: {
      C: ['Constant of the regulation', 'stress', copperStayPa],
      d: ['Outside of the thread', 'length', of.diameterMm],
      n: ['Threads', 'threadsPerInch', of.tpi],
      a: ['Plate held by one stay', 'area', of.areaMm2],
    },
    compute: ({ C, d, n, a }) => (C * (d - (1.28 * mmPerInch) / n) ** 2) / a,
    source: 'copper-stay',
    holds: 'Screwed copper stays',
  });

/** What stays at an even pitch stand. */
export function stayPressure(of: StayInput): StayWorking | Refusal {
  if (of.diameterMm >= of.pitchMm)
    return outOfRange('The stays would touch: the pitch is no more than the stay.');
  const core = of.tpi === null ? null : threadCore({ outsideMm: of.diameterMm, tpi: of.tpi });
  const coreMm = core?.result.value ?? of.diameterMm;
  if (coreMm <= 0) return outOfRange('So coarse a thread leaves no core in the stay.');
  const byStress = work({
    result: ['P', 'The stays stand, by stress on the core', 'pressure'],
    formula: '{S}·(π·{d_c}² / 4) / ({p}² − π·{d}² / 4)',
    terms: {
      S: ['Allowable stress', 'stress', of.stressPa],
      d_c: [core === null ? 'Stay' : 'Core of the thread', 'length', coreMm],
      p: ['Widest pitch', 'length', of.pitchMm],
      d: ['Diameter of the stay', 'length', of.diameterMm],
    },
    compute: ({ S, d_c, p, d }) => (S * ((Math.PI * d_c ** 2) / 4)) / (p ** 2 - (Math.PI * d ** 2) / 4),
    source: 'statics',
    holds: 'Stays at an even square pitch, each whole and tight',
  });
  const byRule =
    of.isCopper && of.tpi !== null
      ? copperStayPressure({ diameterMm: of.diameterMm, tpi: of.tpi, areaMm2: of.pitchMm ** 2 })
      : null;
  return {
    lines: [...(core === null ? [] : [core]), byStress, ...(byRule === null ? [] : [byRule])],
    least: byRule !== null && byRule.result.value < byStress.result.value ? byRule : byStress,
  };
}

/** Said where a plate cannot be worked out for want of a measure. */
export const measurePitch = (): Refusal =>
  measureIt('Measure the widest distance between the supports of the flat plates: stays, tubes or flange.');
