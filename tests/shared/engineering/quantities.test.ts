import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fromKept, quantities, quantityText, toKept } from '#shared/engineering/quantities.ts';
import type { Quantity } from '#shared/engineering/quantities.ts';
import {
  joulesPerBtu,
  kgPerPound,
  kmPerMile,
  litresPerPint,
  mmPerInch,
  newtonsPerPoundForce,
  paPerPsi,
} from '#shared/engineering/units.ts';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import { calculatorOf } from '#shared/workings/index.ts';
import { wiredAnswer } from '#shared/workings/wire.ts';

describe('exact definitions: NIST SP 811 (2008), appendix B.8; Weights and Measures Act 1985 for the pint', () => {
  test.each([
    ['in → mm', mmPerInch, 25.4],
    ['lb → kg', kgPerPound, 0.453_592_37],
    ['mile → km', kmPerMile, 1.609_344],
    ['lbf → N', newtonsPerPoundForce, 4.448_221_615_260_5],
    ['imperial pint → L', litresPerPint, 4.546_09 / 8],
    ['Btu(IT) → J', joulesPerBtu, 1_055.055_852_62],
  ])('%s', (_, is, exact) => {
    expect(is).toBeCloseTo(exact, 13);
  });

  test('psi → Pa, printed to seven digits as 6.894 757 E+03', () => {
    expect(paPerPsi / 1_000).toBeCloseTo(6.894_757, 6);
  });

  test.each([
    ['temperature', 273.15, 0, 32],
    ['temperature', 373.15, 100, 212],
    ['pressure', 100_000, 1, 14.503_773_8],
    ['surface', 1, 1, 10.763_910_4],
    ['specificVolume', 1, 1, 16.018_463_4],
    ['enthalpy', 1, 1, 0.429_922_6],
    ['power', 1, 1, 3_412.141_6],
    ['steamingRate', 1, 1, 0.204_816_1],
  ] as const)('%s %d', (quantity, kept, metric, imperial) => {
    expect(fromKept(quantity, 'metric', kept)).toBeCloseTo(metric, 6);
    expect(fromKept(quantity, 'imperial', kept)).toBeCloseTo(imperial, 3);
  });
});

test('whatever is written in either units comes back as it was', () => {
  const ids = Object.keys(quantities) as Quantity[];
  fc.assert(
    fc.property(
      fc.constantFrom(...ids),
      fc.constantFrom('metric' as const, 'imperial' as const),
      fc.double({ min: 0.001, max: 1e6, noNaN: true }),
      (quantity, units, written) => {
        const back = fromKept(quantity, units, toKept(quantity, units, written));
        expect(Math.abs(back - written)).toBeLessThanOrEqual(written * 1e-9 + 1e-8);
      },
    ),
    { numRuns: 2_000 },
  );
});

test('no figure is ever written with an exponent, nor is what is no figure', () => {
  fc.assert(
    fc.property(fc.double(), (value) => {
      expect(quantityText('length', 'imperial', value)).not.toMatch(/NaN|Infinity|∞|\d[eE]/);
    }),
  );
});

test('one boiler given in pounds and inches or in bar and millimetres gives the same bytes', () => {
  const calculator = calculatorOf('pressure-by-parts')!;
  // Sizes to a hundredth of a millimetre and pressures to a hundred pascals: finer than anyone reads.
  const hundredths = (least: number, most: number) => fc.integer({ min: least * 100, max: most * 100 });
  fc.assert(
    fc.property(
      fc.integer({ min: 1_000, max: 12_000 }),
      hundredths(60, 300),
      hundredths(1, 6),
      hundredths(1, 8),
      (hundreds, across, wall, plate) => {
        const kept = {
          workingPa: hundreds * 100,
          barrelOutsideMm: across / 100,
          barrelWallMm: wall / 100,
          plateMm: plate / 100,
        };
        const quantityOf = { workingPa: 'pressure' } as const;
        const answerIn = (units: 'metric' | 'imperial'): string => {
          const typed = Object.entries(kept).map(([name, value]) => {
            const quantity = name in quantityOf ? ('pressure' as const) : ('length' as const);
            return [name, toKept(quantity, units, fromKept(quantity, units, value))];
          });
          const inputs = calculator.schema.parse({ ...calculator.initial, ...Object.fromEntries(typed) });
          return canonicalJson(wiredAnswer(calculator, calculator.work(inputs), 'metric'));
        };
        expect(answerIn('imperial')).toBe(answerIn('metric'));
      },
    ),
    { numRuns: 500 },
  );
});
