import { z } from 'zod';
import { byId, done, endpoint } from '../endpoint.ts';
import { engineDraft } from './engine.ts';

/** As many engines as one member may keep. */
export const mostEngines = 20;

export const engine = engineDraft.extend({ id: z.uuid() });
export type Engine = z.infer<typeof engine>;

export const listEngines = endpoint({
  name: 'listEngines',
  summary: 'The engines I keep, in the order I kept them',
  method: 'GET',
  path: '/api/engines',
  response: z.object({ items: z.array(engine) }),
});

export const keepEngine = endpoint({
  name: 'keepEngine',
  summary: 'Keep an engine, so that every listing says whether its boiler drives it',
  method: 'POST',
  path: '/api/engines',
  body: engineDraft,
  response: engine,
  status: 201,
});

export const changeEngine = endpoint({
  name: 'changeEngine',
  summary: 'Change an engine I keep',
  method: 'PUT',
  path: '/api/engines/:id',
  params: byId,
  body: engineDraft,
  response: engine,
});

export const forgetEngine = endpoint({
  name: 'forgetEngine',
  summary: 'Keep an engine no longer',
  method: 'DELETE',
  path: '/api/engines/:id',
  params: byId,
  response: done,
});
