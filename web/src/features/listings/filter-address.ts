import { listingSearch } from '#shared/listings/contract.ts';
import type { Filter } from './queries.ts';

const filterSchema = listingSearch.omit({ cursor: true, limit: true }).partial();

/** The filter in an address; what makes no sense there is left out, not refused. */
export function readFilter(search: URLSearchParams): Filter {
  const filter: Record<string, unknown> = {};
  for (const [name, schema] of Object.entries(filterSchema.shape)) {
    const text = search.get(name);
    if (text === null || text === '') continue;
    const parsed = schema.safeParse(text);
    if (parsed.success) filter[name] = parsed.data;
  }
  return filter;
}

/** The address of a filter, in a fixed order so that the same filter has one address. */
export function writeFilter(filter: Filter): URLSearchParams {
  const search = new URLSearchParams();
  for (const name of Object.keys(filterSchema.shape) as (keyof Filter)[]) {
    const value = filter[name];
    if (value !== undefined && !(name === 'sort' && value === 'newest')) search.set(name, String(value));
  }
  return search;
}
