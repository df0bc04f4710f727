import { pointer, invalidField, Problem } from '#shared/problem.ts';
import type { OrderSummary, SurveyOrder } from '#shared/survey-orders/contract.ts';
import { mayCorrectReport, surveyOrderMachine } from '#shared/survey-orders/machine.ts';
import type { OrderEvent, OrderStatus } from '#shared/survey-orders/machine.ts';
import { addDays, isBefore, msBetween } from '#shared/time.ts';
import type { Instant } from '#shared/time.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { inTransaction, requireActor, requireRole } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as listings from '../listings/service.ts';
import * as payments from '../payments/service.ts';
import * as surveys from '../surveys/service.ts';
import { addressText, calendarFile } from './calendar.ts';
import { correctionLetters } from './letters.ts';
import { closeCheckout, receivePayment } from './money.ts';
import { countAgreed, move } from './moves.ts';
import { getOwnOrder, getParties, holdOwnOrder, maySeeAddress, partOf } from './parties.ts';
import type { Part } from './parties.ts';
import * as repo from './repo.ts';
import type { OrderMove, StoredOrder } from './repo.ts';
import { toSummaries, toView } from './views.ts';

export { payForSurvey, placeSurveyOrder, quoteSurvey } from './commission.ts';
export { endReview, lapseOrder, lapseUnpaid, receivePayment, refundOrder, settleOrder } from './money.ts';
export type { Receipt } from './money.ts';
export { getParties } from './parties.ts';
export type { Part } from './parties.ts';
export type { StoredOrder } from './repo.ts';

/** An order nobody has paid for concerns only the buyer. */
const isUnpaid = ({ status }: StoredOrder): boolean =>
  status === 'awaiting-payment' || status === 'cancelled';

/** The orders in which the person asking has a part, newest first. */
export async function listOwnOrders(ctx: Ctx): Promise<{ order: StoredOrder; part: Part }[]> {
  const actor = requireActor(ctx);
  return (await repo.listOrdersOf(ctx.db, actor.id)).flatMap((order) => {
    const part = partOf(order, actor);
    return part && (part === 'buyer' || !isUnpaid(order)) ? [{ order, part }] : [];
  });
}

export const listSurveyOrders = async (ctx: Ctx): Promise<OrderSummary[]> =>
  toSummaries(ctx, await listOwnOrders(ctx));

export async function getSurveyOrder(ctx: Ctx, id: string): Promise<SurveyOrder> {
  const { order, part } = await getOwnOrder(ctx, id);
  return toView(ctx, order, part);
}

/** For the office and for the system: orders as they are stored, the longest unmoved first. */
export const listOrdersIn = (ctx: Ctx, ...statuses: readonly OrderStatus[]): Promise<StoredOrder[]> =>
  repo.listOrdersIn(ctx.db, statuses.length > 0 ? statuses : undefined, 500);

/** For the system. @throws Problem not-found. */
export async function getStoredOrder(ctx: Ctx, id: string): Promise<StoredOrder> {
  const order = await repo.findOrder(ctx.db, id);
  if (!order) throw new Problem('not-found');
  return order;
}

interface Act {
  reason?: string;
  /** Looks at the order before it moves, and may refuse. */
  check?: (order: StoredOrder) => OrderMove['change'];
  /** Done in the same transaction, after the move. */
  after?: (ctx: Ctx, order: StoredOrder) => Promise<void>;
}

/** What a party does to an order. Of several at once, one is done and the others are told that it no longer can be. */
function moveOwn(
  ctx: Ctx,
  id: string,
  event: OrderEvent,
  { reason, check, after }: Act = {},
): Promise<{ order: StoredOrder; part: Part }> {
  return inTransaction(ctx, async (ctx) => {
    const { order, part } = await holdOwnOrder(ctx, id);
    // First whether it may be done at all, then whether what was sent with it will do.
    surveyOrderMachine.next(order.status, event, part);
    const moved = await move(ctx, order, event, part, { reason, change: check?.(order) });
    await after?.(ctx, moved);
    return { order: moved, part };
  });
}

async function act(ctx: Ctx, id: string, event: OrderEvent, how?: Act): Promise<SurveyOrder> {
  const { order, part } = await moveOwn(ctx, id, event, how);
  return toView(ctx, order, part);
}

/** Asks the payment service whether an order has been paid, when its notice is late. */
export async function checkPayment(ctx: Ctx, id: string): Promise<SurveyOrder> {
  const { order, part } = await getOwnOrder(ctx, id);
  if (part !== 'buyer') throw new Problem('not-permitted');
  const { checkoutId } = await payments.getPayment(ctx, order.id);
  if (checkoutId !== null) await receivePayment(ctx, checkoutId);
  return getSurveyOrder(ctx, id);
}

export const acceptSurveyOrder = (ctx: Ctx, id: string): Promise<SurveyOrder> => act(ctx, id, 'accept');

export const declineSurveyOrder = (ctx: Ctx, id: string, reason: string): Promise<SurveyOrder> =>
  act(ctx, id, 'decline', { reason });

/** How far ahead a visit may be. */
const daysAhead = 60;

/** Proposes times for the visit; a time agreed before no longer holds. */
export function proposeTimes(ctx: Ctx, id: string, times: readonly Instant[]): Promise<SurveyOrder> {
  return act(ctx, id, 'proposeTimes', {
    check: () => {
      const now = ctx.now();
      const errors = times.flatMap((at, index) => {
        const detail = isBefore(at, now)
          ? 'That time has passed'
          : isBefore(addDays(now, daysAhead), at)
            ? `Propose a time within the next ${String(daysAhead)} days`
            : times.slice(0, index).some((other) => msBetween(other, at) === 0)
              ? 'That time is there twice'
              : undefined;
        return detail === undefined ? [] : [{ detail, pointer: pointer(['times', index]) }];
      });
      if (errors.length > 0)
        throw new Problem('invalid-input', 'Some of the times cannot be proposed.', errors);
      return { proposedTimes: times.toSorted((a, b) => msBetween(b, a)), appointmentAt: null };
    },
  });
}

/** Agrees one of the times proposed. From here on the surveyor knows the address. */
export function agreeTime(ctx: Ctx, id: string, startsAt: Instant): Promise<SurveyOrder> {
  return act(ctx, id, 'agreeTime', {
    check: ({ proposedTimes }) => {
      const appointmentAt = proposedTimes.find((at) => msBetween(at, startsAt) === 0);
      if (!appointmentAt) throw invalidField(['startsAt'], 'Choose one of the times that were proposed');
      if (isBefore(appointmentAt, ctx.now())) {
        throw invalidField(['startsAt'], 'That time has passed: ask the surveyor for new ones');
      }
      return { appointmentAt };
    },
  });
}

/** Cancels an order; money that is held goes back whole. */
export async function cancelSurveyOrder(ctx: Ctx, id: string, reason: string): Promise<SurveyOrder> {
  const { order, part } = await getOwnOrder(ctx, id);
  if (order.status === 'awaiting-payment' && part === 'buyer') await closeCheckout(ctx, id);
  return act(ctx, id, 'cancel', { reason });
}

/** Begins the examination: the survey is opened with the seller's statement as it stands. */
export const beginSurvey = (ctx: Ctx, id: string): Promise<SurveyOrder> =>
  act(ctx, id, 'begin', {
    after: (ctx, { id: orderId, listing }) => surveys.openSurvey(ctx, { id: orderId, listingId: listing.id }),
  });

export const abandonSurvey = (ctx: Ctx, id: string, reason: string): Promise<SurveyOrder> =>
  act(ctx, id, 'abandon', { reason });

/** The surveyor has filed the report. Called in the transaction that files it. */
export async function reportFiled(ctx: Ctx, orderId: string): Promise<void> {
  await moveOwn(ctx, orderId, 'fileReport');
}

/**
 * Holds an order whose report its surveyor may correct, until the transaction ends.
 * @throws Problem not-found, not-permitted, wrong-state.
 */
export async function holdCorrectable(ctx: Ctx, orderId: string): Promise<StoredOrder> {
  const { order, part } = await holdOwnOrder(ctx, orderId);
  if (part !== 'surveyor')
    throw new Problem('not-permitted', 'Only the surveyor who filed it may correct it.');
  if (!mayCorrectReport(order.status))
    throw new Problem('wrong-state', 'A report can be corrected only while its order stands.');
  return order;
}

/** A corrected version has been filed: into the record, and letters. Called in the transaction that files it. */
export async function reportCorrected(
  ctx: Ctx,
  order: StoredOrder,
  { version, reason }: { version: number; reason: string },
): Promise<void> {
  const { id: actorId } = requireActor(ctx);
  await repo.insertEvent(ctx.db, order, { event: 'correctReport', actorId, reason, at: ctx.now() });
  const parties = await getParties(ctx, order);
  const { publicUrl } = ctx.site;
  for (const letter of correctionLetters({ order, parties, reason, publicUrl }, version))
    await ctx.queue.enqueue(ctx, 'send-letter', letter);
}

export const acceptReport = (ctx: Ctx, id: string): Promise<SurveyOrder> => act(ctx, id, 'acceptReport');

/**
 * The visit as a calendar file, for the parties; only the seller and the surveyor find the address in it.
 * @throws Problem not-found, wrong-state while no time is agreed.
 */
export async function getCalendarFile(ctx: Ctx, id: string): Promise<string> {
  const { order, part } = await getOwnOrder(ctx, id);
  if (order.appointmentAt === null) throw new Problem('wrong-state', 'No time has been agreed yet.');
  const { id: listingId } = order.listing;
  const address = maySeeAddress(part, order.status) ? await listings.getAddress(ctx, listingId) : null;
  const town = (await listings.listListingBriefs(ctx, [listingId])).get(listingId)?.town.name;
  return calendarFile({
    orderId: order.id,
    title: order.listing.title,
    scope: order.scope,
    startsAt: order.appointmentAt,
    sequence: await countAgreed(ctx, order.id),
    place: address ? addressText(address) : (town ?? ''),
    url: `${ctx.site.publicUrl}${sitePaths.order(order.id)}`,
  });
}

/** @throws Problem not-permitted to all but the office. */
export async function listForOffice(ctx: Ctx, status: OrderStatus | undefined): Promise<StoredOrder[]> {
  requireRole(ctx, 'office');
  return listOrdersIn(ctx, ...(status ? [status] : []));
}
