import { expect, test } from 'vitest';
import { isOldReport } from '#shared/surveys/age.ts';

test.each([
  ['2026-05-16', '2026-05-16', false],
  ['2026-05-16', '2027-07-16', false],
  ['2026-05-16', '2027-07-17', true],
  ['2025-12-31', '2027-02-28', false],
  ['2025-12-31', '2027-03-01', true],
])('of what was examined on %s, asked on %s: old is %s', (examinedOn, on, isOld) => {
  expect(isOldReport(examinedOn, on)).toBe(isOld);
});
