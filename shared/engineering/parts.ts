import type { MaterialId } from '../boilers/boiler.ts';
import { fluePressure } from './flue.ts';
import { allowableStress, elasticity, fireMarginK, metalTemperature } from './metal.ts';
import {
  measurePitch,
  ringPlatePressure,
  stayedPlatePressure,
  stayPressure,
  unstayedPlatePressure,
} from './plates.ts';
import type { StayEndingId } from './plates.ts';
import { barrelPressure, seamEfficiencies, tradeBarrelPressure, tubePressure } from './shell.ts';
import type { SeamId } from './shell.ts';
import { isRefusal, measureIt, notPublished } from './working.ts';
import type { Line, Refusal } from './working.ts';

export const partIds = ['barrel', 'plates', 'flue', 'tubes', 'stays'] as const;
export type PartId = (typeof partIds)[number];
export const partTitles: Readonly<Record<PartId, string>> = {
  barrel: 'Barrel',
  plates: 'End plates',
  flue: 'Flue',
  tubes: 'Tubes',
  stays: 'Stays',
};

/** Sizes of the pressure parts, mm. Null where nobody knows; a part that is not there is left out. */
export interface PartsInput {
  material: MaterialId;
  workingPa: number;
  /** How much hotter than the steam metal in the fire is taken to be, K. */
  marginK?: number;
  barrel: { outsideMm: number; wallMm: number | null; seam: SeamId; isInFire: boolean };
  plates?: {
    thicknessMm: number | null;
    support:
      | { by: 'stays'; pitchMm: number | null; ending?: StayEndingId }
      | { by: 'ring'; widthMm: number | null }
      | { by: 'nothing' };
  };
  flue?: { outsideMm: number | null; wallMm: number | null; lengthMm: number | null };
  tubes?: {
    outsideMm: number | null;
    wallMm: number | null;
    lengthMm: number | null;
    pressure: 'outside' | 'inside';
  };
  stays?: { diameterMm: number | null; pitchMm: number | null; tpi: number | null };
}

/** What one part stands, or why it cannot be said, with every line that was worked. */
export interface PartOutcome {
  id: PartId;
  title: string;
  /** Pa gauge; null where refused. */
  standsPa: number | null;
  /** The line that governs this part. */
  governing: Line | null;
  /** Heat and stress of its metal. */
  metal: readonly Line[];
  lines: readonly Line[];
  refusal: Refusal | null;
}

export interface PartsOutcome {
  parts: readonly PartOutcome[];
  /** The weakest of the parts that could be worked out. */
  weakest: PartOutcome | null;
}

const refused = (id: PartId, refusal: Refusal, metal: readonly Line[] = []): PartOutcome => ({
  id,
  title: partTitles[id],
  standsPa: null,
  governing: null,
  metal,
  lines: [],
  refusal,
});

/** The least of several answers for one part, with all the lines. */
const stands = (id: PartId, metal: readonly Line[], answers: readonly Line[]): PartOutcome => {
  const governing = answers.toSorted((a, b) => a.result.value - b.result.value)[0] ?? null;
  return {
    id,
    title: partTitles[id],
    standsPa: governing?.result.value ?? null,
    governing,
    metal,
    lines: answers,
    refusal: null,
  };
};

interface Metal {
  lines: readonly Line[];
  stressPa: number;
}

function metalAt(input: PartsInput, isInFire: boolean): Metal | Refusal {
  const margin = isInFire ? (input.marginK ?? fireMarginK) : 0;
  const temperature = metalTemperature(input.workingPa, margin);
  const stress = allowableStress(input.material, temperature.result.value);
  return isRefusal(stress) ? stress : { lines: [temperature, stress], stressPa: stress.result.value };
}

/** Copper barrels are held to the trade’s older rule as well; the lower governs. */
function barrelOf(input: PartsInput): PartOutcome {
  const { outsideMm, wallMm, seam, isInFire } = input.barrel;
  if (wallMm === null) return refused('barrel', measureIt('Measure the wall of the barrel.'));
  const metal = metalAt(input, isInFire);
  if (isRefusal(metal)) return refused('barrel', metal);
  const byStress = barrelPressure({
    insideRadiusMm: outsideMm / 2 - wallMm,
    thicknessMm: wallMm,
    stressPa: metal.stressPa,
    joint: seamEfficiencies[seam].efficiency,
  });
  if (isRefusal(byStress)) return refused('barrel', byStress, metal.lines);
  const isCopper = input.material === 'copper' || input.material === 'copper-brass';
  const older = isCopper ? [tradeBarrelPressure({ outsideMm, thicknessMm: wallMm })] : [];
  return stands('barrel', metal.lines, [byStress, ...older]);
}

function platesOf(input: PartsInput, plates: NonNullable<PartsInput['plates']>): PartOutcome {
  const { thicknessMm, support } = plates;
  if (input.material === 'copper-brass')
    return refused('plates', notPublished('No allowable stress for brass end plates is published here.'));
  if (thicknessMm === null) return refused('plates', measureIt('Measure the thickness of the end plates.'));
  const metal = metalAt(input, true);
  if (isRefusal(metal)) return refused('plates', metal);
  const { stressPa } = metal;
  const answer = (() => {
    if (support.by === 'nothing')
      return unstayedPlatePressure({
        thicknessMm,
        diameterMm: input.barrel.outsideMm - 2 * (input.barrel.wallMm ?? 0),
        stressPa,
      });
    if (support.by === 'ring')
      return support.widthMm === null
        ? measureIt('Measure the width of flat plate between barrel and flue.')
        : ringPlatePressure({ thicknessMm, widthMm: support.widthMm, stressPa });
    if (support.pitchMm === null) return measurePitch();
    return stayedPlatePressure({
      thicknessMm,
      pitchMm: support.pitchMm,
      stressPa,
      ...(support.ending && { ending: support.ending }),
    });
  })();
  return isRefusal(answer) ? refused('plates', answer, metal.lines) : stands('plates', metal.lines, [answer]);
}

function fluedPart(
  id: 'flue' | 'tubes',
  input: PartsInput,
  of: { outsideMm: number; wallMm: number; lengthMm: number | null },
): PartOutcome {
  const metal = metalAt(input, true);
  if (isRefusal(metal)) return refused(id, metal);
  const flue = fluePressure({
    outsideMm: of.outsideMm,
    thicknessMm: of.wallMm,
    lengthMm: of.lengthMm,
    stressPa: metal.stressPa,
    ...elasticity[input.material],
  });
  if (isRefusal(flue)) return refused(id, flue, metal.lines);
  return {
    id,
    title: partTitles[id],
    standsPa: flue.least.result.value,
    governing: flue.least,
    metal: metal.lines,
    lines: flue.lines,
    refusal: null,
  };
}

function flueOf(input: PartsInput, flue: NonNullable<PartsInput['flue']>): PartOutcome {
  const { outsideMm, wallMm, lengthMm } = flue;
  if (outsideMm === null || wallMm === null)
    return refused('flue', measureIt('Measure the diameter and the wall of the flue.'));
  return fluedPart('flue', input, { outsideMm, wallMm, lengthMm });
}

function tubesOf(input: PartsInput, tubes: NonNullable<PartsInput['tubes']>): PartOutcome {
  const { outsideMm, wallMm, lengthMm, pressure } = tubes;
  if (outsideMm === null || wallMm === null)
    return refused('tubes', measureIt('Measure the diameter and the wall of a tube.'));
  if (pressure === 'outside') return fluedPart('tubes', input, { outsideMm, wallMm, lengthMm });
  const metal = metalAt(input, true);
  if (isRefusal(metal)) return refused('tubes', metal);
  const answer = tubePressure({ outsideMm, thicknessMm: wallMm, stressPa: metal.stressPa });
  return isRefusal(answer) ? refused('tubes', answer, metal.lines) : stands('tubes', metal.lines, [answer]);
}

function staysOf(input: PartsInput, stays: NonNullable<PartsInput['stays']>): PartOutcome {
  const { diameterMm, pitchMm, tpi } = stays;
  if (diameterMm === null || pitchMm === null)
    return refused('stays', measureIt('Measure the diameter of a stay and the widest pitch between stays.'));
  const metal = metalAt(input, true);
  if (isRefusal(metal)) return refused('stays', metal);
  const outcome = stayPressure({
    pitchMm,
    diameterMm,
    tpi,
    stressPa: metal.stressPa,
    isCopper: input.material === 'copper' || input.material === 'copper-brass',
  });
  if (isRefusal(outcome)) return refused('stays', outcome, metal.lines);
  return {
    id: 'stays',
    title: partTitles.stays,
    standsPa: outcome.least.result.value,
    governing: outcome.least,
    metal: metal.lines,
    lines: outcome.lines,
    refusal: null,
  };
}

/**
 * What each pressure part stands by calculation, and the weakest of them.
 *
 * Metal in the fire is taken hotter than the steam by the margin; the rest at the temperature of the steam. A part with
 * a size nobody knows is refused, never guessed. Joints are judged by what they are made with, in `joints.ts`.
 */
export function pressureByParts(input: PartsInput): PartsOutcome {
  const parts = [
    barrelOf(input),
    ...(input.plates ? [platesOf(input, input.plates)] : []),
    ...(input.flue ? [flueOf(input, input.flue)] : []),
    ...(input.tubes ? [tubesOf(input, input.tubes)] : []),
    ...(input.stays ? [staysOf(input, input.stays)] : []),
  ];
  const weakest = parts
    .filter(({ standsPa }) => standsPa !== null)
    .toSorted((a, b) => (a.standsPa ?? 0) - (b.standsPa ?? 0))[0];
  return { parts, weakest: weakest ?? null };
}

/**
 * The least wall, mm, at which a part stands a pressure, to a thousandth; null where none up to `mostMm` does.
 *
 * By halving: a thicker wall is never weaker.
 */
export function wallNeeded(
  pressurePa: number,
  standsAt: (wallMm: number) => number | null,
  mostMm: number,
): number | null {
  const isEnough = (wallMm: number): boolean => (standsAt(wallMm) ?? 0) >= pressurePa;
  if (!isEnough(mostMm)) return null;
  let [thin, thick] = [0, mostMm];
  while (thick - thin > 0.000_5) {
    const middle = (thin + thick) / 2;
    if (isEnough(middle)) thick = middle;
    else thin = middle;
  }
  return Math.ceil(thick * 1_000) / 1_000;
}
