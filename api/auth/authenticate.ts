import type { Actor } from '../ctx.ts';
import type { Db } from '../db/client.ts';
import type { Auth } from './auth.ts';
import { findSession, listRoles } from './repo.ts';

/** Who sends these headers; null for a visitor. The office role counts only with a second factor, or where a demonstration skipped it. */
export async function authenticate(
  auth: Auth,
  db: Db,
  isDemo: boolean,
  headers: Headers,
): Promise<Actor | null> {
  if (!headers.get('cookie')?.includes('tubeplate.')) return null;
  const found = await auth.api.getSession({ headers });
  if (!found) return null;
  const { user, session } = found;
  const granted = await listRoles(db, user.id);
  const roles = new Set(granted);
  if (roles.has('office')) {
    const state = await findSession(db, session.id);
    const mayEnter = state?.hasSecondFactor || (isDemo && state?.enrolmentSkipped);
    if (!mayEnter) roles.delete('office');
  }
  return {
    id: user.id,
    name: user.name,
    email: user.email,
    isEmailVerified: user.emailVerified,
    roles,
    sessionId: session.id,
  };
}
