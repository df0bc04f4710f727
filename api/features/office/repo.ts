import { sql } from 'drizzle-orm';
import type { Instant } from '#shared/time.ts';
import type { Db } from '../../db/client.ts';
import { officeActs } from '../../db/schema/index.ts';

export interface OfficeAct {
  actorId: string;
  act: string;
  subject: string;
  subjectPath: string | null;
  reason: string;
  at: Instant;
}

export async function insertAct(db: Db, { at, ...act }: OfficeAct): Promise<void> {
  await db.insert(officeActs).values({ ...act, at: new Date(at) });
}

/** One thing that happened, whichever record keeps it. */
export interface StoredEntry {
  /** Names the record and the row; with `at`, the place in the list. */
  id: string;
  at: Instant;
  kind: 'order' | 'listing' | 'payment' | 'office' | 'role';
  actorName: string | null;
  what: string;
  /** Title of the boiler, name of the person. */
  subject: string;
  /** Slug of the listing, id of the order, or the path itself. */
  key: string | null;
  reason: string;
}

/** Everything that moved. What an office act tells already is left out of the roles. */
const everything = sql`
  select 'order-' || lpad(e.id::text, 12, '0') as id, e.at, 'order' as kind, e.actor_id as actor, e.event as what,
    l.draft->>'title' as subject, e.order_id::text as key, e.reason
  from survey_order_events e join survey_orders o on o.id = e.order_id join listings l on l.id = o.listing_id
  union all
  select 'listing-' || lpad(e.id::text, 12, '0'), e.at, 'listing', e.actor_id, e.event,
    l.draft->>'title', l.slug, e.reason
  from listing_events e join listings l on l.id = e.listing_id
  union all
  select 'payment-' || lpad(m.id::text, 12, '0'), m.at, 'payment', null, m."to",
    l.draft->>'title', p.order_id::text, m.reason
  from payment_moves m join payments p on p.id = m.payment_id
    join survey_orders o on o.id = p.order_id join listings l on l.id = o.listing_id
  union all
  select 'office-' || lpad(a.id::text, 12, '0'), a.at, 'office', a.actor_id, a.act, a.subject, a.subject_path, a.reason
  from office_acts a
  union all
  select 'role-' || g.user_id || '-' || g.role || '-granted', g.granted_at, 'role', null, 'grant ' || g.role,
    u.name, null, g.reason
  from role_grants g join "user" u on u.id = g.user_id where g.granted_by is null
  union all
  select 'role-' || g.user_id || '-' || g.role || '-withdrawn', g.withdrawn_at, 'role', null, 'withdraw ' || g.role,
    u.name, null, coalesce(g.withdrawn_reason, '')
  from role_grants g join "user" u on u.id = g.user_id where g.withdrawn_at is not null and g.withdrawn_by is null`;

/** Newest first, after the place given. */
export async function listEverything(
  db: Db,
  after: { at: Instant; id: string } | undefined,
  limit: number,
): Promise<StoredEntry[]> {
  const place = after
    ? sql`where (r.at, r.id collate "C") < (${after.at}::timestamptz, ${after.id}::text collate "C")`
    : sql``;
  const { rows } = (await db.execute(sql`
    select r.id, to_char(r.at at time zone 'utc', 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"') as at, r.kind,
      who.name as "actorName", r.what, r.subject, r.key, r.reason
    from (${everything}) r left join "user" who on who.id = r.actor
    ${place}
    order by r.at desc, r.id collate "C" desc
    limit ${limit}`)) as { rows: StoredEntry[] };
  return rows;
}
