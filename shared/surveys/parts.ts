import type { BoilerFacts, ConstructionId } from '../boilers/boiler.ts';
import { boilerTypeOf } from '../boilers/boiler-types.ts';
import type { Trait } from '../boilers/boiler-types.ts';
import { pressureByParts } from '../engineering/parts.ts';
import type { PartId, PartOutcome, PartsInput } from '../engineering/parts.ts';
import type { SeamId } from '../engineering/shell.ts';
import { figureOf } from './examined.ts';
import type { Examined } from './examined.ts';

/** A part as worked out for a boiler: what it stands, and whether on a surveyor's figure or the seller's. */
export interface BoilerPart extends PartOutcome {
  /** Whether the thickness it rests on was measured in a survey. */
  isMeasured: boolean;
  thicknessMm: number | null;
  /** The criterion it is examined under. */
  criterionId: string;
}

/** A size with where it comes from: measured beats stated. */
interface Size {
  mm: number | null;
  isMeasured: boolean;
}

const size = (measuredMm: number | null, statedMm: number | null): Size => ({
  mm: measuredMm ?? statedMm,
  isMeasured: measuredMm !== null,
});

const seamOf: Readonly<Record<ConstructionId, SeamId>> = {
  'silver-brazed': 'brazed',
  welded: 'welded',
  riveted: 'riveted',
  'soft-soldered': 'unknown',
  mixed: 'unknown',
  unknown: 'unknown',
};

const criterionOfPart: Readonly<Record<PartId, string>> = {
  barrel: 'shell.barrel',
  plates: 'shell.plates',
  flue: 'shell.flue',
  tubes: 'shell.tubes',
  stays: 'shell.stays',
};

function sizesOf(facts: BoilerFacts, items: readonly Examined[]) {
  const stated = facts.dimensions;
  const measured = (criterionId: string, quantity: string, which: 'least' | 'most' = 'least') =>
    figureOf(items, criterionId, quantity, which);
  return {
    barrelOutside: measured('identity.match', 'outsideDiameterMm', 'most') ?? stated.barrelOutsideDiameterMm,
    barrel: size(measured('shell.barrel', 'thinnestMm'), stated.barrelThicknessMm),
    plates: size(measured('shell.plates', 'thinnestMm'), stated.endPlateThicknessMm),
    supportPitch: measured('shell.plates', 'supportPitchMm', 'most'),
    flueInside: measured('shell.flue', 'insideDiameterMm', 'most') ?? stated.flueDiameterMm,
    flueLength: measured('shell.flue', 'lengthMm', 'most'),
    flue: size(measured('shell.flue', 'thinnestMm'), stated.flueThicknessMm),
    tubeOutside: measured('shell.tubes', 'outsideDiameterMm', 'most') ?? stated.tubeDiameterMm,
    tubes: size(measured('shell.tubes', 'thinnestMm'), stated.tubeThicknessMm),
    stayDiameter: size(measured('shell.stays', 'diameterMm'), null),
    stayPitch: measured('shell.stays', 'pitchMm', 'most'),
    stayTpi: measured('shell.stays', 'threadsPerInch', 'most'),
  };
}

type Sizes = ReturnType<typeof sizesOf>;

const ringWidth = ({ barrelOutside, barrel, flueInside, flue }: Sizes): number | null =>
  flueInside === null ? null : barrelOutside / 2 - (barrel.mm ?? 0) - (flueInside / 2 + (flue.mm ?? 0));

/** What holds the flat plates, by the kind of boiler, unless the surveyor measured it. */
function supportOf(traits: readonly Trait[], sizes: Sizes): NonNullable<PartsInput['plates']>['support'] {
  const pitchMm = sizes.supportPitch ?? sizes.stayPitch;
  if (pitchMm !== null || traits.includes('stays') || traits.includes('tubeplates'))
    return { by: 'stays', pitchMm };
  return traits.includes('flue') ? { by: 'ring', widthMm: ringWidth(sizes) } : { by: 'nothing' };
}

/** The sizes of a boiler's pressure parts: as measured, and failing that as the seller gives them. */
export function partsInputOf(facts: BoilerFacts, items: readonly Examined[]): PartsInput {
  const { traits } = boilerTypeOf(facts.type);
  const sizes = sizesOf(facts, items);
  const has = (trait: Trait): boolean => traits.includes(trait);
  const flueOutside =
    sizes.flueInside === null || sizes.flue.mm === null ? null : sizes.flueInside + 2 * sizes.flue.mm;
  return {
    material: facts.material,
    workingPa: facts.workingPressurePa,
    barrel: {
      outsideMm: sizes.barrelOutside,
      wallMm: sizes.barrel.mm,
      seam: seamOf[facts.construction],
      isInFire: facts.type === 'pot',
    },
    plates: { thicknessMm: sizes.plates.mm, support: supportOf(traits, sizes) },
    ...(has('flue') && {
      flue: { outsideMm: flueOutside, wallMm: sizes.flue.mm, lengthMm: sizes.flueLength },
    }),
    ...((has('fire-tubes') || has('water-tubes')) && {
      tubes: {
        outsideMm: sizes.tubeOutside,
        wallMm: sizes.tubes.mm,
        lengthMm: null,
        pressure: has('fire-tubes') ? ('outside' as const) : ('inside' as const),
      },
    }),
    ...(has('stays') && {
      stays: { diameterMm: sizes.stayDiameter.mm, pitchMm: sizes.stayPitch, tpi: sizes.stayTpi },
    }),
  };
}

/** What each pressure part of a boiler stands, on the best figures there are. */
export function partsOf(facts: BoilerFacts, items: readonly Examined[]): BoilerPart[] {
  const sizes = sizesOf(facts, items);
  const thicknesses: Readonly<Record<PartId, Size>> = {
    barrel: sizes.barrel,
    plates: sizes.plates,
    flue: sizes.flue,
    tubes: sizes.tubes,
    stays: sizes.stayDiameter,
  };
  return pressureByParts(partsInputOf(facts, items)).parts.map((part) => ({
    ...part,
    isMeasured: thicknesses[part.id].isMeasured,
    thicknessMm: thicknesses[part.id].mm,
    criterionId: criterionOfPart[part.id],
  }));
}

/** The weakest of some parts; null where none could be worked out. */
export const weakestOf = (parts: readonly BoilerPart[]): BoilerPart | null =>
  parts
    .filter(({ standsPa }) => standsPa !== null)
    .toSorted((a, b) => (a.standsPa ?? 0) - (b.standsPa ?? 0))[0] ?? null;
