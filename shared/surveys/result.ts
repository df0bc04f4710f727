import { z } from 'zod';
import { sectionIds } from './rubric/types.ts';
import { verdictId } from './verdicts.ts';

/** A figure behind a statement, in SI-based units, for a screen to show in the reader's own. */
export const figure = z.strictObject({
  label: z.string(),
  value: z.number(),
  unit: z.enum(['Pa', 'mm', 'ppm', 'kg/h', 'min', 'count', '%', 'bar·L', 'kW', 'L', 'day']),
});
export type Figure = z.infer<typeof figure>;

/** Why a verdict was given: the rule that fired, what it fired on, and the figures. */
export const reason = z.strictObject({
  rule: z.string(),
  verdict: verdictId,
  criterionId: z.string().nullable(),
  text: z.string(),
  figures: z.array(figure),
});
export type Reason = z.infer<typeof reason>;

export const engineeringCheck = z.strictObject({
  id: z.string(),
  title: z.string(),
  status: z.enum(['pass', 'fail', 'cannot-say']),
  /** Whether failing it means do not steam; otherwise it means repair before steaming. */
  stop: z.boolean(),
  criterionId: z.string().nullable(),
  text: z.string(),
  figures: z.array(figure),
});
export type EngineeringCheck = z.infer<typeof engineeringCheck>;

const minor = z.int().min(0);
const hours = z.number().min(0);
const spread = { hoursLow: hours, hoursHigh: hours, partsLowMinor: minor, partsHighMinor: minor };
const total = { lowMinor: minor, highMinor: minor };

export const allowanceGroups = {
  must: 'Must be done before steaming',
  should: 'Should be done',
  looks: 'For looks',
} as const;
export type AllowanceGroupId = keyof typeof allowanceGroups;
const groupId = z.enum(Object.keys(allowanceGroups) as [AllowanceGroupId, ...AllowanceGroupId[]]);

export const allowanceLine = z.strictObject({
  criterionId: z.string(),
  defectCode: z.string(),
  label: z.string(),
  where: z.string(),
  remedy: z.string(),
  /** Whether the surveyor put a figure of their own over the catalogue's. */
  isOverridden: z.boolean(),
  ...spread,
  ...total,
});
export type AllowanceLine = z.infer<typeof allowanceLine>;

export const allowanceGroup = z.strictObject({
  id: groupId,
  label: z.string(),
  ...spread,
  ...total,
  lines: z.array(allowanceLine),
});
export type AllowanceGroup = z.infer<typeof allowanceGroup>;

export const allowance = z.strictObject({
  currency: z.literal('GBP'),
  labourMinorPerHour: minor,
  groups: z.array(allowanceGroup),
  /** Tests that must follow a repair to the shell. */
  retestCosts: z.array(z.strictObject({ id: z.string(), label: z.string(), minor })),
  total: z.strictObject(total),
});
export type Allowance = z.infer<typeof allowance>;

export const sectionScore = z.strictObject({
  id: z.enum(sectionIds),
  title: z.string(),
  /** 0–100, nearest whole number; null where nothing of it was examined. */
  mean: z.int().min(0).max(100).nullable(),
  /** 0–100 %, rounded down; null where nothing of it applies. */
  evidence: z.int().min(0).max(100).nullable(),
});
export type SectionScore = z.infer<typeof sectionScore>;

/** What a set of findings comes to. Stored with the report and recomputed to the same bytes. */
export const surveyResult = z.strictObject({
  rubricVersion: z.string(),
  /** 0–100; null where less than a third of what applies was examined. */
  condition: z.int().min(0).max(100).nullable(),
  /** 0–100 %, rounded down. */
  evidence: z.int().min(0).max(100),
  /** Evidence over the safety-critical criteria alone, rounded down. */
  safetyEvidence: z.int().min(0).max(100),
  sections: z.array(sectionScore),
  verdict: z.strictObject({ id: verdictId, label: z.string() }),
  /** Everything that fired for the verdict given. */
  reasons: z.array(reason),
  /** What would still stand if those were put right. */
  furtherReasons: z.array(reason),
  /** What would have to be done for the boiler to be proven. */
  toProve: z.array(z.strictObject({ rule: z.string(), text: z.string() })),
  checks: z.array(engineeringCheck),
  allowance,
  notExamined: z.array(
    z.strictObject({
      criterionId: z.string(),
      title: z.string(),
      safetyCritical: z.boolean(),
      reason: z.string(),
    }),
  ),
});
export type SurveyResult = z.infer<typeof surveyResult>;
