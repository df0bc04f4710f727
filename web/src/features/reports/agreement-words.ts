import type { Agreement } from '#shared/surveys/agreement.ts';

const figure = new Intl.NumberFormat('en-GB', { minimumFractionDigits: 2, maximumFractionDigits: 2 });

/** Weighted kappa to two places; null where it is not defined. Never "-0.00". */
export const kappaText = (kappa: number | null): string | null =>
  kappa === null ? null : figure.format(Math.round(kappa * 100) / 100 + 0);

/** From the highest down: what a weighted kappa of at least so much says of two surveys. */
const meanings: readonly (readonly [least: number, meaning: string])[] = [
  [0.9, 'The two surveys say nearly the same thing.'],
  [0.7, 'The two surveys tell much the same story, and differ in the detail.'],
  [0.4, 'The two surveys agree on the whole, but not on every item that counts. Read where they differ.'],
  [
    0.1,
    'They agree more than chance would have it, and not by much. Where most items got one grade, a few differences are enough for that. Read where they differ.',
  ],
  [
    -0.1,
    'Beyond the grade that most items got, they agree no more than chance would have it. Read both reports, and ask those who made them.',
  ],
];
const opposed = 'They differ more than chance would have it. Read both reports, and ask those who made them.';

/** What the agreement of two surveys means, in words; where no kappa is defined, why there is none. */
export function meaningOf({ common, kappa, differences }: Agreement): string {
  if (common === 0) return 'The two graded no item in common, so there is nothing to set side by side.';
  if (common === 1) return 'Only one item was graded by both. One item is too little to work a figure from.';
  if (kappa === null)
    return 'Both gave every item one and the same grade. They agree; but with one grade throughout, no figure can tell that from chance.';
  if (differences.length === 0) return 'Both gave every item that they have in common the same grade.';
  return meanings.find(([least]) => kappa >= least)?.[1] ?? opposed;
}

/** How many of the items in common were graded alike. */
export const alikeText = ({ common, differences }: Agreement): string =>
  `${String(common - differences.length)} of ${String(common)} items that both graded got the same grade.`;
