import { expect, test } from 'vitest';
import { quantityOf, shownText } from '#web/features/surveys/quantities.ts';

test.each([
  ['Pa', 'imperial', '80.5'],
  ['Pa', 'metric', '5.5'],
  ['Pa/min', 'imperial', '2'],
  ['mm', 'imperial', '0.094'],
  ['mm', 'metric', '2.4'],
  ['ppm', 'metric', '12'],
] as const)('%s typed in %s units reads back as it was typed', (unit, units, typed) => {
  const quantity = quantityOf(unit, units)!;
  expect(shownText(Number(typed) * quantity.factor, quantity)).toBe(typed);
});

// 1 psi = 6 894.757 Pa: NIST Special Publication 811 (2008), appendix B.8.
test('a pound to the square inch is kept as 6 894.757 Pa', () => {
  expect(quantityOf('Pa', 'imperial')?.factor).toBeCloseTo(6_894.757, 3);
});

test('words and choices are no figures', () => {
  expect(quantityOf('text', 'metric')).toBeNull();
  expect(quantityOf('yes-no', 'metric')).toBeNull();
  expect(quantityOf('choice', 'metric')).toBeNull();
});
