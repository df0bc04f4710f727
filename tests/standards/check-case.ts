import { readFileSync } from 'node:fs';
import path from 'node:path';
import { parse } from 'csv-parse/sync';
import { expect } from 'vitest';

interface CheckCase {
  id: string;
  topic: string;
  formula: string;
  inputs: string;
  expected: string;
  tolerance: string;
  source: string;
  confidence: 'found' | 'derived' | 'memory';
}

/** Published figures to check the engineering against, each with its source and how sure it is. */
export const checkCases = parse<CheckCase>(
  readFileSync(path.join(import.meta.dirname, 'data/check-cases.csv'), 'utf8'),
  { columns: true },
);

/** What a test of one row is called: what it is, what should come of it, by whom, and how sure. */
export function titled(id: string): string {
  const row = checkCases.find((each) => each.id === id);
  if (!row) throw new Error(`No check case ${id}`);
  return `${id} ${row.formula}: ${row.inputs} → ${row.expected} [${row.source}; ${row.confidence}]`;
}

/** Within so much of a figure. */
export const near = (is: number | null | undefined, expected: number, within: number): void => {
  expect(is).toBeTypeOf('number');
  expect(Math.abs((is ?? Number.NaN) - expected)).toBeLessThanOrEqual(within);
};

/** Within a share of a figure. */
export const nearly = (is: number | null | undefined, expected: number, share: number): void => {
  near(is, expected, Math.abs(expected) * share);
};

export const psi = 6_894.757_293_168;
export const inch = 25.4;
