import type { Role } from '#shared/accounts/roles.ts';
import { zero } from '#shared/money.ts';
import type { Money } from '#shared/money.ts';
import { invalidField, Problem } from '#shared/problem.ts';
import type { OrderStatus } from '#shared/survey-orders/machine.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { inTransaction, requireRole } from '../../ctx.ts';
import type { Ctx } from '../../ctx.ts';
import * as accounts from '../accounts/service.ts';
import type { Person } from '../accounts/service.ts';
import * as ledger from '../ledger/service.ts';
import type { LedgerEntry } from '../ledger/service.ts';
import * as listings from '../listings/service.ts';
import * as settlements from '../settlements/service.ts';
import * as surveyOrders from '../survey-orders/service.ts';
import { cursorAfter, readCursor, roleAct, toEntry } from './audit.ts';
import type { AuditEntry } from './audit.ts';
import * as repo from './repo.ts';

interface Page<T> {
  items: T[];
  nextCursor: string | null;
}
interface PageQuery {
  cursor?: string | undefined;
  limit: number;
}

/** One more was asked for than is shown: whether it came says whether there are more. */
function pageOf<T>(found: T[], limit: number, cursor: (last: T) => string): Page<T> {
  const items = found.slice(0, limit);
  const last = items.at(-1);
  return { items, nextCursor: found.length > limit && last ? cursor(last) : null };
}

export async function listOfficeOrders(ctx: Ctx, status: OrderStatus | undefined) {
  const orders = await surveyOrders.listForOffice(ctx, status);
  const people = await accounts.getPeople(
    ctx,
    orders.flatMap(({ buyerId, sellerId, surveyorId }) => [buyerId, sellerId, surveyorId]),
  );
  const held = await ledger.getHeld(ctx);
  const nameOf = (id: string): string => people.get(id)?.name ?? '';
  return orders.map((order) => ({
    id: order.id,
    status: order.status,
    listingTitle: order.listing.title,
    listingSlug: order.listing.slug,
    buyer: nameOf(order.buyerId),
    seller: nameOf(order.sellerId),
    surveyor: nameOf(order.surveyorId),
    total: order.total,
    held: held.get(order.id) ?? zero(order.total.currency),
    placedAt: order.placedAt,
    movedAt: order.movedAt,
  }));
}

const part = (account: string): string => account.slice(account.indexOf(':') + 1);

/** What a ledger account is, in words. */
async function labelAccounts(
  ctx: Ctx,
  accountNames: readonly string[],
): Promise<(account: string) => string> {
  const people = await accounts.getPeople(
    ctx,
    accountNames.filter((account) => account.startsWith('surveyor:')).map(part),
  );
  return (account) => {
    if (account === 'processor') return 'With the card processor';
    if (account === 'platform-charge') return 'Tubeplate’s charge';
    if (account.startsWith('held:')) return `Held on order ${part(account).slice(0, 8)}`;
    return `Owed to ${people.get(part(account))?.name ?? 'a surveyor'}`;
  };
}

export async function getOfficeMoney(ctx: Ctx) {
  requireRole(ctx, 'office');
  const all = await ledger.getBalances(ctx);
  const standing = all.filter(({ balance }) => balance.minor !== 0);
  const label = await labelAccounts(
    ctx,
    standing.map(({ account }) => account),
  );
  const held: Money = {
    minor: [...(await ledger.getHeld(ctx)).values()].reduce((sum, { minor }) => sum + minor, 0),
    currency: 'GBP',
  };
  const processorByLedger = await settlements.heldByLedger(ctx);
  const processorByItself = await settlements.askProcessor(ctx);
  return {
    balances: standing.map(({ account, balance }) => ({ account, label: label(account), balance })),
    held,
    processorByLedger,
    processorByItself,
    agrees: processorByItself && processorByItself.minor === processorByLedger.minor,
  };
}

export async function listLedger(ctx: Ctx, { cursor, limit }: PageQuery): Promise<Page<LedgerEntry>> {
  requireRole(ctx, 'office');
  const before = cursor === undefined ? undefined : Number(cursor);
  if (before !== undefined && !Number.isSafeInteger(before))
    throw new Problem('bad-request', 'This place in the list cannot be read. Start again from the top.');
  return pageOf(await ledger.getEntries(ctx, before, limit + 1), limit, ({ id }) => String(id));
}

export async function listAudit(ctx: Ctx, { cursor, limit }: PageQuery): Promise<Page<AuditEntry>> {
  requireRole(ctx, 'office');
  const after = cursor === undefined ? undefined : readCursor(cursor);
  const found = await repo.listEverything(ctx.db, after, limit + 1);
  return pageOf(found.map(toEntry), limit, cursorAfter);
}

const toMember = ({ id, name, email, joinedAt }: Person, roles: Role[]) => ({
  id,
  name,
  email,
  roles,
  joinedAt,
});

export async function listMembers(ctx: Ctx, text: string) {
  requireRole(ctx, 'office');
  const people = await accounts.searchPeople(ctx, text);
  const roles = await accounts.getRoles(
    ctx,
    people.map(({ id }) => id),
  );
  return people.map((person) => toMember(person, roles.get(person.id) ?? []));
}

interface RoleChange {
  userId: string;
  role: Role;
  change: 'grant' | 'withdraw';
  reason: string;
}

/** @throws Problem not-permitted, not-found, wrong-state, invalid-input if it would lock the asker out of the office. */
export async function changeRole(ctx: Ctx, wanted: RoleChange) {
  const actor = requireRole(ctx, 'office');
  const { userId, role, change, reason } = wanted;
  if (userId === actor.id && role === 'office' && change === 'withdraw')
    throw invalidField(['change'], 'Another member of the office has to withdraw this role from you');
  return inTransaction(ctx, async (ctx) => {
    await accounts.changeRole(ctx, wanted);
    const person = await accounts.getPerson(ctx, userId);
    await repo.insertAct(ctx.db, {
      actorId: actor.id,
      act: roleAct(change, role),
      subject: person.name,
      subjectPath: sitePaths.officeMembers,
      reason,
      at: ctx.now(),
    });
    return toMember(person, (await accounts.getRoles(ctx, [userId])).get(userId) ?? []);
  });
}

/** The listing keeps its own record of this, which the audit shows. */
export const moveListingByOffice = (
  ctx: Ctx,
  id: string,
  event: 'takeDown' | 'restore',
  reason: string,
): Promise<{ status: string }> => listings.moveListingByOffice(ctx, id, event, reason);
