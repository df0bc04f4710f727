export type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json };

/**
 * JSON with its keys in code-unit order and no spaces, after RFC 8785: equal values give equal bytes, so a hash of
 * them can be checked later. Members that are `undefined` are left out, as JSON has no such value.
 *
 * @throws RangeError for what JSON cannot hold: NaN, infinity, functions, symbols, bigint.
 */
export function canonicalJson(value: unknown): string {
  if (value === null || typeof value === 'boolean' || typeof value === 'string') return JSON.stringify(value);
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new RangeError('JSON cannot hold a number that is not finite');
    return JSON.stringify(value);
  }
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(',')}]`;
  if (typeof value !== 'object') throw new RangeError(`JSON cannot hold a ${typeof value}`);
  const members = Object.entries(value)
    .filter(([, member]) => member !== undefined)
    .toSorted(([a], [b]) => compareCodeUnits(a, b))
    .map(([key, member]) => `${JSON.stringify(key)}:${canonicalJson(member)}`);
  return `{${members.join(',')}}`;
}

/** Order by UTF-16 code units: the same on every machine, whatever its language. */
export const compareCodeUnits = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

/** An order for values that depends on nothing but the values. */
export const compareCanonical = (a: unknown, b: unknown): number =>
  compareCodeUnits(canonicalJson(a), canonicalJson(b));
