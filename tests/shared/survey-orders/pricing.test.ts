import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { feeBands, platformChargeBasisPoints, quote, surveyorFees } from '#shared/survey-orders/pricing.ts';
import { extras, scopes } from '#shared/surveys/scopes.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';

const scopeIds = Object.keys(scopes) as ScopeId[];
const extraIds = Object.keys(extras) as ExtraId[];
const within = (id: ScopeId | ExtraId) =>
  fc.integer({ min: feeBands[id].lowMinor, max: feeBands[id].highMinor });

const fees = fc.record({
  external: within('external'),
  hydraulic: within('hydraulic'),
  full: within('full'),
  thickness: within('thickness'),
  borescope: within('borescope'),
  perKmMinor: fc.integer({ min: 0, max: 100 }),
});
const commission = fc.record({
  fees,
  scope: fc.constantFrom(...scopeIds),
  extras: fc.array(fc.constantFrom(...extraIds), { maxLength: 4 }),
  distanceKm: fc.double({ min: 0, max: 1_000, noNaN: true }),
  currency: fc.constant('GBP' as const),
});

describe('a quotation', () => {
  test('adds up to the penny: lines to the total, parts to the total', () => {
    fc.assert(
      fc.property(commission, (input) => {
        const { lines, total, surveyorPart, platformPart } = quote(input);
        expect(lines.reduce((sum, { amount }) => sum + amount.minor, 0)).toBe(total.minor);
        expect(surveyorPart.minor + platformPart.minor).toBe(total.minor);
        expect(lines.every(({ amount }) => Number.isSafeInteger(amount.minor) && amount.minor >= 0)).toBe(
          true,
        );
      }),
    );
  });

  test('keeps for the platform its share, within half a penny, and names it as the last line', () => {
    fc.assert(
      fc.property(commission, (input) => {
        const { lines, surveyorPart, platformPart } = quote(input);
        const off = platformPart.minor * 10_000 - surveyorPart.minor * platformChargeBasisPoints;
        expect(Math.abs(off)).toBeLessThanOrEqual(5_000);
        expect(lines.at(-1)).toMatchObject({ kind: 'charge', amount: platformPart });
      }),
    );
  });

  test('is the same whatever the order of the extras, and counts each once', () => {
    fc.assert(
      fc.property(commission, (input) => {
        const again = { ...input, extras: [...input.extras.toReversed(), ...input.extras] };
        expect(quote(again)).toEqual(quote(input));
      }),
    );
  });

  test('is never less for a greater distance', () => {
    fc.assert(
      fc.property(commission, fc.double({ min: 0, max: 500, noNaN: true }), (input, more) => {
        const further = quote({ ...input, distanceKm: input.distanceKm + more });
        expect(further.total.minor).toBeGreaterThanOrEqual(quote(input).total.minor);
      }),
    );
  });

  test('of a full survey with readings 21.3 km away', () => {
    const found = quote({
      fees: {
        external: 6_000,
        hydraulic: 11_000,
        full: 18_500,
        thickness: 2_500,
        borescope: null,
        perKmMinor: 40,
      },
      scope: 'full',
      extras: ['thickness'],
      distanceKm: 21.3,
      currency: 'GBP',
    });
    // 185.00 + 25.00 + 42.6 km × 0.40 = 17.04; 12 % of 227.04 is 27.2448.
    expect(found.lines.map(({ amount }) => amount.minor)).toEqual([18_500, 2_500, 1_704, 2_724]);
    expect(found.total.minor).toBe(25_428);
  });

  const plain = { scope: 'external', currency: 'GBP' } as const;
  const some = {
    external: 6_000,
    hydraulic: 11_000,
    full: 18_500,
    thickness: null,
    borescope: null,
    perKmMinor: 40,
  };
  test('refuses an extra that is not offered, and what is no distance', () => {
    expect(() => quote({ ...plain, fees: some, extras: ['thickness'], distanceKm: 1 })).toThrow(RangeError);
    for (const distanceKm of [-1, Number.NaN, 20_100, Number.POSITIVE_INFINITY])
      expect(() => quote({ ...plain, fees: some, extras: [], distanceKm })).toThrow(RangeError);
  });
});

describe('fees', () => {
  test('within the bands are taken, a penny outside refused', () => {
    fc.assert(
      fc.property(fees, fc.constantFrom(...scopeIds, ...extraIds), (given, id) => {
        expect(surveyorFees.safeParse(given).success).toBe(true);
        for (const outside of [feeBands[id].lowMinor - 1, feeBands[id].highMinor + 1, given[id] + 0.5])
          expect(surveyorFees.safeParse({ ...given, [id]: outside }).success).toBe(false);
      }),
    );
  });
});
