import { z } from 'zod';
import { firingId, fittingId } from '../../boilers/boiler.ts';
import { boilerTypeId, traits } from '../../boilers/boiler-types.ts';
import { grade, remedy } from '../record.ts';

/** The ways of examining, in words a surveyor uses. */
export const wayLabels = {
  sight: 'By eye',
  document: 'From papers',
  measure: 'Measured',
  gauge: 'With thread gauges',
  sounding: 'Sounded with a light hammer',
  borescope: 'With a borescope',
  calculation: 'By calculation',
  comparison: 'Against a test gauge',
  'hand-lift': 'Lifted by hand',
  'blow-through': 'Blown through',
  delivery: 'Delivery timed',
  'leak-spray': 'With leak spray',
  lit: 'Lit and watched',
  'co-meter': 'With a carbon monoxide meter',
  hydraulic: 'Under the hydraulic test',
  steam: 'Under steam',
} as const;
export const wayId = z.enum(Object.keys(wayLabels) as [WayId, ...WayId[]]);
export type WayId = keyof typeof wayLabels;

/** A way of examining one criterion; strength is in (0, 1], what share of certainty it gives alone. */
export const way = z.strictObject({ id: wayId, label: z.string(), strength: z.number().gt(0).max(1) });
export type Way = z.infer<typeof way>;

export const measureUnits = {
  Pa: 'pressure',
  'Pa/min': 'pressure in a minute',
  mm: 'length',
  ppm: 'parts per million',
  'kg/h': 'water or steam in an hour',
  L: 'litres',
  count: 'a whole number',
  text: 'words',
  'yes-no': 'yes or no',
  choice: 'one of a list',
} as const;
export type MeasureUnit = keyof typeof measureUnits;

export const measurementSpec = z.strictObject({
  quantity: z.string(),
  label: z.string(),
  unit: z.enum(Object.keys(measureUnits) as [MeasureUnit, ...MeasureUnit[]]),
  min: z.number().nullable(),
  max: z.number().nullable(),
  /** For `choice`; the value recorded is the id. */
  choices: z.array(z.strictObject({ id: z.string(), label: z.string() })),
  /** Where it is recorded: in the finding, or as the field of that name of a test, shown here and not asked twice. */
  takenIn: z.enum(['finding', 'hydraulic', 'steam']),
});
export type MeasurementSpec = z.infer<typeof measurementSpec>;

export const consequences = {
  danger: 'Danger',
  function: 'Working',
  appearance: 'Looks',
} as const;
export type Consequence = keyof typeof consequences;

/** Defects that stop a boiler being steamed whatever the grade given. */
export const stopKinds = {
  crack: 'A crack is recorded',
  bulge: 'A bulge is recorded',
  collapse: 'A collapse is recorded',
  'soft-solder': 'Soft solder is holding a pressure joint',
  'gas-leak': 'A gas leak could not be made good',
  'passage-blocked': 'A water gauge passage is blocked',
} as const;
export type StopKind = keyof typeof stopKinds;

export const materialClasses = ['copper', 'brass', 'steel', 'stainless'] as const;
export type MaterialClass = (typeof materialClasses)[number];

const band = z.strictObject({ lowMinor: z.int().min(0), highMinor: z.int().min(0) });
export type PartsBand = z.infer<typeof band>;

export const defectSpec = z.strictObject({
  /** Unique over the rubric: the criterion's short name, then the defect's. */
  code: z.string(),
  label: z.string(),
  /** The grade it usually calls for; the surveyor decides. */
  grade: grade.extract(['serviceable', 'attention', 'unfit']),
  consequence: z.enum(Object.keys(consequences) as [Consequence, ...Consequence[]]),
  remedy,
  allowance: z.strictObject({
    hoursLow: z.number().min(0),
    hoursHigh: z.number().min(0),
    /** Pence, by what the boiler is made of. */
    parts: z.record(z.enum(materialClasses), band),
  }),
  stop: z.enum(Object.keys(stopKinds) as [StopKind, ...StopKind[]]).nullable(),
});
export type DefectSpec = z.infer<typeof defectSpec>;

/**
 * When a criterion applies: where the boiler has any one of the traits or fittings named (if any are named), and is
 * fired in one of the ways named (if any are named). With nothing named it always applies.
 */
export const appliesTo = z.strictObject({
  traits: z.array(z.enum(traits)),
  fittings: z.array(fittingId),
  firings: z.array(firingId),
});
export type AppliesTo = z.infer<typeof appliesTo>;

export const lookFor = z.strictObject({
  line: z.string(),
  byType: z.partialRecord(boilerTypeId, z.string()),
});

export const sectionIds = ['identity', 'shell', 'safety', 'feed', 'firing', 'casing'] as const;
export type SectionId = (typeof sectionIds)[number];

export const criterion = z.strictObject({
  id: z.string(),
  section: z.enum(sectionIds),
  /** 1–34, in the order of examination; the number of its balloon on the drawing. */
  number: z.int().min(1),
  title: z.string(),
  /** Share of 100 over the whole rubric. */
  weight: z.int().min(1),
  safetyCritical: z.boolean(),
  /** What follows where the thing itself is missing from the boiler. */
  ifNotFitted: z.enum(['nothing', 'repair-before-steaming', 'do-not-steam']),
  appliesTo,
  /** Weakest first. */
  ways: z.array(way).min(1),
  measurements: z.array(measurementSpec),
  lookFor,
  photosWanted: z.array(z.string()),
  defects: z.array(defectSpec),
});
export type Criterion = z.infer<typeof criterion>;

export const section = z.strictObject({
  id: z.enum(sectionIds),
  title: z.string(),
  criteria: z.array(criterion),
});
export type Section = z.infer<typeof section>;

/** One published version of the method. Never changed once published: a changed weight or rule is a new version. */
export const rubric = z.strictObject({
  version: z.string(),
  publishedOn: z.iso.date(),
  /** What is different from the version before, in words. */
  changes: z.array(z.string()),
  sections: z.array(section),
});
export type Rubric = z.infer<typeof rubric>;
