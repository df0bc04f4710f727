import { randomUUID } from 'node:crypto';
import { mostEngines } from '#shared/engines/contract.ts';
import type { Engine } from '#shared/engines/contract.ts';
import type { EngineDraft } from '#shared/engines/engine.ts';
import { Problem } from '#shared/problem.ts';
import { inTransaction, requireActor } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as repo from './repo.ts';

/** The engines the actor keeps, in the order they were kept. */
export const listEngines = (ctx: Ctx): Promise<Engine[]> => repo.listEngines(ctx.db, requireActor(ctx).id);

/** @throws Problem wrong-state where as many are kept already as may be. */
export function keepEngine(ctx: Ctx, draft: EngineDraft): Promise<Engine> {
  const actor = requireActor(ctx);
  return inTransaction(ctx, async (ctx) => {
    if ((await repo.countEngines(ctx.db, actor.id)) >= mostEngines)
      throw new Problem(
        'wrong-state',
        `You keep ${String(mostEngines)} engines already: remove one to keep another.`,
      );
    return repo.insertEngine(ctx.db, { id: randomUUID(), ownerId: actor.id, at: ctx.now(), draft });
  });
}

/** @throws Problem not-found where the engine is not the actor's. */
export async function changeEngine(ctx: Ctx, id: string, draft: EngineDraft): Promise<Engine> {
  const changed = await repo.updateEngine(ctx.db, requireActor(ctx).id, id, draft);
  if (!changed) throw new Problem('not-found');
  return changed;
}

/** @throws Problem not-found where the engine is not the actor's. */
export async function forgetEngine(ctx: Ctx, id: string): Promise<void> {
  const wasKept = await repo.deleteEngine(ctx.db, requireActor(ctx).id, id);
  if (!wasKept) throw new Problem('not-found');
}
