import { z } from 'zod';
import { day } from '../time.ts';
import { boilerTypeId, boilerTypeOf } from './boiler-types.ts';
import type { Trait } from './boiler-types.ts';

export const materials = {
  copper: 'Copper',
  'copper-brass': 'Copper with brass ends',
  brass: 'Brass',
  steel: 'Steel',
  stainless: 'Stainless steel',
} as const;
export const materialId = z.enum(
  Object.keys(materials) as [MaterialId, ...MaterialId[]],
  'Choose the material',
);
export type MaterialId = keyof typeof materials;

export const constructions = {
  'silver-brazed': 'Silver brazed',
  'soft-soldered': 'Soft soldered',
  riveted: 'Riveted and caulked',
  welded: 'Welded',
  mixed: 'More than one method',
  unknown: 'Not known',
} as const;
export const constructionId = z.enum(
  Object.keys(constructions) as [ConstructionId, ...ConstructionId[]],
  'Choose how it is joined',
);
export type ConstructionId = keyof typeof constructions;

export const firings = {
  coal: 'Coal',
  gas: 'Gas',
  spirit: 'Spirit',
  oil: 'Oil',
  electric: 'Electric',
  none: 'No firing with it',
} as const;
export const firingId = z.enum(Object.keys(firings) as [FiringId, ...FiringId[]], 'Choose how it is fired');
export type FiringId = keyof typeof firings;

export const fittings = {
  'safety-valve': 'Safety valve',
  'second-safety-valve': 'Second safety valve',
  'pressure-gauge': 'Pressure gauge',
  siphon: 'Gauge siphon',
  'water-gauge': 'Water gauge',
  'blowdown-valve': 'Blowdown valve',
  'check-valve': 'Check valve',
  'hand-pump': 'Hand feed pump',
  'engine-pump': 'Engine-driven feed pump',
  injector: 'Injector',
  'stop-valve': 'Stop valve or regulator',
  superheater: 'Superheater',
  blower: 'Blower',
  'feed-tank': 'Feed tank',
  lagging: 'Lagging',
} as const;
export const fittingId = z.enum(Object.keys(fittings) as [FittingId, ...FittingId[]]);
export type FittingId = keyof typeof fittings;

export const pressureEvidence = {
  'stamped-plate': 'Stamped on a plate',
  certificate: 'On a test certificate',
  drawing: 'On the drawing or published design',
  'seller-only': 'Only what I was told',
} as const;
export const pressureEvidenceId = z.enum(
  Object.keys(pressureEvidence) as [PressureEvidenceId, ...PressureEvidenceId[]],
  'Say what the figure rests on',
);
export type PressureEvidenceId = keyof typeof pressureEvidence;

export const yearSureness = { known: 'Known', 'about-right': 'About right', guess: 'A guess' } as const;
export const yearSurenessId = z.enum(Object.keys(yearSureness) as [YearSurenessId, ...YearSurenessId[]]);
export type YearSurenessId = keyof typeof yearSureness;

export const paperKinds = {
  'hydraulic-certificate': 'Hydraulic test certificate',
  'steam-certificate': 'Steam test certificate',
  drawing: 'Drawing',
  'build-record': 'Build record or photographs of the building',
  receipt: 'Receipt or bill of sale',
} as const;
export const paperKindId = z.enum(Object.keys(paperKinds) as [PaperKindId, ...PaperKindId[]]);
export type PaperKindId = keyof typeof paperKinds;

const lengthMm = (least: number, most: number, sentence: string, missing = 'Give a figure') =>
  z.number(missing).min(least, sentence).max(most, sentence);

/** Sizes of a boiler; millimetres and litres. What the seller could not measure is left out, never guessed. */
export const dimensions = z.strictObject({
  barrelOutsideDiameterMm: lengthMm(
    20,
    1_000,
    'A model boiler’s barrel is between 20 and 1,000 mm across',
    'Give the outside diameter of the barrel',
  ),
  barrelLengthMm: lengthMm(
    20,
    3_000,
    'A model boiler’s barrel is between 20 and 3,000 mm long',
    'Give the length of the barrel',
  ),
  barrelThicknessMm: lengthMm(0.3, 25, 'A wall is between 0.3 and 25 mm thick').nullable().default(null),
  endPlateThicknessMm: lengthMm(0.3, 25, 'A plate is between 0.3 and 25 mm thick').nullable().default(null),
  flueDiameterMm: lengthMm(5, 600, 'A flue is between 5 and 600 mm across').nullable().default(null),
  flueThicknessMm: lengthMm(0.3, 25, 'A wall is between 0.3 and 25 mm thick').nullable().default(null),
  tubeCount: z
    .int('A whole number of tubes')
    .min(1, 'At least one tube')
    .max(300, 'At most 300 tubes')
    .nullable()
    .default(null),
  tubeDiameterMm: lengthMm(2, 100, 'A tube is between 2 and 100 mm across').nullable().default(null),
  tubeThicknessMm: lengthMm(0.2, 10, 'A tube wall is between 0.2 and 10 mm thick').nullable().default(null),
  heatingSurfaceM2: z.number().min(0.001).max(20, 'That is more than a model has').nullable().default(null),
  overallHeightMm: lengthMm(20, 4_000, 'Between 20 and 4,000 mm').nullable().default(null),
  weightKg: z.number().min(0.1, 'At least 0.1 kg').max(2_000, 'At most 2,000 kg').nullable().default(null),
});
export type Dimensions = z.infer<typeof dimensions>;

export const paper = z.strictObject({
  kind: paperKindId,
  datedOn: day.nullable().default(null),
  by: z.string().trim().max(120, 'Keep it under 120 characters').default(''),
});
export type Paper = z.infer<typeof paper>;

/** What a seller says a boiler is. The survey examines against this. */
export const boilerFacts = z
  .strictObject({
    type: boilerTypeId,
    material: materialId,
    construction: constructionId,
    builder: z.string().trim().max(120, 'Keep it under 120 characters').nullable().default(null),
    builtYear: z
      .int('A whole year')
      .min(1850, 'Not before 1850')
      .max(2100, 'Not in the future')
      .nullable()
      .default(null),
    builtYearSureness: yearSurenessId.default('guess'),
    dimensions,
    workingPressurePa: z
      .number('Give the working pressure')
      .min(10_000, 'A working pressure is at least 0.1 bar')
      .max(2_000_000, 'More than 20 bar (290 psi) is outside what Tubeplate handles'),
    pressureEvidence: pressureEvidenceId,
    waterCapacityL: z
      .number('Give the water capacity')
      .min(0.02, 'At least 0.02 litres')
      .max(500, 'At most 500 litres'),
    fittings: z.array(fittingId).max(30),
    firing: firingId,
    papers: z.array(paper).max(20, 'At most 20 papers'),
  })
  .superRefine((facts, check) => {
    const size = facts.dimensions;
    const across = size.barrelOutsideDiameterMm;
    if (size.flueDiameterMm !== null && size.flueDiameterMm >= across) {
      check.addIssue({
        code: 'custom',
        path: ['dimensions', 'flueDiameterMm'],
        message: 'The flue cannot be as wide as the barrel',
      });
    }
    if (size.tubeDiameterMm !== null && size.tubeDiameterMm >= across) {
      check.addIssue({
        code: 'custom',
        path: ['dimensions', 'tubeDiameterMm'],
        message: 'A tube cannot be as wide as the barrel',
      });
    }
    if (
      size.tubeDiameterMm !== null &&
      size.tubeThicknessMm !== null &&
      size.tubeThicknessMm * 2 >= size.tubeDiameterMm
    ) {
      check.addIssue({
        code: 'custom',
        path: ['dimensions', 'tubeThicknessMm'],
        message: 'That wall leaves no bore in the tube',
      });
    }
    if (
      size.flueDiameterMm !== null &&
      size.flueDiameterMm < across &&
      size.flueDiameterMm + 2 * (size.flueThicknessMm ?? 0) >= across
    ) {
      check.addIssue({
        code: 'custom',
        path: ['dimensions', 'flueThicknessMm'],
        message: 'With that wall the flue would be as wide as the barrel',
      });
    }
    if (size.barrelThicknessMm !== null && size.barrelThicknessMm * 2 >= across) {
      check.addIssue({
        code: 'custom',
        path: ['dimensions', 'barrelThicknessMm'],
        message: 'The wall cannot be thicker than half the barrel',
      });
    }
    const barrelL = (Math.PI / 4) * (across / 100) ** 2 * (size.barrelLengthMm / 100);
    if (facts.waterCapacityL > barrelL * 2.5) {
      check.addIssue({
        code: 'custom',
        path: ['waterCapacityL'],
        message: 'More water than a boiler of this size could hold',
      });
    }
  });
export type BoilerFacts = z.infer<typeof boilerFacts>;

/** The traits that decide which criteria apply: those of the type, and what the seller says is fitted. */
export function traitsOf(facts: Pick<BoilerFacts, 'type'>): ReadonlySet<Trait> {
  return new Set(boilerTypeOf(facts.type).traits);
}

/** Bar·litres: working pressure in bar times water capacity in litres. */
export const barLitres = (facts: Pick<BoilerFacts, 'workingPressurePa' | 'waterCapacityL'>): number =>
  (facts.workingPressurePa / 100_000) * facts.waterCapacityL;
