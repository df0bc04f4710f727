import type { BodyOf } from '#shared/endpoint.ts';
import { invalidField, Problem } from '#shared/problem.ts';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import { mostRepairs } from '#shared/surveys/replies-contract.ts';
import type {
  listRepair as repairContract,
  replyToFinding as replyContract,
} from '#shared/surveys/replies-contract.ts';
import type { Reply, ReportReplies } from '#shared/surveys/replies-contract.ts';
import { addDays, dayOf } from '#shared/time.ts';
import { inTransaction, requireActor } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as reports from '../reports/service.ts';
import type { StoredReport } from '../reports/service.ts';
import * as repo from './repo.ts';

const findingOf = ({ record }: StoredReport, criterionId: string) =>
  record.findings.find((finding) => finding.criterionId === criterionId);

const isSameFinding = (a: StoredReport, b: StoredReport, criterionId: string): boolean =>
  canonicalJson(findingOf(a, criterionId) ?? null) === canonicalJson(findingOf(b, criterionId) ?? null);

/** What stands beside the findings of a version: its own answers, and earlier ones to findings that have not changed. */
async function repliesTo(
  ctx: Ctx,
  report: StoredReport,
  versions: readonly StoredReport[],
): Promise<Reply[]> {
  const upToHere = versions.filter(({ version }) => version <= report.version);
  const kept = await repo.listReplies(
    ctx.db,
    upToHere.map(({ id }) => id),
  );
  return upToHere.flatMap((each) =>
    kept
      .filter(({ reportId, criterionId }) => reportId === each.id && isSameFinding(each, report, criterionId))
      .map(({ criterionId, text, at }) => ({ criterionId, text, at, version: each.version })),
  );
}

/** What the seller answers to a report, open to everyone. @throws Problem not-found. */
export async function getReportReplies(ctx: Ctx, id: string): Promise<ReportReplies> {
  const report = await reports.getStoredReport(ctx, id);
  const versions = await reports.listStoredVersions(ctx, report.order.id);
  return {
    replies: await repliesTo(ctx, report, versions),
    repairs: await repo.listRepairs(
      ctx.db,
      versions.map((each) => each.id),
    ),
    viewer: { canReply: ctx.actor?.id === report.order.sellerId && versions.at(-1)?.id === id },
  };
}

/** The newest version of a report on the asker's own boiler. @throws Problem not-signed-in, not-found, not-permitted, wrong-state. */
async function requireOwnNewest(ctx: Ctx, id: string) {
  const actor = requireActor(ctx);
  const report = await reports.getStoredReport(ctx, id);
  if (actor.id !== report.order.sellerId)
    throw new Problem('not-permitted', 'Only the seller of this boiler may answer its report.');
  const versions = await reports.listStoredVersions(ctx, report.order.id);
  if (versions.at(-1)?.id !== id)
    throw new Problem('wrong-state', 'This version has been superseded. Answer the newest one.');
  return { report, versions };
}

/** Answers one finding, once. @throws Problem also invalid-input for what was not found, wrong-state once answered. */
export async function replyToFinding(
  ctx: Ctx,
  id: string,
  { criterionId, text }: BodyOf<typeof replyContract>,
): Promise<ReportReplies> {
  await inTransaction(ctx, async (ctx) => {
    const { report, versions } = await requireOwnNewest(ctx, id);
    if (!findingOf(report, criterionId))
      throw invalidField(['criterionId'], 'This report has no such finding');
    const isAnswered = (await repliesTo(ctx, report, versions)).some(
      (each) => each.criterionId === criterionId,
    );
    const isKept =
      !isAnswered && (await repo.insertReply(ctx.db, { reportId: id, criterionId, text, at: ctx.now() }));
    if (!isKept)
      throw new Problem('wrong-state', 'You have answered this finding. An answer is not changed.');
  });
  return getReportReplies(ctx, id);
}

/** Lists a repair done since the examination. @throws Problem also invalid-input for its day, wrong-state once there are many. */
export async function listRepair(
  ctx: Ctx,
  id: string,
  { text, doneOn }: BodyOf<typeof repairContract>,
): Promise<ReportReplies> {
  await inTransaction(ctx, async (ctx) => {
    const { report, versions } = await requireOwnNewest(ctx, id);
    const examinedOn = report.record.examinedOn ?? dayOf(report.filedAt);
    if (doneOn < examinedOn) throw invalidField(['doneOn'], 'That is before the examination');
    // East of here it is tomorrow already.
    if (doneOn > dayOf(addDays(ctx.now(), 1))) throw invalidField(['doneOn'], 'That day has not come yet');
    const held = await repo.listRepairs(
      ctx.db,
      versions.map((each) => each.id),
    );
    if (held.length >= mostRepairs)
      throw new Problem('wrong-state', `A report lists ${String(mostRepairs)} repairs and no more.`);
    await repo.insertRepair(ctx.db, { reportId: id, text, doneOn, at: ctx.now() });
  });
  return getReportReplies(ctx, id);
}
