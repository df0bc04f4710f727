import { Problem } from '#shared/problem.ts';
import type { OrderStatus } from '#shared/survey-orders/machine.ts';
import { requireActor } from '../../ctx.ts';
import type { Actor, Ctx } from '../../ctx.ts';
import * as accounts from '../accounts/service.ts';
import type { Person } from '../accounts/service.ts';
import * as repo from './repo.ts';
import type { StoredOrder } from './repo.ts';

/** The part a person plays in an order. The office reads, and moves nothing. */
export type Part = 'buyer' | 'seller' | 'surveyor' | 'office';

export function partOf(order: StoredOrder, actor: Actor): Part | undefined {
  if (actor.id === order.buyerId) return 'buyer';
  if (actor.id === order.sellerId) return 'seller';
  if (actor.id === order.surveyorId) return 'surveyor';
  return actor.roles.has('office') ? 'office' : undefined;
}

const requirePart = (ctx: Ctx, order: StoredOrder | undefined): { order: StoredOrder; part: Part } => {
  const part = order && partOf(order, requireActor(ctx));
  if (!order || !part) throw new Problem('not-found');
  return { order, part };
};

/** @throws Problem not-signed-in, not-found to a stranger. */
export async function getOwnOrder(ctx: Ctx, id: string): Promise<{ order: StoredOrder; part: Part }> {
  requireActor(ctx);
  return requirePart(ctx, await repo.findOrder(ctx.db, id));
}

/** The same, held against others until the transaction ends. */
export async function holdOwnOrder(ctx: Ctx, id: string): Promise<{ order: StoredOrder; part: Part }> {
  requireActor(ctx);
  return requirePart(ctx, await repo.findOrderForUpdate(ctx.db, id));
}

/** States in which the surveyor, too, knows where the boiler stands. */
const addressKnown: ReadonlySet<OrderStatus> = new Set([
  'arranged',
  'examining',
  'in-review',
  'settling',
  'settled',
]);

export const maySeeAddress = (part: Part, status: OrderStatus): boolean =>
  part === 'seller' || (part === 'surveyor' && addressKnown.has(status));

export type Parties = Record<'buyer' | 'seller' | 'surveyor', Person>;

export async function getParties(ctx: Ctx, order: StoredOrder): Promise<Parties> {
  const people = await accounts.getPeople(ctx, [order.buyerId, order.sellerId, order.surveyorId]);
  const need = (id: string): Person => {
    const person = people.get(id);
    if (!person) throw new Problem('not-found');
    return person;
  };
  return { buyer: need(order.buyerId), seller: need(order.sellerId), surveyor: need(order.surveyorId) };
}
