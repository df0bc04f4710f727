import { eq } from 'drizzle-orm';
import type { Actor } from '#api/ctx.ts';
import { surveyOrders } from '#api/db/schema/index.ts';
import * as orders from '#api/features/survey-orders/repo.ts';
import * as surveyors from '#api/features/surveyors/service.ts';
import * as surveys from '#api/features/surveys/service.ts';
import type { OwnListing } from '#shared/listings/contract.ts';
import { quote } from '#shared/survey-orders/pricing.ts';
import type { Survey } from '#shared/surveys/contract.ts';
import type { Finding, SurveyRecord } from '#shared/surveys/record.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import type { ScopeId } from '#shared/surveys/scopes.ts';
import { addDays, dayOf } from '#shared/time.ts';
import { goodRecord } from '#tests/shared/surveys/example.ts';
import { givenListing, hebdenBridge, tinyPicture, uploadPhoto } from './factories.ts';
import type { Site, TestPerson } from './site.ts';

type Person = TestPerson & Actor;

export interface Examination {
  orderId: string;
  listing: OwnListing;
  seller: Person;
  buyer: Person;
  surveyor: Person;
}

/**
 * A survey whose examination has just begun: paid for, agreed and opened, without the days that takes.
 *
 * @param earlier an examination of the same boiler, for another buyer and by another surveyor.
 */
export async function givenExamination(
  site: Site,
  scope: ScopeId = 'full',
  earlier?: Pick<Examination, 'seller' | 'listing'>,
): Promise<Examination> {
  const seller = earlier?.seller ?? (await site.givenPerson('Edna Marsh'));
  const buyer = await site.givenPerson('Col Fettiplace');
  const surveyor = await site.givenPerson(earlier ? 'Percy Lomas' : 'Isobel Tarn', 'surveyor');
  const listing = earlier?.listing ?? (await givenListing(site, seller));
  const { db } = site.deps.database;
  const at = site.clock.now();
  const fees = {
    external: 6_000,
    hydraulic: 9_000,
    full: 15_000,
    thickness: null,
    borescope: null,
    perKmMinor: 30,
  };
  await surveyors.saveMySurveyorTerms(site.ctxAs(surveyor), {
    townId: hebdenBridge,
    rangeKm: 100,
    types: ['vertical-multi-tube'],
    materials: ['copper'],
    insuredUntilOn: dayOf(addDays(at, 90)),
    fees,
    about: 'Thirty years of club boilers, most of them vertical.',
    isTakingJobs: true,
  });
  const orderId = await orders.insertOrder(db, {
    listingId: listing.id,
    buyerId: buyer.id,
    sellerId: seller.id,
    surveyorId: surveyor.id,
    scope,
    extras: [],
    quotation: quote({ fees, scope, extras: [], distanceKm: 20, currency: 'GBP' }),
    at,
    dueAt: at,
  });
  await db.update(surveyOrders).set({ status: 'examining' }).where(eq(surveyOrders.id, orderId));
  await surveys.openSurvey(site.ctxAs(surveyor), { id: orderId, listingId: listing.id });
  return { orderId, listing, seller, buyer, surveyor };
}

export const readSurvey = async (site: Site, { orderId, surveyor }: Examination): Promise<Survey> =>
  (await site.as(surveyor).get(`/api/survey-orders/${orderId}/survey`).expect(200)).body as Survey;

export const saveRecord = (
  site: Site,
  person: TestPerson,
  orderId: string,
  version: number,
  record: SurveyRecord,
) => site.as(person).put(`/api/survey-orders/${orderId}/survey`).send({ version, record });

/**
 * Everything sound but a sluggish water gauge, with one photograph of it taken on the day.
 *
 * @param changes what else this surveyor found otherwise, by criterion.
 */
export async function givenRecorded(
  site: Site,
  examination: Examination,
  changes: Readonly<Record<string, Partial<Finding>>> = {},
): Promise<Survey> {
  const { orderId, surveyor } = examination;
  const { id: photoId } = await uploadPhoto(site, surveyor, {
    purpose: 'survey-photo',
    recordId: orderId,
    view: 'safety.glass',
    alt: 'Water gauge with the level returning slowly',
    content: await tinyPicture(180),
  });
  const { facts, version } = await readSurvey(site, examination);
  const good = goodRecord(facts);
  const wantedPa = facts.workingPressurePa * 1.5;
  const readings = [0, wantedPa + 5_000, wantedPa + 3_000];
  const sluggish: Partial<Finding> = {
    grade: 'attention',
    defects: [{ code: 'glass-sluggish', where: '18', note: '', remedy: null, allowance: null }],
    photoIds: [photoId],
  };
  const record: SurveyRecord = {
    ...good,
    hydraulic: good.hydraulic && {
      ...good.hydraulic,
      wantedPa,
      readings: readings.map((pressurePa, index) => ({ minute: [0, 5, 15][index] ?? 0, pressurePa })),
    },
    findings: good.findings.map((finding) => ({
      ...finding,
      ...(finding.criterionId === 'safety.glass' ? sluggish : {}),
      ...changes[finding.criterionId],
    })),
  };
  return (await saveRecord(site, surveyor, orderId, version, record).expect(200)).body as Survey;
}

export const signature = {
  name: 'Isobel Tarn',
  signedAt: '2026-05-16T15:30:00Z',
  independent: true,
  limitsUnderstood: true,
} as const;

/** Files a survey as its surveyor's own screen would, with the result computed there. */
export const file = (site: Site, person: TestPerson, survey: Survey) =>
  site
    .as(person)
    .post(`/api/survey-orders/${survey.orderId}/survey/file`)
    .send({ version: survey.version, signOff: signature, result: scoreSurvey(survey) });
