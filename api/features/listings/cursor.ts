import { z } from 'zod';
import type { ListingSearch } from '#shared/listings/contract.ts';
import { invalidField } from '#shared/problem.ts';
import { instant } from '#shared/time.ts';

/** Where a page ended: the value it was sorted by, and the id that breaks ties. */
export type Place =
  | { sort: 'newest'; publishedAt: string; id: string }
  | { sort: 'price-low' | 'price-high'; askingMinor: number; id: string };

const place = z.union([
  z.tuple([z.literal('newest'), instant, z.uuid()]),
  z.tuple([z.enum(['price-low', 'price-high']), z.int(), z.uuid()]),
]);

/** Opaque to the caller, and safe in an address. */
export function writeCursor(at: Place): string {
  const value = at.sort === 'newest' ? at.publishedAt : at.askingMinor;
  return Buffer.from(JSON.stringify([at.sort, value, at.id])).toString('base64url');
}

function decode(text: string): unknown {
  try {
    return JSON.parse(Buffer.from(text, 'base64url').toString('utf8'));
  } catch {
    return undefined;
  }
}

/** @throws Problem invalid-input if it is none of ours, or of a list sorted otherwise. */
export function readCursor(text: string, sort: ListingSearch['sort']): Place {
  const parsed = place.safeParse(decode(text));
  if (!parsed.success || parsed.data[0] !== sort)
    throw invalidField(['cursor'], 'That is not a place in this list. Start again from the first page.');
  const [kind, value, id] = parsed.data;
  return kind === 'newest' ? { sort: kind, publishedAt: value, id } : { sort: kind, askingMinor: value, id };
}
