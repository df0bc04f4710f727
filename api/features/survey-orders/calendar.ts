import { createEvent } from 'ics';
import type { Address } from '#shared/listings/draft.ts';
import type { Instant } from '#shared/time.ts';
import { scopes } from '#shared/surveys/scopes.ts';
import type { ScopeId } from '#shared/surveys/scopes.ts';

/** Hours to keep free for a visit. */
const visitHours: Record<ScopeId, number> = { external: 2, hydraulic: 3, full: 4 };

interface Visit {
  orderId: string;
  title: string;
  scope: ScopeId;
  startsAt: Instant;
  /** How often a time has been agreed: a later file replaces the earlier one in a calendar. */
  sequence: number;
  /** Where, for those who may know it. */
  place: string;
  url: string;
}

/** The visit as a calendar file (RFC 5545). The same order keeps the same entry. */
export function calendarFile({ orderId, title, scope, startsAt, sequence, place, url }: Visit): string {
  const { error, value } = createEvent({
    uid: `${orderId}@tubeplate`,
    productId: 'tubeplate',
    sequence,
    start: Date.parse(startsAt),
    startInputType: 'utc',
    startOutputType: 'utc',
    duration: { hours: visitHours[scope] },
    title: `Boiler survey: ${title}`,
    description: `${scopes[scope].label}.\n${url}`,
    location: place,
    url,
    status: 'CONFIRMED',
    busyStatus: 'BUSY',
  });
  if (error || value === null) throw new Error('The calendar file could not be made', { cause: error });
  return value;
}

export const addressText = ({ line1, line2, postcode }: Address): string =>
  [line1, line2, postcode].filter((line) => line !== '').join(', ');
