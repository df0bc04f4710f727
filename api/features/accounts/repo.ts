import { and, eq, ilike, inArray, isNull, or } from 'drizzle-orm';
import type { Units } from '#shared/accounts/contract.ts';
import type { Role } from '#shared/accounts/roles.ts';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { roleGrants, user } from '../../db/schema/index.ts';

export interface Person {
  id: string;
  name: string;
  email: string;
  isEmailVerified: boolean;
  hasSecondFactor: boolean;
  units: Units;
  joinedAt: Instant;
}

const fromRow = (row: typeof user.$inferSelect): Person => ({
  id: row.id,
  name: row.name,
  email: row.email,
  isEmailVerified: row.emailVerified,
  hasSecondFactor: row.twoFactorEnabled ?? false,
  units: row.units === 'metric' ? 'metric' : 'imperial',
  joinedAt: row.createdAt.toISOString(),
});

export async function findPerson(db: Db, id: string): Promise<Person | undefined> {
  const [row] = await db.select().from(user).where(eq(user.id, id));
  return row && fromRow(row);
}

export async function findPersonByEmail(db: Db, email: string): Promise<Person | undefined> {
  const [row] = await db.select().from(user).where(eq(user.email, email.toLowerCase()));
  return row && fromRow(row);
}

export async function listPeople(db: Db, ids: readonly string[]): Promise<Map<string, Person>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select()
    .from(user)
    .where(inArray(user.id, [...new Set(ids)]));
  return new Map(rows.map((row) => [row.id, fromRow(row)]));
}

export async function searchPeople(db: Db, text: string, most: number): Promise<Person[]> {
  const like = `%${text.replaceAll(/[\\%_]/g, String.raw`\$&`)}%`;
  const rows = await db
    .select()
    .from(user)
    .where(or(ilike(user.name, like), ilike(user.email, like)))
    .orderBy(user.name)
    .limit(most);
  return rows.map(fromRow);
}

export async function updatePerson(
  db: Db,
  id: string,
  change: { name?: string; units?: Units },
): Promise<void> {
  await db.update(user).set(change).where(eq(user.id, id));
}

export async function updateEmailVerified(db: Db, id: string): Promise<void> {
  await db.update(user).set({ emailVerified: true }).where(eq(user.id, id));
}

export async function listRolesOf(db: Db, ids: readonly string[]): Promise<Map<string, Role[]>> {
  const found = new Map<string, Role[]>(ids.map((id) => [id, []]));
  if (ids.length === 0) return found;
  const rows = await db
    .select({ userId: roleGrants.userId, role: roleGrants.role })
    .from(roleGrants)
    .where(and(inArray(roleGrants.userId, [...ids]), isNull(roleGrants.withdrawnAt)));
  for (const row of rows) found.get(row.userId)?.push(row.role);
  return found;
}

export async function listPeopleInRole(db: Db, role: Role): Promise<string[]> {
  const rows = await db
    .select({ userId: roleGrants.userId })
    .from(roleGrants)
    .where(and(eq(roleGrants.role, role), isNull(roleGrants.withdrawnAt)));
  return rows.map((row) => row.userId);
}

interface RoleChange {
  userId: string;
  role: Role;
  by: string | null;
  reason: string;
  at: Instant;
}

export async function insertRoleGrant(db: Db, { userId, role, by, reason, at }: RoleChange): Promise<void> {
  await db.insert(roleGrants).values({ userId, role, grantedBy: by, reason, grantedAt: new Date(at) });
}

/** @returns false if the role was not in force. */
export async function updateRoleWithdrawn(
  db: Db,
  { userId, role, by, reason, at }: RoleChange,
): Promise<boolean> {
  const rows = await db
    .update(roleGrants)
    .set({ withdrawnAt: new Date(at), withdrawnBy: by, withdrawnReason: reason })
    .where(and(eq(roleGrants.userId, userId), eq(roleGrants.role, role), isNull(roleGrants.withdrawnAt)))
    .returning({ userId: roleGrants.userId });
  return rows.length > 0;
}
