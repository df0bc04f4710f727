import { haversineKm } from '#shared/engineering/distance.ts';
import type { Town } from '#shared/listings/places.ts';
import { invalidField, Problem } from '#shared/problem.ts';
import type { Candidate } from '#shared/survey-orders/eligibility.ts';
import type { Surveyor, SurveyorTerms } from '#shared/surveyors/contract.ts';
import { addDays, dayOf } from '#shared/time.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { requireRole } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as accounts from '../accounts/service.ts';
import * as places from '../places/service.ts';
import * as repo from './repo.ts';
import type { StoredSurveyor } from './repo.ts';

export type { StoredSurveyor } from './repo.ts';

interface MyTerms {
  terms: SurveyorTerms | null;
  town: Town | null;
  number: string | null;
  payoutsReady: boolean;
}

export async function getMySurveyorTerms(ctx: Ctx): Promise<MyTerms> {
  const actor = requireRole(ctx, 'surveyor');
  const found = await repo.findSurveyor(ctx.db, actor.id);
  if (!found) return { terms: null, town: null, number: null, payoutsReady: false };
  return {
    terms: found.terms,
    town: places.findTown(found.terms.townId) ?? null,
    number: found.number,
    payoutsReady: found.payoutsReady,
  };
}

export async function saveMySurveyorTerms(
  ctx: Ctx,
  terms: SurveyorTerms,
): Promise<{ terms: SurveyorTerms; number: string }> {
  const actor = requireRole(ctx, 'surveyor');
  if (!places.findTown(terms.townId)) throw invalidField(['townId'], 'Choose a town from the list');
  if (terms.isTakingJobs && terms.insuredUntilOn <= dayOf(ctx.now())) {
    throw invalidField(
      ['insuredUntilOn'],
      'That insurance has run out: give the new date, or take no jobs until you have one',
    );
  }
  await repo.upsertTerms(ctx.db, actor.id, terms);
  const saved = await repo.findSurveyor(ctx.db, actor.id);
  if (!saved) throw new Problem('not-found');
  return { terms: saved.terms, number: saved.number };
}

/**
 * The address of the payment service's own page where a surveyor says where fees go. Makes one account, however often asked.
 * @throws Problem not-complete until the particulars are saved, payment-service.
 */
export async function startPayoutSetUp(ctx: Ctx): Promise<{ url: string }> {
  const actor = requireRole(ctx, 'surveyor');
  const found = await repo.findSurveyor(ctx.db, actor.id);
  if (!found) throw new Problem('not-complete', 'Save your particulars as a surveyor first.');
  let accountId = found.payoutAccountId;
  if (accountId === null) {
    ({ accountId } = await ctx.payments.createAccount({ key: `account:${actor.id}`, email: actor.email }));
    await repo.updatePayoutAccount(ctx.db, actor.id, accountId);
  }
  return ctx.payments.startAccountSetUp({
    accountId,
    returnUrl: `${ctx.site.publicUrl}${sitePaths.surveyorTerms}`,
  });
}

/** The payment service says whether an account can be paid to. @returns the surveyor's id; undefined if it is nobody's. */
export async function setPayoutsReady(
  ctx: Ctx,
  accountId: string,
  isReady: boolean,
): Promise<string | undefined> {
  const found = await repo.findSurveyorByAccount(ctx.db, accountId);
  if (!found) return undefined;
  await repo.updatePayoutsReady(ctx.db, accountId, isReady);
  return found.userId;
}

export const findSurveyor = (ctx: Ctx, userId: string): Promise<StoredSurveyor | undefined> =>
  repo.findSurveyor(ctx.db, userId);

/** Those who began to set up payouts and were not ready when last heard of. */
export const listUnready = (ctx: Ctx): Promise<StoredSurveyor[]> => repo.listUnready(ctx.db);

const toView = ({ userId, name, number, terms }: StoredSurveyor, reportsFiled: number): Surveyor => ({
  id: userId,
  name,
  number,
  town: places.getTown(terms.townId),
  rangeKm: terms.rangeKm,
  about: terms.about,
  reportsFiled,
});

/** Surveyors as everyone may see them, by id. */
export async function getSurveyors(ctx: Ctx, ids: readonly string[]): Promise<Map<string, Surveyor>> {
  const wanted = new Set(ids);
  const found = (await repo.listSurveyors(ctx.db)).filter(({ userId }) => wanted.has(userId));
  const filed = await repo.countReports(ctx.db, [...wanted]);
  return new Map(found.map((one) => [one.userId, toView(one, filed.get(one.userId) ?? 0)]));
}

/** @throws Problem not-found. */
export async function getSurveyor(ctx: Ctx, userId: string): Promise<Surveyor> {
  const surveyor = (await getSurveyors(ctx, [userId])).get(userId);
  if (!surveyor) throw new Problem('not-found');
  return surveyor;
}

/** Days in which having bought from or sold to somebody makes a surveyor less than independent of them. */
const dealingsDays = 365;

/** Every surveyor, with what decides whether they may take a job there for these people. */
export async function listCandidates(
  ctx: Ctx,
  { town, people }: { town: Town; people: readonly string[] },
): Promise<{ candidate: Candidate; surveyor: Surveyor }[]> {
  const all = await repo.listSurveyors(ctx.db);
  const granted = new Set(await accounts.getPeopleInRole(ctx, 'surveyor'));
  const dealings = await repo.listDealings(ctx.db, people, addDays(ctx.now(), -dealingsDays));
  const filed = await repo.countReports(
    ctx.db,
    all.map(({ userId }) => userId),
  );
  return all.map((one) => {
    const surveyor = toView(one, filed.get(one.userId) ?? 0);
    return {
      surveyor,
      candidate: {
        userId: one.userId,
        isGranted: granted.has(one.userId),
        terms: one.terms,
        distanceKm: haversineKm(surveyor.town, town),
        recentDealings: dealings.get(one.userId) ?? new Set(),
      },
    };
  });
}
