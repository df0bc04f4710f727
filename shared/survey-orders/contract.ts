import { z } from 'zod';
import { byId, endpoint } from '../endpoint.ts';
import { recordEntry } from '../listings/contract.ts';
import { address } from '../listings/draft.ts';
import { photo } from '../listings/pictures.ts';
import { town } from '../listings/places.ts';
import { money } from '../money.ts';
import { surveyor } from '../surveyors/contract.ts';
import { extraId, scopeId } from '../surveys/scopes.ts';
import { instant } from '../time.ts';
import { surveyOrderMachine } from './machine.ts';
import { quotation } from './pricing.ts';

export const orderStatus = z.enum(
  surveyOrderMachine.states as ['settled', ...(typeof surveyOrderMachine.states)[number][]],
);

export const orderSummary = z.object({
  id: z.uuid(),
  status: orderStatus,
  part: z.enum(['buyer', 'seller', 'surveyor', 'office']),
  scope: scopeId,
  listing: z.object({ id: z.uuid(), slug: z.string(), title: z.string(), town, cover: photo.nullable() }),
  /** What the buyer pays; null for the seller, who sees no money that is not his. */
  total: money.nullable(),
  placedAt: instant,
  /** When something happens by itself unless somebody acts. */
  dueAt: instant.nullable(),
  appointmentAt: instant.nullable(),
});
export type OrderSummary = z.infer<typeof orderSummary>;

export const surveyOrder = orderSummary.extend({
  extras: z.array(extraId),
  buyer: z.object({ name: z.string() }),
  seller: z.object({ name: z.string() }),
  surveyor,
  /** Null for the seller. */
  quotation: quotation.nullable(),
  proposedTimes: z.array(instant),
  /** For the surveyor once a time is agreed, and the seller whose it is. */
  address: address.nullable(),
  events: z.array(z.string()),
  record: z.array(recordEntry),
  reportId: z.uuid().nullable(),
});
export type SurveyOrder = z.infer<typeof surveyOrder>;

const wanted = { scope: scopeId, extras: z.array(extraId).max(2) };
const reason = z
  .string()
  .trim()
  .min(3, 'Give a reason in a few words')
  .max(400, 'Keep it under 400 characters');
const op = <R extends z.ZodType, B extends z.ZodType>(
  name: string,
  summary: string,
  path: string,
  response: R,
  body: B,
) => endpoint({ name, summary, method: 'POST', path, params: byId, body, response });
const nothing = z.strictObject({});

export const quoteSurvey = op(
  'quoteSurvey',
  'Surveyors who could examine this boiler, each with a full quotation',
  '/api/listings/:id/survey-quotes',
  z.object({ items: z.array(z.object({ surveyor, quotation })) }),
  z.strictObject(wanted),
);

export const placeSurveyOrder = endpoint({
  name: 'placeSurveyOrder',
  summary: 'Commission a survey; answers with the address of the card page',
  method: 'POST',
  path: '/api/survey-orders',
  body: z.strictObject({
    listingId: z.uuid(),
    surveyorId: z.string().min(1, 'Choose a surveyor').max(64),
    ...wanted,
    /** The total shown; a different one is refused, not charged. */
    expectedTotal: money,
    /** The express request to begin within the fourteen days in which a distance contract may be cancelled. */
    beginsWithinCancellationPeriod: z.literal(true, 'Ask for the work to begin, or wait fourteen days'),
  }),
  response: z.object({ order: surveyOrder, checkoutUrl: z.string() }),
  status: 201,
});

export const listSurveyOrders = endpoint({
  name: 'listSurveyOrders',
  summary: 'Surveys I have a part in, newest first',
  method: 'GET',
  path: '/api/survey-orders',
  response: z.object({ items: z.array(orderSummary) }),
});

export const getSurveyOrder = endpoint({
  name: 'getSurveyOrder',
  summary: 'One survey order, as its parties may see it',
  method: 'GET',
  path: '/api/survey-orders/:id',
  params: byId,
  response: surveyOrder,
});

export const payForSurvey = op(
  'payForSurvey',
  'The card page of an order not yet paid',
  '/api/survey-orders/:id/checkout',
  z.object({ checkoutUrl: z.string() }),
  nothing,
);
export const checkPayment = op(
  'checkPayment',
  'Ask the payment service whether the order has been paid, when its notice is late',
  '/api/survey-orders/:id/payment-check',
  surveyOrder,
  nothing,
);
export const acceptSurveyOrder = op(
  'acceptSurveyOrder',
  'Accept the job',
  '/api/survey-orders/:id/accept',
  surveyOrder,
  nothing,
);
export const declineSurveyOrder = op(
  'declineSurveyOrder',
  'Decline the job',
  '/api/survey-orders/:id/decline',
  surveyOrder,
  z.strictObject({ reason }),
);
export const proposeTimes = op(
  'proposeTimes',
  'Propose one to five times for the visit',
  '/api/survey-orders/:id/times',
  surveyOrder,
  z.strictObject({
    times: z.array(instant).min(1, 'Propose at least one time').max(5, 'Propose at most five times'),
  }),
);
export const agreeTime = op(
  'agreeTime',
  'Agree one of the proposed times',
  '/api/survey-orders/:id/agree',
  surveyOrder,
  z.strictObject({ startsAt: instant }),
);
export const cancelSurveyOrder = op(
  'cancelSurveyOrder',
  'Cancel the survey',
  '/api/survey-orders/:id/cancel',
  surveyOrder,
  z.strictObject({ reason }),
);
export const beginSurvey = op(
  'beginSurvey',
  'Begin the examination',
  '/api/survey-orders/:id/begin',
  surveyOrder,
  nothing,
);
export const abandonSurvey = op(
  'abandonSurvey',
  'Give the examination up',
  '/api/survey-orders/:id/abandon',
  surveyOrder,
  z.strictObject({ reason }),
);
export const acceptReport = op(
  'acceptReport',
  'Accept the report; the fee is released',
  '/api/survey-orders/:id/accept-report',
  surveyOrder,
  nothing,
);
