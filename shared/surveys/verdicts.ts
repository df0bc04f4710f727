import { z } from 'zod';

/** The verdict on the boiler as found on the day, best first. */
export const verdicts = {
  'in-steaming-order': 'In steaming order',
  'not-proven': 'Not proven',
  'repair-before-steaming': 'Repair before steaming',
  'do-not-steam': 'Do not steam',
} as const;
export type VerdictId = keyof typeof verdicts;
export const verdictId = z.enum(Object.keys(verdicts) as [VerdictId, ...VerdictId[]]);
