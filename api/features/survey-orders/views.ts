import { Problem } from '#shared/problem.ts';
import { surveyOrderMachine, orderEventLabels } from '#shared/survey-orders/machine.ts';
import type { OrderSummary, SurveyOrder } from '#shared/survey-orders/contract.ts';
import type { Ctx } from '../../ctx.ts';
import * as listings from '../listings/service.ts';
import type { ListingBrief } from '../listings/service.ts';
import * as surveyors from '../surveyors/service.ts';
import * as surveys from '../surveys/service.ts';
import { getParties, maySeeAddress } from './parties.ts';
import type { Part } from './parties.ts';
import * as repo from './repo.ts';
import type { StoredEvent, StoredOrder } from './repo.ts';

/** Who the record names when nobody caused an event. */
const ourselves = 'Tubeplate';

const toRecord = ({ event, at, actorName, reason }: StoredEvent): SurveyOrder['record'][number] => ({
  event,
  label: orderEventLabels[event],
  at,
  by: actorName ?? ourselves,
  reason,
});

function summarise(order: StoredOrder, part: Part, listing: ListingBrief): OrderSummary {
  return {
    id: order.id,
    status: order.status,
    part,
    scope: order.scope,
    listing,
    total: part === 'seller' ? null : order.total,
    placedAt: order.placedAt,
    dueAt: order.dueAt,
    appointmentAt: order.appointmentAt,
  };
}

export async function toSummaries(
  ctx: Ctx,
  orders: readonly { order: StoredOrder; part: Part }[],
): Promise<OrderSummary[]> {
  const ids = orders.map(({ order }) => order.listing.id);
  const briefs = await listings.listListingBriefs(ctx, ids);
  return orders.flatMap(({ order, part }) => {
    const listing = briefs.get(order.listing.id);
    return listing ? [summarise(order, part, listing)] : [];
  });
}

/** What this part may cause now. */
function eventsOf(order: StoredOrder, part: Part): string[] {
  return surveyOrderMachine
    .events(order.status, part)
    .filter((event) => event !== 'agreeTime' || order.proposedTimes.length > 0);
}

/** The moves of an order, and, while its fee cannot be sent, that it waits. The seller's part in the money is none. */
async function recordOf(ctx: Ctx, order: StoredOrder, part: Part): Promise<SurveyOrder['record']> {
  const record = (await repo.listEvents(ctx.db, order.id)).map(toRecord);
  if (order.status !== 'settling' || part === 'seller') return record;
  if ((await surveyors.findSurveyor(ctx, order.surveyorId))?.payoutsReady) return record;
  const waits = {
    event: 'wait',
    label: 'The fee is earned and waits until the surveyor has set up where it is paid',
    at: order.movedAt,
    by: ourselves,
    reason: '',
  };
  return [...record, waits];
}

/** An order as one of its parties may see it. */
export async function toView(ctx: Ctx, order: StoredOrder, part: Part): Promise<SurveyOrder> {
  const parties = await getParties(ctx, order);
  const listing = (await listings.listListingBriefs(ctx, [order.listing.id])).get(order.listing.id);
  if (!listing) throw new Problem('not-found');
  return {
    ...summarise(order, part, listing),
    extras: order.extras,
    buyer: { name: parties.buyer.name },
    seller: { name: parties.seller.name },
    surveyor: await surveyors.getSurveyor(ctx, order.surveyorId),
    quotation: part === 'seller' ? null : order.quotation,
    proposedTimes: order.proposedTimes,
    address: maySeeAddress(part, order.status) ? await listings.getAddress(ctx, order.listing.id) : null,
    events: eventsOf(order, part),
    record: await recordOf(ctx, order, part),
    reportId: (await surveys.findReportOfOrder(ctx, order.id))?.reportId ?? null,
  };
}
