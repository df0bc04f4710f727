import { z } from 'zod';
import { byId, endpoint } from '../endpoint.ts';
import { day, instant } from '../time.ts';

const words = z
  .string('Write something')
  .trim()
  .min(2, 'Write something')
  .max(600, 'Keep it under 600 characters');

/** What the seller answered to one finding, and to which version of the report. */
export const reply = z.object({
  criterionId: z.string(),
  text: z.string(),
  at: instant,
  version: z.int(),
});
export type Reply = z.infer<typeof reply>;

/** What the seller says was done to the boiler after the examination. */
export const repair = z.object({ id: z.uuid(), text: z.string(), doneOn: day, at: instant });
export type Repair = z.infer<typeof repair>;

/** How many repairs a report lists at most. */
export const mostRepairs = 20;

export const reportReplies = z.object({
  replies: z.array(reply),
  /** In the order of the day they were done. */
  repairs: z.array(repair),
  viewer: z.object({ canReply: z.boolean() }),
});
export type ReportReplies = z.infer<typeof reportReplies>;

export const newReply = z.strictObject({ criterionId: z.string().max(60), text: words });
export const newRepair = z.strictObject({ text: words, doneOn: day });

export const getReportReplies = endpoint({
  name: 'getReportReplies',
  summary: 'What the seller answers to a report, finding by finding, and the repairs since',
  method: 'GET',
  path: '/api/reports/:id/replies',
  params: byId,
  response: reportReplies,
});

export const replyToFinding = endpoint({
  name: 'replyToFinding',
  summary: 'Answer one finding on my boiler, once; the grade stays',
  method: 'POST',
  path: '/api/reports/:id/replies',
  params: byId,
  body: newReply,
  response: reportReplies,
});

export const listRepair = endpoint({
  name: 'listRepair',
  summary: 'List a repair done to my boiler since the report',
  method: 'POST',
  path: '/api/reports/:id/repairs',
  params: byId,
  body: newRepair,
  response: reportReplies,
});
