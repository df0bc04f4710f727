import { scoreSurvey } from '#shared/surveys/score.ts';
import { addDays, addHours, dayOf } from '#shared/time.ts';
import type { Ctx } from '../ctx.ts';
import * as examinations from '../features/examinations/service.ts';
import * as photos from '../features/photos/service.ts';
import * as orders from '../features/survey-orders/service.ts';
import { handleJob } from '../jobs/handlers.ts';
import { recordOf } from './findings.ts';
import type { PersonKey } from './people.ts';
import { readPicture } from './pictures.ts';
import { surveys } from './surveys.ts';
import type { MadeBoiler, World } from './world.ts';

/** How far an order has got. */
export type Stage =
  | 'placed'
  | 'cancelled'
  | 'paid'
  | 'declined'
  | 'accepted'
  | 'times'
  | 'agreed'
  | 'begun'
  | 'filed'
  | 'settled';

export interface SeedOrder {
  boiler: string;
  buyer: PersonKey;
  surveyor: PersonKey;
  scope: 'external' | 'hydraulic' | 'full';
  placedDaysAgo: number;
  /** Days after it was placed that the visit is, or was. */
  visitAfterDays: number;
  stage: Stage;
  /** Which of the written surveys was made; the boiler's own unless told otherwise. */
  survey?: string;
}

/** Orders standing at every stage, so that each role has work on its desk. */
export const seedOrders: SeedOrder[] = [
  {
    boiler: 'return-flue',
    buyer: 'sanjay',
    surveyor: 'ruth',
    scope: 'full',
    placedDaysAgo: 46,
    visitAfterDays: 6,
    stage: 'settled',
  },
  {
    boiler: 'return-flue',
    buyer: 'odile',
    surveyor: 'mabel',
    scope: 'full',
    placedDaysAgo: 33,
    visitAfterDays: 8,
    stage: 'settled',
    survey: 'return-flue-again',
  },
  {
    boiler: 'maroon-gas',
    buyer: 'tomos',
    surveyor: 'mabel',
    scope: 'full',
    placedDaysAgo: 61,
    visitAfterDays: 9,
    stage: 'settled',
  },
  {
    boiler: 'steel-cross-tube',
    buyer: 'odile',
    surveyor: 'mabel',
    scope: 'external',
    placedDaysAgo: 70,
    visitAfterDays: 12,
    stage: 'settled',
  },
  {
    boiler: 'twelve-tube',
    buyer: 'tomos',
    surveyor: 'mabel',
    scope: 'full',
    placedDaysAgo: 18,
    visitAfterDays: 7,
    stage: 'settled',
  },
  {
    boiler: 'green-vertical',
    buyer: 'tomos',
    surveyor: 'mabel',
    scope: 'hydraulic',
    placedDaysAgo: 9,
    visitAfterDays: 7,
    stage: 'filed',
  },
  {
    boiler: 'locomotive-five-inch',
    buyer: 'tomos',
    surveyor: 'mabel',
    scope: 'hydraulic',
    placedDaysAgo: 6,
    visitAfterDays: 6,
    stage: 'begun',
  },
  {
    boiler: 'three-drum',
    buyer: 'gwen',
    surveyor: 'mabel',
    scope: 'full',
    placedDaysAgo: 4,
    visitAfterDays: 6,
    stage: 'agreed',
  },
  {
    boiler: 'loco-narrow-gauge',
    buyer: 'peter',
    surveyor: 'mabel',
    scope: 'hydraulic',
    placedDaysAgo: 3,
    visitAfterDays: 9,
    stage: 'times',
  },
  {
    boiler: 'green-gas',
    buyer: 'tomos',
    surveyor: 'mabel',
    scope: 'full',
    placedDaysAgo: 2,
    visitAfterDays: 8,
    stage: 'accepted',
  },
  {
    boiler: 'small-multi-tube',
    buyer: 'sanjay',
    surveyor: 'mabel',
    scope: 'external',
    placedDaysAgo: 1,
    visitAfterDays: 8,
    stage: 'paid',
  },
  {
    boiler: 'blue-vertical',
    buyer: 'odile',
    surveyor: 'joe',
    scope: 'external',
    placedDaysAgo: 8,
    visitAfterDays: 8,
    stage: 'declined',
  },
  {
    boiler: 'pot-boiler',
    buyer: 'peter',
    surveyor: 'mabel',
    scope: 'external',
    placedDaysAgo: 20,
    visitAfterDays: 6,
    stage: 'cancelled',
  },
  {
    boiler: 'blue-vertical',
    buyer: 'tomos',
    surveyor: 'joe',
    scope: 'full',
    placedDaysAgo: 0,
    visitAfterDays: 7,
    stage: 'placed',
  },
];

/** Pays on the stand-in's card page with the public test number, as the buyer would in a browser. */
async function payByCard(checkoutUrl: string): Promise<void> {
  const answer = await fetch(checkoutUrl, {
    method: 'POST',
    redirect: 'manual',
    headers: { 'Content-Type': 'application/x-www-form-urlencoded' },
    body: new URLSearchParams({ number: '4242424242424242', expiry: '12/39', cvc: '123' }),
  });
  if (answer.status !== 303) throw new Error(`The card page answered ${String(answer.status)}`);
}

/** Somebody at work at that instant. */
const asAt = (world: World, person: PersonKey, at: string): Ctx => ({
  ...world.as(person, 0),
  now: () => at,
});

async function examine(world: World, order: SeedOrder, orderId: string, visit: string): Promise<void> {
  const ctx = asAt(world, order.surveyor, addHours(visit, order.stage === 'begun' ? 0.4 : 4));
  const survey = surveys[order.survey ?? order.boiler];
  const opened = await examinations.getSurvey(ctx, orderId);
  const taken = new Map<string, string[]>();
  for (const [criterionId, pictures] of Object.entries(survey?.pictures ?? {})) {
    for (const { file, alt } of pictures) {
      const photo = await photos.addPhotoFromBuffer(ctx, {
        ownerId: ctx.actor?.id ?? '',
        orderId,
        view: criterionId,
        alt: `${alt} Computer-made demonstration picture.`,
        filename: `${file}.jpg`,
        buffer: Buffer.from(await readPicture({ file, view: criterionId, alt })),
      });
      taken.set(criterionId, [...(taken.get(criterionId) ?? []), photo.id]);
    }
  }
  if (!survey) return;
  const examinedOn = dayOf(ctx.now());
  const record = recordOf(opened.facts, survey, examinedOn, dayOf(addDays(ctx.now(), -140)), taken);
  const saved = await examinations.saveSurvey(ctx, orderId, { version: opened.version, record });
  await examinations.fileSurvey(ctx, orderId, {
    version: saved.version,
    signOff: { name: ctx.actor?.name ?? '', signedAt: ctx.now(), independent: true, limitsUnderstood: true },
    result: scoreSurvey({ facts: opened.facts, record, scope: order.scope }),
  });
}

/** Takes one order as far as its stage, each step by the person whose step it is. */
export async function makeOrder(
  world: World,
  order: SeedOrder,
  boiler: MadeBoiler,
  seller: PersonKey,
): Promise<void> {
  const { buyer, surveyor, scope, placedDaysAgo: placed, visitAfterDays, stage } = order;
  const reached = (wanted: Stage): boolean => stages.indexOf(stage) >= stages.indexOf(wanted);
  const asBuyer = world.as(buyer, placed);
  const offers = await orders.quoteSurvey(asBuyer, boiler.id, { scope, extras: [] });
  const surveyorId = world.as(surveyor, 0).actor?.id;
  const offer = offers.find((each) => each.surveyor.id === surveyorId);
  if (!offer) throw new Error(`${surveyor} cannot survey ${order.boiler}`);
  const { order: made, checkoutUrl } = await orders.placeSurveyOrder(asBuyer, {
    listingId: boiler.id,
    surveyorId: offer.surveyor.id,
    scope,
    extras: [],
    expectedTotal: offer.quotation.total,
    beginsWithinCancellationPeriod: true,
  });
  const { id } = made;
  if (stage === 'placed') return;
  if (stage === 'cancelled') {
    await orders.cancelSurveyOrder(world.as(buyer, placed, 3), id, 'The seller told me it is only for show.');
    return;
  }
  await payByCard(checkoutUrl);
  await orders.checkPayment(world.as(buyer, placed, 1), id);
  if (stage === 'declined') {
    await orders.declineSurveyOrder(world.as(surveyor, placed, 20), id, 'I am away with a launch that week.');
    await world.deps.queue.drain((job) => handleJob(world.system(placed - 1), job));
    return;
  }
  if (!reached('accepted')) return;
  await orders.acceptSurveyOrder(world.as(surveyor, placed, 5), id);
  if (!reached('times')) return;
  const visit = visitTime(world, placed, visitAfterDays);
  await orders.proposeTimes(world.as(surveyor, placed, 8), id, [visit, addDays(visit, 1), addDays(visit, 3)]);
  if (!reached('agreed')) return;
  await orders.agreeTime(world.as(seller, placed, 14), id, visit);
  if (!reached('begun')) return;
  const visitDaysAgo = placed - visitAfterDays;
  await orders.beginSurvey(asAt(world, surveyor, addHours(visit, 0.2)), id);
  await examine(world, order, id, visit);
  if (!reached('settled')) return;
  await orders.acceptReport(world.as(buyer, visitDaysAgo - 2), id);
  await world.deps.queue.drain((job) => handleJob(world.system(visitDaysAgo - 2), job));
}

const stages: Stage[] = [
  'placed',
  'cancelled',
  'paid',
  'declined',
  'accepted',
  'times',
  'agreed',
  'begun',
  'filed',
  'settled',
];

/** Ten in the morning, UTC, of the day of the visit; for one begun today, a little before now. */
function visitTime(world: World, placedDaysAgo: number, afterDays: number): string {
  const day = addDays(world.today, afterDays - placedDaysAgo);
  return afterDays === placedDaysAgo ? addHours(day, -0.5) : `${dayOf(day)}T10:00:00.000Z`;
}
