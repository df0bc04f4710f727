import { and, asc, desc, eq, inArray, notInArray, or, sql } from 'drizzle-orm';
import type { Currency, Money } from '#shared/money.ts';
import type { OrderEvent, OrderStatus, RecordedEvent } from '#shared/survey-orders/machine.ts';
import type { Quotation } from '#shared/survey-orders/pricing.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { listings, surveyOrderEvents, surveyOrders, user } from '../../db/schema/index.ts';

/** An order with what its parties need to know of the boiler. The address is not among it. */
export interface StoredOrder {
  id: string;
  status: OrderStatus;
  listing: { id: string; slug: string; title: string };
  buyerId: string;
  sellerId: string;
  surveyorId: string;
  scope: ScopeId;
  extras: ExtraId[];
  quotation: Quotation;
  total: Money;
  proposedTimes: Instant[];
  appointmentAt: Instant | null;
  placedAt: Instant;
  movedAt: Instant;
  dueAt: Instant | null;
}

const find = (db: Db) =>
  db
    .select({
      order: surveyOrders,
      slug: listings.slug,
      title: sql<string>`${listings.draft}->>'title'`,
    })
    .from(surveyOrders)
    .innerJoin(listings, eq(listings.id, surveyOrders.listingId));

const fromRow = ({ order, slug, title }: Awaited<ReturnType<typeof find>>[number]): StoredOrder => ({
  id: order.id,
  status: order.status,
  listing: { id: order.listingId, slug, title },
  buyerId: order.buyerId,
  sellerId: order.sellerId,
  surveyorId: order.surveyorId,
  scope: order.scope,
  extras: order.extras as ExtraId[],
  quotation: order.quotation,
  total: { minor: order.totalMinor, currency: order.currency as Currency },
  proposedTimes: order.proposedTimes.map((at) => at.toISOString()),
  appointmentAt: order.appointmentAt?.toISOString() ?? null,
  placedAt: order.placedAt.toISOString(),
  movedAt: order.movedAt.toISOString(),
  dueAt: order.dueAt?.toISOString() ?? null,
});

export async function findOrder(db: Db, id: string): Promise<StoredOrder | undefined> {
  const [row] = await find(db).where(eq(surveyOrders.id, id));
  return row && fromRow(row);
}

/** The same, held against others until the transaction ends. */
export async function findOrderForUpdate(db: Db, id: string): Promise<StoredOrder | undefined> {
  const [row] = await find(db).where(eq(surveyOrders.id, id)).for('update', { of: surveyOrders });
  return row && fromRow(row);
}

/** Newest first. */
export async function listOrdersOf(db: Db, personId: string): Promise<StoredOrder[]> {
  const rows = await find(db)
    .where(
      or(
        eq(surveyOrders.buyerId, personId),
        eq(surveyOrders.sellerId, personId),
        eq(surveyOrders.surveyorId, personId),
      ),
    )
    .orderBy(desc(surveyOrders.placedAt));
  return rows.map(fromRow);
}

/** The longest unmoved first. */
export async function listOrdersIn(
  db: Db,
  statuses: readonly OrderStatus[] | undefined,
  most: number,
): Promise<StoredOrder[]> {
  const rows = await find(db)
    .where(statuses && inArray(surveyOrders.status, [...statuses]))
    .orderBy(asc(surveyOrders.movedAt))
    .limit(most);
  return rows.map(fromRow);
}

/** A buyer's order on a listing that has not come to an end. */
export async function findOpenOrder(
  db: Db,
  buyerId: string,
  listingId: string,
  ended: readonly OrderStatus[],
): Promise<StoredOrder | undefined> {
  const [row] = await find(db).where(
    and(
      eq(surveyOrders.buyerId, buyerId),
      eq(surveyOrders.listingId, listingId),
      notInArray(surveyOrders.status, [...ended]),
    ),
  );
  return row && fromRow(row);
}

/** Makes whoever else places an order as this buyer on this listing wait for the end of the transaction. */
export async function lockCommission(db: Db, buyerId: string, listingId: string): Promise<void> {
  await db.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`${buyerId}/${listingId}`}, 0))`);
}

interface NewOrder {
  listingId: string;
  buyerId: string;
  sellerId: string;
  surveyorId: string;
  scope: ScopeId;
  extras: readonly ExtraId[];
  quotation: Quotation;
  at: Instant;
  dueAt: Instant;
}

export async function insertOrder(db: Db, { at, dueAt, extras, ...order }: NewOrder): Promise<string> {
  const when = new Date(at);
  const [row] = await db
    .insert(surveyOrders)
    .values({
      ...order,
      extras: [...extras],
      totalMinor: order.quotation.total.minor,
      currency: order.quotation.total.currency,
      placedAt: when,
      movedAt: when,
      dueAt: new Date(dueAt),
      earlyStartRequestedAt: when,
    })
    .returning({ id: surveyOrders.id });
  if (!row) throw new Error('The order was not stored');
  await db.insert(surveyOrderEvents).values({
    orderId: row.id,
    event: 'place',
    from: 'awaiting-payment',
    to: 'awaiting-payment',
    actorId: order.buyerId,
    at: when,
  });
  return row.id;
}

export interface OrderMove {
  event: OrderEvent;
  to: OrderStatus;
  actorId: string | null;
  reason: string;
  at: Instant;
  dueAt: Instant | null;
  change?: { proposedTimes?: readonly Instant[]; appointmentAt?: Instant | null };
}

const dateOf = (at: Instant | null): Date | null => (at === null ? null : new Date(at));

/** Moves an order that is still where it was seen, and records the move. @returns false if somebody was first. */
export async function moveOrder(db: Db, seen: StoredOrder, move: OrderMove): Promise<boolean> {
  const { proposedTimes, appointmentAt } = move.change ?? {};
  const when = new Date(move.at);
  const rows = await db
    .update(surveyOrders)
    .set({
      status: move.to,
      movedAt: when,
      dueAt: dateOf(move.dueAt),
      ...(proposedTimes ? { proposedTimes: proposedTimes.map((at) => new Date(at)) } : {}),
      ...(appointmentAt === undefined ? {} : { appointmentAt: dateOf(appointmentAt) }),
    })
    .where(and(eq(surveyOrders.id, seen.id), eq(surveyOrders.status, seen.status)))
    .returning({ id: surveyOrders.id });
  if (rows.length === 0) return false;
  await db.insert(surveyOrderEvents).values({
    orderId: seen.id,
    event: move.event,
    from: seen.status,
    to: move.to,
    actorId: move.actorId,
    reason: move.reason,
    at: when,
  });
  return true;
}

/** Puts into the record of an order what did not move it. */
export async function insertEvent(
  db: Db,
  order: Pick<StoredOrder, 'id' | 'status'>,
  { event, actorId, reason, at }: { event: RecordedEvent; actorId: string; reason: string; at: Instant },
): Promise<void> {
  const { id: orderId, status } = order;
  await db
    .insert(surveyOrderEvents)
    .values({ orderId, event, from: status, to: status, actorId, reason, at: new Date(at) });
}

export interface StoredEvent {
  event: RecordedEvent;
  at: Instant;
  actorId: string | null;
  actorName: string | null;
  reason: string;
}

/** Oldest first. */
export async function listEvents(db: Db, orderId: string): Promise<StoredEvent[]> {
  const rows = await db
    .select({ row: surveyOrderEvents, actorName: user.name })
    .from(surveyOrderEvents)
    .leftJoin(user, eq(user.id, surveyOrderEvents.actorId))
    .where(eq(surveyOrderEvents.orderId, orderId))
    .orderBy(asc(surveyOrderEvents.id));
  return rows.map(({ row, actorName }) => ({
    event: row.event,
    at: row.at.toISOString(),
    actorId: row.actorId,
    actorName,
    reason: row.reason,
  }));
}
