import { expect, test } from 'vitest';
import { testsDueByPapers } from '#shared/papers/due.ts';
import type { Paper } from '#shared/boilers/boiler.ts';

const hydraulic = (datedOn: string | null): Paper => ({ kind: 'hydraulic-certificate', datedOn, by: '' });
const steam = (datedOn: string | null): Paper => ({ kind: 'steam-certificate', datedOn, by: '' });

test('copper: 48 months from the latest hydraulic certificate, 12 from the latest steam', () => {
  const papers = [hydraulic('2021-03-01'), hydraulic('2024-02-29'), steam('2026-01-31')];
  const due = testsDueByPapers({ material: 'copper', papers }, '2026-12-01');
  expect(due.map(({ dueFrom, isOverdue }) => [dueFrom, isOverdue])).toEqual([
    ['2028-02-29', false],
    ['2027-01-31', false],
  ]);
  expect(due[0]?.text).toBe(
    'Hydraulic test of 29 February 2024: due again on 29 February 2028. The inspector may ask for one sooner.',
  );
});

test('steel: 24 months after a second test; a band where one paper cannot say which test it was', () => {
  const one = testsDueByPapers({ material: 'steel', papers: [hydraulic('2024-06-01')] }, '2026-12-01');
  expect([one[0]?.dueFrom, one[0]?.dueBy]).toEqual(['2026-06-01', '2028-06-01']);
  expect(one[0]?.text).toContain('between 1 June 2026 and 1 June 2028');
  const two = testsDueByPapers(
    { material: 'steel', papers: [hydraulic('2020-06-01'), hydraulic('2024-06-01')] },
    '2026-12-01',
  );
  expect([two[0]?.dueFrom, two[0]?.isOverdue]).toEqual(['2026-06-01', true]);
  expect(two[0]?.text).toContain('was due again on 1 June 2026');
});

test('no date on any paper: due, and never valid', () => {
  const due = testsDueByPapers({ material: 'copper', papers: [hydraulic(null)] }, '2026-12-01');
  for (const { text, isOverdue } of due) {
    expect(text).toMatch(/: due\. No paper/);
    expect(isOverdue).toBeNull();
    expect(text).not.toMatch(/valid/i);
  }
});
