import { and, eq, isNull } from 'drizzle-orm';
import type { Role } from '#shared/accounts/roles.ts';
import type { Db } from '../db/client.ts';
import { roleGrants, session, user } from '../db/schema/index.ts';

/** Roles in force. */
export async function listRoles(db: Db, userId: string): Promise<Role[]> {
  const rows = await db
    .select({ role: roleGrants.role })
    .from(roleGrants)
    .where(and(eq(roleGrants.userId, userId), isNull(roleGrants.withdrawnAt)));
  return rows.map((row) => row.role);
}

export async function findSession(db: Db, sessionId: string) {
  const [row] = await db
    .select({ enrolmentSkipped: session.enrolmentSkipped, hasSecondFactor: user.twoFactorEnabled })
    .from(session)
    .innerJoin(user, eq(user.id, session.userId))
    .where(eq(session.id, sessionId));
  return row && { enrolmentSkipped: row.enrolmentSkipped, hasSecondFactor: row.hasSecondFactor ?? false };
}

export async function updateEnrolmentSkipped(db: Db, sessionId: string): Promise<void> {
  await db.update(session).set({ enrolmentSkipped: true }).where(eq(session.id, sessionId));
}
