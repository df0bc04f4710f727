import { expect, test } from 'vitest';
import { calculatorOf } from '#shared/workings/index.ts';

const psi = 6_894.757_293_168;

/** What is said beside each field of a calculator given its example with some of it changed. */
function saidOf(id: string, change: Record<string, unknown>): Record<string, string> {
  const calculator = calculatorOf(id)!;
  const read = calculator.schema.safeParse({ ...calculator.initial, ...change });
  return Object.fromEntries(read.error?.issues.map(({ path, message }) => [String(path[0]), message]) ?? []);
}

test.each([
  [
    'a wall of nothing',
    { barrelWallMm: 0 },
    { barrelWallMm: 'Wall cannot be less than 0.1 mm (0.003937 in)' },
  ],
  [
    'a negative pressure',
    { workingPa: -1 },
    { workingPa: 'Working pressure cannot be less than 0.1 bar (1.45 psi)' },
  ],
  [
    '10,000 psi',
    { workingPa: 10_000 * psi },
    { workingPa: 'Working pressure cannot be more than 20 bar (290.1 psi)' },
  ],
  [
    'a flue wider than the barrel',
    { flue: 'fitted', flueOutsideMm: 120 },
    { flueOutsideMm: 'The flue cannot be as wide as the barrel' },
  ],
  [
    'a stay pitch smaller than the stay',
    { stays: 'fitted', stayMm: 6, stayPitchMm: 5 },
    { stayPitchMm: 'The pitch cannot be smaller than the stay: they would touch' },
  ],
  [
    'a wall that leaves no inside',
    { barrelOutsideMm: 40, barrelWallMm: 20, pitchMm: 10 },
    { barrelWallMm: 'The wall cannot be half the barrel or more: it would leave no inside' },
  ],
  ['an unknown metal', { material: 'tin' }, { material: 'Choose one: metal' }],
  ['words for a figure', { barrelOutsideMm: 'four' }, { barrelOutsideMm: 'Give a figure: outside diameter' }],
])('pressure by parts, %s: a sentence beside the field', (_, change, said) => {
  expect(saidOf('pressure-by-parts', change)).toEqual(said);
});

test('an engine cannot have more pressure than its boiler', () => {
  expect(saidOf('engine', { pressurePa: 900_000 })).toEqual({
    pressurePa: 'The engine cannot have more pressure than the boiler works at',
  });
});

test('a gauge that ends below working pressure is refused', () => {
  expect(Object.keys(saidOf('pressure-gauge', { fullScalePa: 300_000 }))).toEqual(['fullScalePa']);
});

test('what nobody knows is said to be measured, and the rest is worked out', () => {
  const calculator = calculatorOf('pressure-by-parts')!;
  const { steps, says } = calculator.work(
    calculator.schema.parse({ ...calculator.initial, barrelWallMm: null, tubeWallMm: null }),
  );
  expect(steps.flatMap(({ refusals }) => refusals.map(({ text }) => text))).toEqual([
    'Measure the wall of the barrel.',
    'Measure the diameter and the wall of a tube.',
  ]);
  expect(says.join(' ')).toContain('The end plates govern');
  expect(says.join(' ')).toContain('still unknown: barrel and tubes');
  expect(says.join(' ')).toContain('needs a wall of at least');
});

test('brass is refused, and never guessed at', () => {
  const calculator = calculatorOf('metal-stress')!;
  const outcome = calculator.work(calculator.schema.parse({ ...calculator.initial, material: 'brass' }));
  expect(outcome.steps.flatMap(({ refusals }) => refusals.map(({ refused }) => refused))).toEqual([
    'not-published',
  ]);
});
