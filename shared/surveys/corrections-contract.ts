import { z } from 'zod';
import { byId, done, endpoint } from '../endpoint.ts';
import { instant } from '../time.ts';
import { survey } from './contract.ts';

export const correctionReason = z
  .string('Give the reason')
  .trim()
  .min(10, 'Give the reason in ten characters or more')
  .max(600, 'Keep it under 600 characters');

/** One version of a report; the first has no reason. */
export const reportVersion = z.object({
  reportId: z.uuid(),
  version: z.int(),
  filedAt: instant,
  reason: z.string().nullable(),
});
export type ReportVersion = z.infer<typeof reportVersion>;

export const reportVersions = z.object({
  /** Oldest first. */
  items: z.array(reportVersion),
  viewer: z.object({
    canCorrect: z.boolean(),
    /** The order whose correction the person asking has begun and not filed. */
    correctingOrderId: z.uuid().nullable(),
  }),
});
export type ReportVersions = z.infer<typeof reportVersions>;

export const getReportVersions = endpoint({
  name: 'getReportVersions',
  summary: 'Every version of a report: as filed, and as corrected since',
  method: 'GET',
  path: '/api/reports/:id/versions',
  params: byId,
  response: reportVersions,
});

export const startCorrection = endpoint({
  name: 'startCorrection',
  summary: 'Open the survey of my filed report again, to file a corrected version of it',
  method: 'POST',
  path: '/api/reports/:id/corrections',
  params: byId,
  body: z.strictObject({ reason: correctionReason }),
  response: survey,
});

export const giveUpCorrection = endpoint({
  name: 'giveUpCorrection',
  summary: 'Give up my correction before it is filed; the report stands as it was',
  method: 'DELETE',
  path: '/api/survey-orders/:id/survey/correction',
  params: byId,
  response: done,
});
