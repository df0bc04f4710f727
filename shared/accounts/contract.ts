import { z } from 'zod';
import { done, endpoint } from '../endpoint.ts';
import { instant } from '../time.ts';
import { role } from './roles.ts';

export const units = z.enum(['imperial', 'metric']);
export type Units = z.infer<typeof units>;

export const displayName = z
  .string()
  .trim()
  .min(2, 'Give a name of at least two letters')
  .max(80, 'Keep it under 80 characters');

export const me = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  emailVerified: z.boolean(),
  roles: z.array(role),
  units,
  hasSecondFactor: z.boolean(),
  /** The office role is held back until a second factor is set up. */
  mustEnrol: z.boolean(),
  /** Demonstration only: the office may go on without a second factor. */
  canSkipEnrolment: z.boolean(),
});
export type Me = z.infer<typeof me>;

export const getMe = endpoint({
  name: 'getMe',
  summary: 'Who is signed in; null for a visitor',
  method: 'GET',
  path: '/api/me',
  response: z.object({ me: me.nullable() }),
});

export const updateMe = endpoint({
  name: 'updateMe',
  summary: 'Change my name or units',
  method: 'PATCH',
  path: '/api/me',
  body: z.strictObject({ name: displayName.optional(), units: units.optional() }),
  response: me,
});

export const demoAccount = z.object({
  email: z.string(),
  name: z.string(),
  part: z.string(),
  password: z.string(),
});

export const getSite = endpoint({
  name: 'getSite',
  summary: 'What the site is running as: demonstration or live, and the demonstration accounts',
  method: 'GET',
  path: '/api/site',
  response: z.object({
    isDemo: z.boolean(),
    demoAccounts: z.array(demoAccount),
    platformChargePercent: z.number(),
  }),
});

export const letter = z.object({
  id: z.string(),
  to: z.string(),
  from: z.string(),
  subject: z.string(),
  sentAt: instant,
  text: z.string(),
  attachments: z.array(z.object({ filename: z.string(), contentType: z.string(), bytes: z.int() })),
});
export type Letter = z.infer<typeof letter>;

export const listLetters = endpoint({
  name: 'listLetters',
  summary: 'Demonstration only: the letters the site has sent, newest first',
  method: 'GET',
  path: '/api/letters',
  query: z.strictObject({ to: z.string().max(200).optional() }),
  response: z.object({ items: z.array(letter) }),
});

export const skipEnrolment = endpoint({
  name: 'skipEnrolment',
  summary: 'Demonstration only: use the office without a second factor in this session',
  method: 'POST',
  path: '/api/me/skip-enrolment',
  response: done,
});
