import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { add, gbp, shareOf, splitMoney, subtract, zero } from '#shared/money.ts';

const amount = fc.integer({ min: -1_000_000_000, max: 1_000_000_000 }).map(gbp);
const weights = fc
  .array(fc.integer({ min: 0, max: 1_000_000 }), { minLength: 1, maxLength: 12 })
  .filter((all) => all.some((weight) => weight > 0));

describe('splitting', () => {
  test('loses no penny and makes none', () => {
    fc.assert(
      fc.property(amount, weights, (total, parts) => {
        expect(splitMoney(total, parts).reduce((sum, part) => sum + part.minor, 0)).toBe(total.minor);
      }),
    );
  });

  test('leaves no share a penny or more away from its exact proportion', () => {
    fc.assert(
      fc.property(amount, weights, (total, parts) => {
        const sum = parts.reduce((all, weight) => all + weight, 0);
        for (const [index, share] of splitMoney(total, parts).entries()) {
          const offBy = BigInt(share.minor) * BigInt(sum) - BigInt(total.minor) * BigInt(parts[index]!);
          expect(offBy < BigInt(sum) && offBy > -BigInt(sum)).toBe(true);
        }
      }),
    );
  });

  test('gives nothing to a weight of nothing', () => {
    fc.assert(
      fc.property(amount, weights, (total, parts) => {
        const shares = splitMoney(total, [...parts, 0]);
        expect(shares.at(-1)).toEqual(gbp(0));
      }),
    );
  });

  test('gives the pennies left over to the largest remainders, the earlier first', () => {
    expect(splitMoney(gbp(100), [1, 1, 1])).toEqual([gbp(34), gbp(33), gbp(33)]);
    expect(splitMoney(gbp(12_000), [88, 12])).toEqual([gbp(10_560), gbp(1_440)]);
  });

  test.each([[[]], [[0, 0]], [[-1, 2]], [[0.5, 1]], [[Number.NaN]]])('refuses the weights %j', (parts) => {
    expect(() => splitMoney(gbp(100), parts)).toThrow(RangeError);
  });
});

describe('a share in hundredths of a per cent', () => {
  test('is within half a penny of exact', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 100_000_000 }),
        fc.integer({ min: 0, max: 10_000 }),
        (minor, basisPoints) => {
          const off = shareOf(gbp(minor), basisPoints).minor * 10_000 - minor * basisPoints;
          expect(Math.abs(off)).toBeLessThanOrEqual(5_000);
        },
      ),
    );
  });

  test('is rounded half up, once', () => {
    expect(shareOf(gbp(125), 1_200)).toEqual(gbp(15));
    expect(shareOf(gbp(25), 200)).toEqual(gbp(1));
    expect(shareOf(gbp(24), 200)).toEqual(gbp(0));
  });

  test.each([-1, 0.5, Number.NaN])('refuses a rate of %d', (rate) => {
    expect(() => shareOf(gbp(100), rate)).toThrow(RangeError);
  });
});

describe('adding', () => {
  test('what is added and taken away again leaves the same', () => {
    fc.assert(
      fc.property(amount, amount, (a, b) => {
        expect(subtract(add(a, b), b)).toEqual(a);
      }),
    );
  });

  test('two currencies cannot be added', () => {
    expect(() => add(gbp(1), zero('EUR'))).toThrow(RangeError);
  });

  test('a sum beyond the whole numbers that are exact is refused', () => {
    expect(() => add(gbp(Number.MAX_SAFE_INTEGER), gbp(1))).toThrow(RangeError);
  });
});
