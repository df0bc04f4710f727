import { Problem } from '#shared/problem.ts';
import type { Photo } from '#shared/listings/pictures.ts';
import { surveyOrderMachine } from '#shared/survey-orders/machine.ts';
import { agreementOf } from '#shared/surveys/agreement.ts';
import { isOldReport } from '#shared/surveys/age.ts';
import type { CheckedReport, Report, ReportAgreement } from '#shared/surveys/contract.ts';
import { dayOf, daysBetween } from '#shared/time.ts';
import type { Ctx } from '../../ctx.ts';
import * as photos from '../photos/service.ts';
import { checkCodeOf, digestOf, readCheckCode } from './digest.ts';
import type { Filed } from './digest.ts';
import * as repo from './repo.ts';
import type { StoredReport } from './repo.ts';

export type { StoredReport } from './repo.ts';

const photoIdsOf = ({ record }: Filed): Set<string> =>
  new Set(record.findings.flatMap(({ photoIds }) => photoIds));

/** The photographs that findings name; others taken on the day are no part of the report. */
const shownIn = <P extends { id: string }>(filed: Filed, held: readonly P[]): P[] => {
  const named = photoIdsOf(filed);
  return held.filter(({ id }) => named.has(id));
};

interface Filing {
  orderId: string;
  listingId: string;
  surveyorId: string;
  filed: Filed;
  photos: readonly Photo[];
}

/** Freezes what was filed, under its digest and check code. The caller has made sure that it may. */
export async function keepReport(ctx: Ctx, filing: Filing): Promise<string> {
  const { orderId, listingId, surveyorId, filed } = filing;
  const digest = digestOf(filed, shownIn(filed, filing.photos));
  return repo.insertReport(ctx.db, {
    ...filed,
    orderId,
    listingId,
    surveyorId,
    filedAt: ctx.now(),
    digest,
    checkCode: checkCodeOf(digest),
  });
}

function viewerOf(ctx: Ctx, { order, surveyor }: StoredReport): Report['viewer'] {
  const { actor } = ctx;
  if (!actor) return { orderId: null, canAccept: false };
  const isParty = [order.buyerId, order.sellerId, surveyor.id].includes(actor.id);
  return {
    orderId: isParty || actor.roles.has('office') ? order.id : null,
    canAccept:
      actor.id === order.buyerId && surveyOrderMachine.events(order.status, 'buyer').includes('acceptReport'),
  };
}

/** A filed report, open to everyone; the parties to the sale are not named in it. @throws Problem not-found. */
export async function getReport(ctx: Ctx, id: string): Promise<Report> {
  const stored = await repo.findReport(ctx.db, id);
  if (!stored) throw new Problem('not-found');
  const { listing, surveyor, facts, scope, extras, record, result, signOff, filedAt, checkCode } = stored;
  const held = await photos.listPhotosOfOrder(ctx, stored.order.id);
  return {
    id,
    listing,
    surveyor: { name: surveyor.name, number: surveyor.number },
    facts,
    scope,
    extras: [...extras],
    record,
    result,
    photos: shownIn(stored, held),
    signOff,
    filedAt,
    checkCode,
    sellerPhotos: await photos.listPhotosOfListing(ctx, listing.id),
    viewer: viewerOf(ctx, stored),
  };
}

/** The report filed for an order; undefined while there is none. */
export const findReportIdOfOrder = (ctx: Ctx, orderId: string): Promise<string | undefined> =>
  repo.findReportIdOfOrder(ctx.db, orderId);

/** The other reports on the same boiler, each set against this one. @throws Problem not-found. */
export async function getReportAgreements(ctx: Ctx, id: string): Promise<{ items: ReportAgreement[] }> {
  const stored = await repo.findReport(ctx.db, id);
  if (!stored) throw new Problem('not-found');
  const all = await repo.listReportsOfListing(ctx.db, stored.listing.id);
  const items = all
    .filter((other) => other.order.id !== stored.order.id)
    .map((other) => ({
      id: other.id,
      filedAt: other.filedAt,
      surveyor: { name: other.surveyor.name },
      verdict: other.result.verdict.id,
      agreement: agreementOf(stored, other),
    }));
  return { items };
}

/** A filed report as it is kept, for features that stand above. @throws Problem not-found. */
export async function getStoredReport(ctx: Ctx, id: string): Promise<StoredReport> {
  const stored = await repo.findReport(ctx.db, id);
  if (!stored) throw new Problem('not-found');
  return stored;
}

/** Every version of the report of an order, oldest first. */
export const listStoredVersions = (ctx: Ctx, orderId: string): Promise<StoredReport[]> =>
  repo.listVersionsOfOrder(ctx.db, orderId);

const unknownCode: CheckedReport = {
  status: 'unknown',
  reportId: null,
  version: null,
  filedAt: null,
  examinedOn: null,
  ageDays: null,
  isOld: false,
  newer: null,
};

/**
 * Works the digest out again from what is stored now, and says whether it is still the one that was filed, whether it
 * was corrected since, and how old it is.
 */
export async function checkReport(ctx: Ctx, typed: string): Promise<CheckedReport> {
  const code = readCheckCode(typed);
  const stored = code === undefined ? undefined : await repo.findReportByCode(ctx.db, code);
  if (!stored) return unknownCode;
  const held = await photos.listPhotosOfOrder(ctx, stored.order.id);
  const digest = digestOf(stored, shownIn(stored, held));
  const isGenuine = digest === stored.digest && checkCodeOf(digest) === stored.checkCode;
  const newest = (await listStoredVersions(ctx, stored.order.id)).at(-1);
  const newer = newest !== undefined && newest.version > stored.version ? newest : null;
  const examinedOn = stored.record.examinedOn ?? dayOf(stored.filedAt);
  const today = dayOf(ctx.now());
  return {
    status: isGenuine ? (newer === null ? 'genuine' : 'superseded') : 'changed',
    reportId: stored.id,
    version: stored.version,
    filedAt: stored.filedAt,
    examinedOn,
    ageDays: daysBetween(examinedOn, today),
    isOld: isOldReport(examinedOn, today),
    newer: newer && {
      reportId: newer.id,
      version: newer.version,
      filedAt: newer.filedAt,
      reason: newer.correction?.reason ?? '',
    },
  };
}
