import { outOfRange, work } from './working.ts';
import type { Line, Refusal } from './working.ts';

export interface FlueInput {
  outsideMm: number;
  thicknessMm: number;
  /** Between the plates that hold it round; null where not known. */
  lengthMm: number | null;
  stressPa: number;
  youngPa: number;
  poisson: number;
}

/** What a flue or tube stands from outside: by yield, by collapse, and the least of them. */
export interface FlueWorking {
  lines: readonly Line[];
  /** The line that governs. */
  least: Line;
}

/** Elastic collapse is never quite round work: only a third of it is counted. */
const knockDown = 3;

const terms = ({ outsideMm, thicknessMm, youngPa, poisson }: FlueInput) =>
  ({
    E: ['Young’s modulus', 'stress', youngPa],
    ν: ['Poisson’s ratio', 'ratio', poisson],
    t: ['Wall', 'length', thicknessMm],
    D: ['Outside diameter', 'length', outsideMm],
    k: ['Knock-down', 'ratio', knockDown],
  }) as const;

/** Yield of the wall under outside pressure. */
const yieldLine = (of: FlueInput): Line =>
  work({
    result: ['P', 'Wall stands, by stress', 'pressure'],
    formula: '2·{S}·{t} / {D}',
    terms: {
      S: ['Allowable stress', 'stress', of.stressPa],
      t: ['Wall', 'length', of.thicknessMm],
      D: ['Outside diameter', 'length', of.outsideMm],
    },
    compute: ({ S, t, D }) => (2 * S * t) / D,
    source: 'flue-yield',
    holds: 'Thin tubes, round',
  });

/** A third of the elastic collapse of a tube without end. */
export const longFlueLine = (of: FlueInput): Line =>
  work({
    result: ['P', 'Stands against flattening, as a long tube', 'pressure'],
    formula: '2·{E} / (1 − {ν}²)·({t} / {D})³ / {k}',
    terms: terms(of),
    compute: ({ E, ν, t, D, k }) => (((2 * E) / (1 - ν ** 2)) * (t / D) ** 3) / k,
    source: 'long-flue',
    holds: 'Any length: the ends of a short tube help, and are left out',
  });

/**
 * A third of the elastic collapse of a tube held round at its ends. One shorter than its diameter is taken as long as
 * that: the formula runs away below.
 */
export const shortFlueLine = (of: FlueInput & { lengthMm: number }): Line =>
  work({
    result: ['P', 'Stands against flattening, held at its ends', 'pressure'],
    formula: '2.42·{E} / (1 − {ν}²)^0.75·({t} / {D})^2.5 / ({L} / {D} − 0.45·({t} / {D})^0.5) / {k}',
    terms: {
      ...terms(of),
      L: ['Length between ends, at least the diameter', 'length', Math.max(of.lengthMm, of.outsideMm)],
    },
    compute: ({ E, ν, t, D, L, k }) =>
      (((2.42 * E) / (1 - ν ** 2) ** 0.75) * (t / D) ** 2.5) / (L / D - 0.45 * (t / D) ** 0.5) / k,
    source: 'short-flue',
    holds: 'Tubes held round at both ends; where it gives less than the long tube, the long tube stands',
  });

/**
 * What a flue or fire tube stands from outside.
 *
 * Against flattening it has the better of the long tube and, where its length is known, the short one; the lesser of
 * that and the stress in the wall governs.
 */
export function fluePressure(of: FlueInput): FlueWorking | Refusal {
  if (of.thicknessMm * 2 >= of.outsideMm) return outOfRange('The wall leaves no bore in the flue.');
  if (of.thicknessMm * 5 > of.outsideMm)
    return outOfRange('The wall is more than a fifth of the diameter: too thick for the thin-tube formulas.');
  const byStress = yieldLine(of);
  const long = longFlueLine(of);
  const short = of.lengthMm === null ? null : shortFlueLine({ ...of, lengthMm: of.lengthMm });
  const flattening = short !== null && short.result.value > long.result.value ? short : long;
  return {
    lines: [byStress, long, ...(short === null ? [] : [short])],
    least: flattening.result.value < byStress.result.value ? flattening : byStress,
  };
}
