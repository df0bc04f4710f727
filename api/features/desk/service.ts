import type { DeskItem } from '#shared/desk/contract.ts';
import { addDays, dayOf, msBetween } from '#shared/time.ts';
import type { Instant } from '#shared/time.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { requireActor } from '../../ctx.ts';
import type { Actor, Ctx } from '../../ctx.ts';
import * as accounts from '../accounts/service.ts';
import * as listings from '../listings/service.ts';
import * as settlements from '../settlements/service.ts';
import * as surveyOrders from '../survey-orders/service.ts';
import * as surveyors from '../surveyors/service.ts';
import * as surveys from '../surveys/service.ts';
import { deskItemOf } from './orders.ts';

/** Drafts that their seller has not finished. */
async function draftItems(ctx: Ctx): Promise<DeskItem[]> {
  return (await listings.listOwnListings(ctx))
    .filter(({ status }) => status === 'draft')
    .map(({ id, draft, savedAt }) => ({
      id: `draft-${id}`,
      todo: 'Finish your listing',
      about: draft.title === '' ? 'A boiler without a title yet' : draft.title,
      why: 'Nobody sees it until it is complete and listed.',
      path: sitePaths.sell(id),
      dueAt: null,
      since: savedAt,
    }));
}

async function orderItems(ctx: Ctx): Promise<DeskItem[]> {
  const items: DeskItem[] = [];
  for (const { order, part } of await surveyOrders.listOwnOrders(ctx)) {
    const report = order.status === 'in-review' ? await surveys.findReportOfOrder(ctx, order.id) : undefined;
    const item = deskItemOf(order, part, ctx.now(), report?.reportId);
    if (item) items.push(item);
  }
  return items;
}

/** Days before insurance runs out that it is time to say so. */
const insuranceNoticeDays = 30;

async function surveyorItems(ctx: Ctx, actor: Actor): Promise<DeskItem[]> {
  const { terms, payoutsReady } = await surveyors.getMySurveyorTerms(ctx);
  const { joinedAt } = await accounts.getPerson(ctx, actor.id);
  const item = (id: string, todo: string, why: string, dueAt: Instant | null = null): DeskItem => ({
    id,
    todo,
    about: 'Your particulars as a surveyor',
    why,
    path: sitePaths.surveyorTerms,
    dueAt,
    since: joinedAt,
  });
  if (!terms) {
    return [
      item('surveyor-terms', 'Say where, what and for how much you survey', 'No job reaches you until then.'),
    ];
  }
  const items: DeskItem[] = [];
  if (!payoutsReady) {
    const waiting = (await settlements.listOwed(ctx)).filter(({ surveyorId }) => surveyorId === actor.id);
    const why =
      waiting.length > 0
        ? `${waiting.length === 1 ? 'A fee' : `${String(waiting.length)} fees`} you have earned cannot be sent until then.`
        : 'Fees cannot be sent until then.';
    const since = waiting[0]?.since ?? joinedAt;
    items.push({ ...item('payouts', 'Set up where your fees are paid', why), since });
  }
  if (terms.isTakingJobs && terms.insuredUntilOn <= dayOf(addDays(ctx.now(), insuranceNoticeDays))) {
    const isOver = terms.insuredUntilOn <= dayOf(ctx.now());
    items.push(
      item(
        'insurance',
        'Renew your insurance',
        isOver ? 'It has run out, and no new job reaches you.' : 'When it runs out, no new job reaches you.',
        `${terms.insuredUntilOn}T00:00:00.000Z`,
      ),
    );
  }
  return items;
}

async function officeItems(ctx: Ctx): Promise<DeskItem[]> {
  const failed = await ctx.queue.listFailed();
  const oldest = failed.at(-1);
  const stuck = await settlements.listStuck(ctx);
  const owed = await settlements.listOwed(ctx);
  return [
    ...(oldest
      ? [
          {
            id: 'failed-jobs',
            todo: 'Look at work that failed',
            about: failed.length === 1 ? 'One job' : `${String(failed.length)} jobs`,
            why: `Tried several times and given up. The latest: ${failed[0]?.kind ?? ''}, ${failed[0]?.error ?? ''}`,
            path: sitePaths.officeMoney,
            dueAt: null,
            since: oldest.at,
          },
        ]
      : []),
    ...stuck.map(({ job, orderId, since }) => ({
      id: `stuck-${orderId}`,
      todo: job === 'refund-order' ? 'Look at a refund that is stuck' : 'Look at a fee that is stuck',
      about: `Order ${orderId.slice(0, 8)}`,
      why: 'The payment service has not done it yet. It is tried again every ten minutes.',
      path: sitePaths.order(orderId),
      dueAt: null,
      since,
    })),
    ...owed.map(({ orderId, since }) => ({
      id: `owed-${orderId}`,
      todo: 'Ask a surveyor to set up payouts',
      about: `Order ${orderId.slice(0, 8)}`,
      why: 'The fee is earned and cannot be sent, for the surveyor has no account to send it to.',
      path: sitePaths.order(orderId),
      dueAt: null,
      since,
    })),
  ];
}

async function enrolmentItems(ctx: Ctx, actor: Actor): Promise<DeskItem[]> {
  const me = await accounts.getMe(ctx);
  if (!me?.mustEnrol) return [];
  const { joinedAt } = await accounts.getPerson(ctx, actor.id);
  return [
    {
      id: 'second-factor',
      todo: 'Set up a second factor',
      about: 'The office',
      why: 'The office stays closed to you until then.',
      path: sitePaths.secondFactor,
      dueAt: null,
      since: joinedAt,
    },
  ];
}

const compare = (a: DeskItem, b: DeskItem): number => {
  if (a.dueAt !== null && b.dueAt !== null && a.dueAt !== b.dueAt) return msBetween(b.dueAt, a.dueAt);
  if ((a.dueAt === null) !== (b.dueAt === null)) return a.dueAt === null ? 1 : -1;
  return msBetween(b.since, a.since);
};

/** What waits for the person asking: what has a clock first, by its time; then what has waited longest. */
export async function getDesk(ctx: Ctx): Promise<DeskItem[]> {
  const actor = requireActor(ctx);
  const items = [
    ...(await enrolmentItems(ctx, actor)),
    ...(await orderItems(ctx)),
    ...(await draftItems(ctx)),
    ...(actor.roles.has('surveyor') ? await surveyorItems(ctx, actor) : []),
    ...(actor.roles.has('office') ? await officeItems(ctx) : []),
  ];
  return items.toSorted(compare);
}
