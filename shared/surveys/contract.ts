import { z } from 'zod';
import { boilerFacts } from '../boilers/boiler.ts';
import { byId, endpoint } from '../endpoint.ts';
import { photo } from '../listings/pictures.ts';
import { day, instant } from '../time.ts';
import { agreement } from './agreement.ts';
import { methodDataSchema } from './method.ts';
import { signOff, surveyRecord } from './record.ts';
import { surveyResult } from './result.ts';
import { extraId, scopeId } from './scopes.ts';
import { verdictId } from './verdicts.ts';

/** A survey being made: what the surveyor works on. `id` is the order's. */
export const survey = z.object({
  orderId: z.uuid(),
  listing: z.object({ id: z.uuid(), slug: z.string(), title: z.string(), photos: z.array(photo) }),
  facts: boilerFacts,
  scope: scopeId,
  extras: z.array(extraId),
  record: surveyRecord,
  photos: z.array(photo),
  version: z.int(),
  savedAt: instant,
  isFiled: z.boolean(),
  reportId: z.uuid().nullable(),
  /** While a filed report is corrected: which, its version, and why. */
  correction: z.object({ reportId: z.uuid(), version: z.int(), reason: z.string() }).nullable(),
});
export type Survey = z.infer<typeof survey>;

/** A filed report, frozen. */
export const report = z.object({
  id: z.uuid(),
  listing: z.object({ id: z.uuid(), slug: z.string(), title: z.string() }),
  surveyor: z.object({ name: z.string(), number: z.string() }),
  facts: boilerFacts,
  scope: scopeId,
  extras: z.array(extraId),
  record: surveyRecord,
  result: surveyResult,
  photos: z.array(photo),
  signOff,
  filedAt: instant,
  checkCode: z.string(),
  sellerPhotos: z.array(photo),
  viewer: z.object({ orderId: z.uuid().nullable(), canAccept: z.boolean() }),
});
export type Report = z.infer<typeof report>;

export const getSurvey = endpoint({
  name: 'getSurvey',
  summary: 'The survey I am making',
  method: 'GET',
  path: '/api/survey-orders/:id/survey',
  params: byId,
  response: survey,
});

export const saveSurvey = endpoint({
  name: 'saveSurvey',
  summary: 'Save the survey as far as it has got',
  method: 'PUT',
  path: '/api/survey-orders/:id/survey',
  params: byId,
  body: z.strictObject({ version: z.int(), record: surveyRecord }),
  response: survey,
});

export const fileSurvey = endpoint({
  name: 'fileSurvey',
  summary:
    'Sign and file the report; refused if the result computed here differs from the one shown to the surveyor',
  method: 'POST',
  path: '/api/survey-orders/:id/survey/file',
  params: byId,
  body: z.strictObject({ version: z.int(), signOff, result: surveyResult }),
  response: report,
});

export const getReport = endpoint({
  name: 'getReport',
  summary: 'A filed report, open to everyone',
  method: 'GET',
  path: '/api/reports/:id',
  params: byId,
  response: report,
});

/** Another filed report on the same boiler, and how far it agrees; the first grade of a difference is this report's. */
export const reportAgreement = z.object({
  id: z.uuid(),
  filedAt: instant,
  surveyor: z.object({ name: z.string() }),
  verdict: verdictId,
  agreement,
});
export type ReportAgreement = z.infer<typeof reportAgreement>;

export const getReportAgreements = endpoint({
  name: 'getReportAgreements',
  summary: 'How far a filed report agrees with every other on the same boiler, newest first',
  method: 'GET',
  path: '/api/reports/:id/agreements',
  params: byId,
  response: z.object({ items: z.array(reportAgreement) }),
});

/** What stands behind a check code on the day it is asked. */
export const checkedReport = z.object({
  status: z.enum(['genuine', 'superseded', 'changed', 'unknown']),
  reportId: z.uuid().nullable(),
  version: z.int().nullable(),
  filedAt: instant.nullable(),
  examinedOn: day.nullable(),
  /** Whole days since the examination. */
  ageDays: z.int().nullable(),
  isOld: z.boolean(),
  /** The newest version, where this is not it. */
  newer: z.object({ reportId: z.uuid(), version: z.int(), filedAt: instant, reason: z.string() }).nullable(),
});
export type CheckedReport = z.infer<typeof checkedReport>;

export const checkReport = endpoint({
  name: 'checkReport',
  summary:
    'Whether a check code is that of a filed report, unchanged and not corrected since, and how old it is',
  method: 'GET',
  path: '/api/checks/:code',
  params: z.strictObject({ code: z.string().min(4).max(20) }),
  response: checkedReport,
});

export const getMethod = endpoint({
  name: 'getMethod',
  summary:
    'The published method: sections, criteria, weights, defects and verdict rules; the current version unless another is asked for',
  method: 'GET',
  path: '/api/method',
  query: z.strictObject({ version: z.string().max(20).optional() }),
  response: methodDataSchema,
});

export const scoreBySurveyMethod = endpoint({
  name: 'scoreBySurveyMethod',
  summary: 'Score findings by the published method, so that anyone can check our scoring',
  method: 'POST',
  path: '/api/method/score',
  body: z.strictObject({ facts: boilerFacts, scope: scopeId, record: surveyRecord }),
  response: surveyResult,
});
