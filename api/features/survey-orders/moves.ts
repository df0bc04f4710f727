import { Problem } from '#shared/problem.ts';
import { orderClocks, surveyOrderMachine } from '#shared/survey-orders/machine.ts';
import type { OrderEvent, OrderStatus } from '#shared/survey-orders/machine.ts';
import { addHours } from '#shared/time.ts';
import type { Instant } from '#shared/time.ts';
import type { Ctx } from '../../ctx.ts';
import * as listings from '../listings/service.ts';
import * as payments from '../payments/service.ts';
import { lettersOf } from './letters.ts';
import { getParties } from './parties.ts';
import type { Part } from './parties.ts';
import * as repo from './repo.ts';
import type { OrderMove, StoredOrder } from './repo.ts';

/** Hours after which an order in a state moves on by itself; null where nothing happens unless somebody acts. */
const hoursIn: Record<OrderStatus, number | null> = {
  'awaiting-payment': orderClocks.payHours,
  'awaiting-surveyor': orderClocks.acceptHours,
  arranging: null,
  arranged: null,
  examining: null,
  'in-review': orderClocks.reviewDays * 24,
  settling: null,
  'refund-due': null,
  settled: null,
  refunded: null,
  cancelled: null,
};

const clockOf = (status: OrderStatus, now: Instant): Instant | null => {
  const hours = hoursIn[status];
  return hours === null ? null : addHours(now, hours);
};

/** Promises what must follow from having come into a state. */
async function promise(ctx: Ctx, order: StoredOrder, reason: string): Promise<void> {
  const job = { orderId: order.id };
  switch (order.status) {
    case 'awaiting-surveyor':
      await ctx.queue.enqueue(ctx, 'lapse-order', job, order.dueAt ?? undefined);
      return;
    case 'in-review':
      await ctx.queue.enqueue(ctx, 'end-review', job, order.dueAt ?? undefined);
      return;
    case 'settling':
      await ctx.queue.enqueue(ctx, 'release-fee', job);
      return;
    case 'refund-due':
      await payments.startRefund(ctx, order.id, reason);
      await ctx.queue.enqueue(ctx, 'refund-order', job);
      return;
    case 'cancelled':
      await payments.expire(ctx, order.id, reason);
      return;
    case 'awaiting-payment':
    case 'arranging':
    case 'arranged':
    case 'examining':
    case 'settled':
    case 'refunded':
  }
}

async function sendLetters(
  ctx: Ctx,
  event: OrderEvent,
  order: StoredOrder,
  reason: string,
  by: Part | 'system',
): Promise<void> {
  const isAgreed = event === 'agreeTime';
  const letters = lettersOf(
    {
      event,
      order,
      parties: await getParties(ctx, order),
      reason,
      publicUrl: ctx.site.publicUrl,
      address: isAgreed ? await listings.getAddress(ctx, order.listing.id) : null,
      timesAgreed: isAgreed ? await countAgreed(ctx, order.id) : 0,
    },
    by,
  );
  for (const letter of letters) await ctx.queue.enqueue(ctx, 'send-letter', letter);
}

/** How often a time has been agreed. */
export async function countAgreed(ctx: Ctx, orderId: string): Promise<number> {
  return (await repo.listEvents(ctx.db, orderId)).filter(({ event }) => event === 'agreeTime').length;
}

interface Move {
  reason?: string;
  change?: OrderMove['change'];
}

/**
 * Moves an order that is held in this transaction: the row, its record, its money, its clock and its letters, or none of them.
 * @throws Problem wrong-state, not-permitted, changed-meanwhile.
 */
export async function move(
  ctx: Ctx,
  order: StoredOrder,
  event: OrderEvent,
  by: Part | 'system',
  { reason = '', change = {} }: Move = {},
): Promise<StoredOrder> {
  const now = ctx.now();
  const to = surveyOrderMachine.next(order.status, event, by);
  const dueAt = clockOf(to, now);
  const actorId = by === 'system' ? null : (ctx.actor?.id ?? null);
  const hasMoved = await repo.moveOrder(ctx.db, order, {
    event,
    to,
    actorId,
    reason,
    at: now,
    dueAt,
    change,
  });
  if (!hasMoved) throw new Problem('changed-meanwhile');
  const moved: StoredOrder = {
    ...order,
    status: to,
    movedAt: now,
    dueAt,
    proposedTimes: [...(change.proposedTimes ?? order.proposedTimes)],
    appointmentAt: change.appointmentAt === undefined ? order.appointmentAt : change.appointmentAt,
  };
  await promise(ctx, moved, reason);
  await sendLetters(ctx, event, moved, reason, by);
  return moved;
}
