import type { BodyOf } from '#shared/endpoint.ts';
import { invalidField, Problem } from '#shared/problem.ts';
import type { placeSurveyOrder as placeContract, SurveyOrder } from '#shared/survey-orders/contract.ts';
import { reasonsAgainst } from '#shared/survey-orders/eligibility.ts';
import { orderClocks, surveyOrderMachine } from '#shared/survey-orders/machine.ts';
import { quote } from '#shared/survey-orders/pricing.ts';
import type { Quotation } from '#shared/survey-orders/pricing.ts';
import type { Surveyor } from '#shared/surveyors/contract.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { addHours, dayOf } from '#shared/time.ts';
import { inTransaction, requireActor, requireConfirmedEmail } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as listings from '../listings/service.ts';
import type { ListingForOrder } from '../listings/service.ts';
import * as payments from '../payments/service.ts';
import * as surveyors from '../surveyors/service.ts';
import { getOwnOrder } from './parties.ts';
import * as repo from './repo.ts';
import type { StoredOrder } from './repo.ts';
import { toView } from './views.ts';
import { moneyText } from './words.ts';

/** Surveyors' fees are in pounds. */
const currency = 'GBP';

interface Wanted {
  scope: ScopeId;
  extras: readonly ExtraId[];
}
interface Offer {
  surveyor: Surveyor;
  quotation: Quotation;
}

const ended = surveyOrderMachine.states.filter((status) => surveyOrderMachine.isFinal(status));

async function getListing(ctx: Ctx, listingId: string, buyerId: string): Promise<ListingForOrder> {
  const listing = await listings.getListingForOrder(ctx, listingId);
  if (listing.sellerId === buyerId)
    throw new Problem('not-permitted', 'A seller cannot commission the survey of their own boiler.');
  return listing;
}

/** Who may take the commission, with what it would cost by each, the least first. */
async function listOffers(
  ctx: Ctx,
  listing: ListingForOrder,
  buyerId: string,
  { scope, extras }: Wanted,
): Promise<Offer[]> {
  const commission = {
    facts: listing.facts,
    sellerId: listing.sellerId,
    buyerId,
    extras,
    today: dayOf(ctx.now()),
  };
  const people = [listing.sellerId, buyerId];
  return (await surveyors.listCandidates(ctx, { town: listing.town, people }))
    .filter(({ candidate }) => reasonsAgainst(candidate, commission).length === 0)
    .map(({ candidate, surveyor }) => ({
      surveyor,
      quotation: quote({
        fees: candidate.terms.fees,
        scope,
        extras,
        distanceKm: candidate.distanceKm,
        currency,
      }),
    }))
    .toSorted((a, b) => a.quotation.total.minor - b.quotation.total.minor);
}

export async function quoteSurvey(ctx: Ctx, listingId: string, wanted: Wanted): Promise<Offer[]> {
  const actor = requireActor(ctx);
  const listing = await getListing(ctx, listingId, actor.id);
  return listOffers(ctx, listing, actor.id, wanted);
}

type Commission = BodyOf<typeof placeContract>;

const sorted = (extras: readonly ExtraId[]): string => extras.toSorted().join();

/** A buyer who presses twice has one order. */
function asBefore(open: StoredOrder, commission: Commission): string {
  const isSame =
    open.status === 'awaiting-payment' &&
    open.surveyorId === commission.surveyorId &&
    open.scope === commission.scope &&
    sorted(open.extras) === sorted([...new Set(commission.extras)]) &&
    open.total.minor === commission.expectedTotal.minor;
  if (isSame) return open.id;
  throw new Problem(
    'wrong-state',
    open.status === 'awaiting-payment'
      ? 'You have begun to commission a survey of this boiler. Pay for that one, or cancel it first.'
      : 'You have a survey of this boiler under way already.',
  );
}

async function insert(ctx: Ctx, buyerId: string, commission: Commission): Promise<string> {
  const { listingId, surveyorId, scope, expectedTotal } = commission;
  const extras = [...new Set(commission.extras)].toSorted();
  const listing = await getListing(ctx, listingId, buyerId);
  const offers = await listOffers(ctx, listing, buyerId, { scope, extras });
  const offer = offers.find(({ surveyor }) => surveyor.id === surveyorId);
  if (!offer) {
    throw invalidField(
      ['surveyorId'],
      'This surveyor cannot take this survey any more. Choose another from the list.',
    );
  }
  const { quotation } = offer;
  const { total } = quotation;
  if (total.minor !== expectedTotal.minor || total.currency !== expectedTotal.currency) {
    throw invalidField(
      ['expectedTotal'],
      `The price has changed since it was shown to you: the total is now ${moneyText(total)}. Look at the quotation again before you pay.`,
    );
  }
  const at = ctx.now();
  const dueAt = addHours(at, orderClocks.payHours);
  const orderId = await repo.insertOrder(ctx.db, {
    listingId,
    buyerId,
    sellerId: listing.sellerId,
    surveyorId,
    scope,
    extras,
    quotation,
    at,
    dueAt,
  });
  await payments.openPayment(ctx, orderId, total);
  await ctx.queue.enqueue(ctx, 'lapse-order', { orderId }, dueAt);
  return orderId;
}

/** The card page, opened once. Outside any transaction: the payment service may be slow. */
function openCheckout(ctx: Ctx, order: StoredOrder, email: string): Promise<string> {
  return payments.openCheckout(ctx, order.id, {
    title: `${scopes[order.scope].label}: ${order.listing.title}`,
    email,
    returnPath: sitePaths.order(order.id),
  });
}

/**
 * Places an order and opens its card page.
 * @throws Problem not-signed-in, not-permitted to the seller and to an unconfirmed address, not-found, wrong-state,
 * invalid-input if the surveyor may not take it or the total is another, payment-service.
 */
export async function placeSurveyOrder(
  ctx: Ctx,
  commission: Commission,
): Promise<{ order: SurveyOrder; checkoutUrl: string }> {
  const actor = requireActor(ctx);
  requireConfirmedEmail(actor);
  const orderId = await inTransaction(ctx, async (ctx) => {
    await repo.lockCommission(ctx.db, actor.id, commission.listingId);
    const open = await repo.findOpenOrder(ctx.db, actor.id, commission.listingId, ended);
    return open ? asBefore(open, commission) : insert(ctx, actor.id, commission);
  });
  const { order, part } = await getOwnOrder(ctx, orderId);
  const checkoutUrl = await openCheckout(ctx, order, actor.email);
  return { order: await toView(ctx, order, part), checkoutUrl };
}

/** @throws Problem not-found, not-permitted to all but the buyer, wrong-state once paid or given up, payment-service. */
export async function payForSurvey(ctx: Ctx, id: string): Promise<{ checkoutUrl: string }> {
  const actor = requireActor(ctx);
  const { order, part } = await getOwnOrder(ctx, id);
  if (part !== 'buyer') throw new Problem('not-permitted');
  if (order.status !== 'awaiting-payment')
    throw new Problem('wrong-state', 'There is nothing to pay on this survey.');
  return { checkoutUrl: await openCheckout(ctx, order, actor.email) };
}
