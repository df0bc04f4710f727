import { z } from 'zod';

export const actions = {
  double: 'Double-acting',
  single: 'Single-acting',
} as const;
export type Action = keyof typeof actions;
const action = z.enum(Object.keys(actions) as [Action, ...Action[]], 'Choose single- or double-acting');

const lengthMm = (what: string) =>
  z
    .number(`Give the ${what}`)
    .min(2, `A ${what} is at least 2 mm`)
    .max(300, `A ${what} over 300 mm is no model’s`);

/** An engine as far as its thirst for steam goes. Of a compound, the high-pressure cylinders only. */
export const engineFacts = z.strictObject({
  boreMm: lengthMm('bore'),
  strokeMm: lengthMm('stroke'),
  cylinders: z
    .int('A whole number of cylinders')
    .min(1, 'At least one cylinder')
    .max(12, 'At most 12 cylinders'),
  action,
  speedRpm: z
    .number('Give the speed')
    .min(10, 'At least 10 revolutions a minute')
    .max(6_000, 'At most 6,000 revolutions a minute'),
  /** Share of the stroke, in per cent, at which steam is cut off. */
  cutOffPercent: z
    .number('Give the cut-off')
    .min(5, 'A cut-off is at least 5 %')
    .max(100, 'A cut-off is at most 100 % of the stroke'),
  /** At the engine, gauge. */
  pressurePa: z
    .number('Give the steam pressure')
    .min(10_000, 'A steam pressure is at least 0.1 bar')
    .max(2_000_000, 'More than 20 bar (290 psi) is outside what Tubeplate handles'),
});
export type EngineFacts = z.infer<typeof engineFacts>;

/** What a member may keep in their profile. */
export const engineDraft = engineFacts.extend({
  name: z.string().trim().min(1, 'Give it a name').max(80, 'Keep it under 80 characters'),
});
export type EngineDraft = z.infer<typeof engineDraft>;
