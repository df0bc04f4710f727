import { listingEventLabels } from '#shared/listings/machine.ts';
import type { ListingEvent } from '#shared/listings/machine.ts';
import { paymentStatusLabels } from '#shared/payments/machine.ts';
import type { PaymentStatus } from '#shared/payments/machine.ts';
import { orderEventLabels } from '#shared/survey-orders/machine.ts';
import type { RecordedEvent } from '#shared/survey-orders/machine.ts';
import { roles } from '#shared/accounts/roles.ts';
import type { Role } from '#shared/accounts/roles.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { Problem } from '#shared/problem.ts';
import { instant } from '#shared/time.ts';
import type { Instant } from '#shared/time.ts';
import type { StoredEntry } from './repo.ts';

export interface AuditEntry {
  id: string;
  at: Instant;
  who: string;
  what: string;
  subject: string;
  subjectPath: string | null;
  reason: string;
}

export const roleAct = (change: 'grant' | 'withdraw', role: Role): string =>
  `${change === 'grant' ? 'Granted' : 'Withdrew'} the role ${roles[role].toLowerCase()}`;

function wordsOf({ kind, what }: StoredEntry): string {
  switch (kind) {
    case 'order':
      return orderEventLabels[what as RecordedEvent];
    case 'listing':
      return listingEventLabels[what as ListingEvent];
    case 'payment':
      return `Money: ${paymentStatusLabels[what as PaymentStatus].toLowerCase()}`;
    case 'role': {
      const [change, role] = what.split(' ');
      return roleAct(change as 'grant' | 'withdraw', role as Role);
    }
    case 'office':
      break;
  }
  return what;
}

function pathOf({ kind, key }: StoredEntry): string | null {
  if (key === null) return null;
  if (kind === 'listing') return sitePaths.listing(key);
  return kind === 'office' ? key : sitePaths.order(key);
}

/** A stored entry in the words that people read. */
export const toEntry = (entry: StoredEntry): AuditEntry => ({
  id: entry.id,
  at: entry.at,
  who: entry.actorName ?? 'Tubeplate',
  what: wordsOf(entry),
  subject: entry.subject,
  subjectPath: pathOf(entry),
  reason: entry.reason,
});

export const cursorAfter = ({ at, id }: Pick<AuditEntry, 'at' | 'id'>): string =>
  Buffer.from(`${at} ${id}`).toString('base64url');

/** @throws Problem bad-request if it is none of ours. */
export function readCursor(cursor: string): { at: Instant; id: string } {
  const [at, id] = Buffer.from(cursor, 'base64url').toString('utf8').split(' ');
  if (!id || !instant.safeParse(at).success)
    throw new Problem('bad-request', 'This place in the list cannot be read. Start again from the top.');
  return { at: at ?? '', id };
}
