import type { Me, Units } from '#shared/accounts/contract.ts';
import type { Role } from '#shared/accounts/roles.ts';
import { Problem } from '#shared/problem.ts';
import * as authRepo from '../../auth/repo.ts';
import { inTransaction, requireActor } from '../../ctx.ts';
import type { Actor, Ctx } from '../../ctx.ts';
import * as repo from './repo.ts';
import type { Person } from './repo.ts';

export type { Person } from './repo.ts';

async function describe(ctx: Ctx, actor: Actor): Promise<Me> {
  const person = await getPerson(ctx, actor.id);
  const granted = await authRepo.listRoles(ctx.db, actor.id);
  const mustEnrol = granted.includes('office') && !actor.roles.has('office');
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    emailVerified: person.isEmailVerified,
    roles: [...actor.roles],
    units: person.units,
    hasSecondFactor: person.hasSecondFactor,
    mustEnrol,
    canSkipEnrolment: mustEnrol && ctx.site.isDemo,
  };
}

export async function getMe(ctx: Ctx): Promise<Me | null> {
  return ctx.actor && describe(ctx, ctx.actor);
}

export async function updateMe(ctx: Ctx, change: { name?: string; units?: Units }): Promise<Me> {
  const actor = requireActor(ctx);
  if (Object.keys(change).length > 0) await repo.updatePerson(ctx.db, actor.id, change);
  return describe(ctx, actor);
}

/** Demonstration only: lets this session into the office without a second factor. */
export async function skipEnrolment(ctx: Ctx): Promise<void> {
  const actor = requireActor(ctx);
  if (!ctx.site.isDemo) throw new Problem('not-permitted');
  await authRepo.updateEnrolmentSkipped(ctx.db, actor.sessionId);
}

/** @throws Problem not-found. */
export async function getPerson(ctx: Ctx, id: string): Promise<Person> {
  const person = await repo.findPerson(ctx.db, id);
  if (!person) throw new Problem('not-found');
  return person;
}

export const getPeople = (ctx: Ctx, ids: readonly string[]): Promise<Map<string, Person>> =>
  repo.listPeople(ctx.db, ids);

export const searchPeople = (ctx: Ctx, text: string): Promise<Person[]> =>
  repo.searchPeople(ctx.db, text, 50);

export const getRoles = (ctx: Ctx, ids: readonly string[]): Promise<Map<string, Role[]>> =>
  repo.listRolesOf(ctx.db, ids);

export const getPeopleInRole = (ctx: Ctx, role: Role): Promise<string[]> =>
  repo.listPeopleInRole(ctx.db, role);

interface RoleChange {
  userId: string;
  role: Role;
  change: 'grant' | 'withdraw';
  reason: string;
}

/** Grants or withdraws a role. The caller has made sure that it may. */
export async function changeRole(ctx: Ctx, { userId, role, change, reason }: RoleChange): Promise<void> {
  await inTransaction(ctx, async (ctx) => {
    await getPerson(ctx, userId);
    const held = (await authRepo.listRoles(ctx.db, userId)).includes(role);
    const entry = { userId, role, by: ctx.actor?.id ?? null, reason, at: ctx.now() };
    if (held === (change === 'grant')) {
      throw new Problem('wrong-state', held ? 'They have that role already.' : 'They do not have that role.');
    }
    if (change === 'grant') await repo.insertRoleGrant(ctx.db, entry);
    else await repo.updateRoleWithdrawn(ctx.db, entry);
  });
}

/** For the seed: a demonstration person whose letter nobody needs to open. */
export async function confirmEmail(ctx: Ctx, email: string): Promise<Person> {
  const person = await repo.findPersonByEmail(ctx.db, email);
  if (!person) throw new Problem('not-found');
  await repo.updateEmailVerified(ctx.db, person.id);
  return { ...person, isEmailVerified: true };
}
