import { z } from 'zod';
import { endpoint } from '../endpoint.ts';
import { instant } from '../time.ts';

/** One thing that waits for the person asking. */
export const deskItem = z.object({
  id: z.string(),
  /** What to do, an imperative. */
  todo: z.string(),
  about: z.string(),
  why: z.string(),
  path: z.string(),
  dueAt: instant.nullable(),
  since: instant,
});
export type DeskItem = z.infer<typeof deskItem>;

export const getDesk = endpoint({
  name: 'getDesk',
  summary: 'What waits for me, most pressing first',
  method: 'GET',
  path: '/api/desk',
  response: z.object({ items: z.array(deskItem) }),
});
