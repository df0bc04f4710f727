import { wayLabels } from './types.ts';
import type {
  AppliesTo,
  Consequence,
  Criterion,
  DefectSpec,
  MeasurementSpec,
  MeasureUnit,
  PartsBand,
  MaterialClass,
  Section,
  StopKind,
  Way,
  WayId,
} from './types.ts';
import type { Remedy } from '../record.ts';

/** Low and high in whole pounds. */
type Pounds = readonly [low: number, high: number];
type Parts = Record<MaterialClass, PartsBand>;

/**
 * Ways from the weakest to the strongest; strength follows from the place in the list.
 * One way alone is 1; of two, 0.5 and 1; of three, 0.5, 0.75 and 1.
 */
export function ways(...ids: readonly WayId[]): Way[] {
  const steps = Math.max(1, ids.length - 1);
  return ids.map((id, index) => ({
    id,
    label: wayLabels[id],
    strength: ids.length === 1 ? 1 : 0.5 + (0.5 * index) / steps,
  }));
}

const pence = ([low, high]: Pounds): PartsBand => ({ lowMinor: low * 100, highMinor: high * 100 });

/** Parts that cost the same whatever the boiler is made of. */
export const parts = (low: number, high: number): Parts => metals([low, high], [low, high], [low, high]);

/** Parts whose cost depends on the metal; stainless stock is reckoned at one and a half times mild steel. */
export const metals = (
  copper: Pounds,
  brass: Pounds,
  steel: Pounds,
  stainless: Pounds = [Math.round(steel[0] * 1.5), Math.round(steel[1] * 1.5)],
): Parts => ({
  copper: pence(copper),
  brass: pence(brass),
  steel: pence(steel),
  stainless: pence(stainless),
});

export const noParts: Parts = metals([0, 0], [0, 0], [0, 0]);

/** One defect of the catalogue; hours at the bench, low and high. */
export const defect = (
  code: string,
  label: string,
  [grade, consequence, remedy]: readonly [DefectSpec['grade'], Consequence, Remedy],
  [hoursLow, hoursHigh]: readonly [low: number, high: number],
  costs: Parts = noParts,
  stop: StopKind | null = null,
): DefectSpec => ({
  code,
  label,
  grade,
  consequence,
  remedy,
  allowance: { hoursLow, hoursHigh, parts: costs },
  stop,
});

const measure = (
  quantity: string,
  label: string,
  unit: MeasureUnit,
  [min, max]: readonly [number | null, number | null],
  more: Partial<Pick<MeasurementSpec, 'choices' | 'takenIn'>> = {},
): MeasurementSpec => ({ quantity, label, unit, min, max, choices: [], takenIn: 'finding', ...more });

export const lengthMm = (quantity: string, label: string, min: number, max: number): MeasurementSpec =>
  measure(quantity, label, 'mm', [min, max]);
export const pressurePa = (quantity: string, label: string, max = 6_000_000, min = 0): MeasurementSpec =>
  measure(quantity, label, 'Pa', [min, max]);
export const litres = (quantity: string, label: string, max: number): MeasurementSpec =>
  measure(quantity, label, 'L', [0, max]);
export const count = (quantity: string, label: string, max: number): MeasurementSpec =>
  measure(quantity, label, 'count', [0, max]);
export const rate = (
  quantity: string,
  label: string,
  unit: 'kg/h' | 'Pa/min',
  max: number,
): MeasurementSpec => measure(quantity, label, unit, [0, max]);
export const words = (quantity: string, label: string): MeasurementSpec =>
  measure(quantity, label, 'text', [null, null]);
export const yesNo = (quantity: string, label: string): MeasurementSpec =>
  measure(quantity, label, 'yes-no', [null, null]);
export const choice = (
  quantity: string,
  label: string,
  choices: Readonly<Record<string, string>>,
): MeasurementSpec =>
  measure(quantity, label, 'choice', [null, null], {
    choices: Object.entries(choices).map(([id, text]) => ({ id, label: text })),
  });
/** A figure of the steam test, shown with the criterion it speaks of. */
export const fromSteam = (quantity: string, label: string, unit: MeasureUnit): MeasurementSpec =>
  measure(quantity, label, unit, [null, null], { takenIn: 'steam' });

export const always: AppliesTo = { traits: [], fittings: [], firings: [] };
export const only = (when: Partial<AppliesTo>): AppliesTo => ({ ...always, ...when });

type Draft = Omit<
  Criterion,
  'id' | 'section' | 'number' | 'safetyCritical' | 'ifNotFitted' | 'measurements'
> &
  Partial<Pick<Criterion, 'safetyCritical' | 'ifNotFitted' | 'measurements'>>;

/** A section's criteria from its data: ids are `section.name`, numbers run on from the section before. */
export const section = (
  id: Section['id'],
  title: string,
  firstNumber: number,
  drafts: Readonly<Record<string, Draft>>,
): Section => ({
  id,
  title,
  criteria: Object.entries(drafts).map(([name, draft], index) => ({
    id: `${id}.${name}`,
    section: id,
    number: firstNumber + index,
    title: draft.title,
    weight: draft.weight,
    safetyCritical: draft.safetyCritical ?? false,
    ifNotFitted: draft.ifNotFitted ?? 'nothing',
    appliesTo: draft.appliesTo,
    ways: draft.ways,
    measurements: draft.measurements ?? [],
    lookFor: draft.lookFor,
    photosWanted: draft.photosWanted,
    defects: draft.defects,
  })),
});
export type CriterionDraft = Draft;
