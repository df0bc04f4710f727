import { work } from './working.ts';
import type { Line } from './working.ts';

/**
 * Cohen's kappa with quadratic disagreement weights (Fleiss and Cohen 1973) over a square table of counts, the first
 * rater in rows. Null where it is not defined: no counts, or all of them expected on the diagonal.
 *
 * @throws RangeError if the table is not square or a count is not a whole number from 0.
 */
export function quadraticKappa(table: readonly (readonly number[])[]): number | null {
  return kappaLine(table)?.result.value ?? null;
}

/** The same, with its working. */
export function kappaLine(table: readonly (readonly number[])[]): Line | null {
  if (table.some((row) => row.length !== table.length)) throw new RangeError('The table must be square');
  if (table.flat().some((count) => !Number.isSafeInteger(count) || count < 0))
    throw new RangeError('Counts are whole numbers from 0');
  const rows = table.map((row) => row.reduce((sum, count) => sum + count, 0));
  const columns = table.map((_, at) => table.reduce((sum, row) => sum + (row[at] ?? 0), 0));
  const all = rows.reduce((sum, count) => sum + count, 0);
  let seen = 0;
  let expected = 0;
  for (const [i, row] of table.entries()) {
    for (const [j, count] of row.entries()) {
      const weight = (i - j) ** 2;
      seen += weight * count;
      expected += weight * (rows[i] ?? 0) * (columns[j] ?? 0);
    }
  }
  if (expected === 0) return null;
  return work({
    result: ['κ', 'Weighted kappa', 'ratio'],
    formula: '1 − {N}·{D} / {E}',
    terms: {
      N: ['Items both graded', 'count', all],
      D: ['Squared steps apart, summed', 'count', seen],
      E: ['The same if grades fell by chance, times the items', 'count', expected],
    },
    compute: ({ N, D, E }) => 1 - (N * D) / E,
    source: 'kappa',
    holds: 'Two sets of grades on one scale; 1 is full agreement, 0 what chance would give',
  });
}
