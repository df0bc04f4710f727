import { z } from 'zod';

export const currencies = ['GBP', 'EUR', 'USD'] as const;
export const currency = z.enum(currencies);
export type Currency = z.infer<typeof currency>;

/** Whole minor units (pence, cents) of a currency. Never a float. */
export const money = z.strictObject({
  minor: z.int('Whole pence only').min(-1_000_000_000).max(1_000_000_000, 'That is more than we can handle'),
  currency,
});
export type Money = z.infer<typeof money>;

/** Money that a person may ask for or pay: nothing negative. */
export const amount = money.extend({
  minor: z
    .int('Whole pence only')
    .min(0, 'An amount cannot be negative')
    .max(100_000_000, 'The most we can handle is 1,000,000'),
});

export const gbp = (minor: number): Money => ({ minor, currency: 'GBP' });
export const zero = (of: Currency): Money => ({ minor: 0, currency: of });

/** @throws RangeError if the currencies differ or the sum leaves the whole numbers that are exact. */
export function add(...parts: readonly [Money, ...Money[]]): Money {
  const [first] = parts;
  const minor = parts.reduce((sum, part) => {
    if (part.currency !== first.currency) throw new RangeError('Money of two currencies cannot be added');
    return sum + part.minor;
  }, 0);
  if (!Number.isSafeInteger(minor)) throw new RangeError('The sum is too large');
  return { minor, currency: first.currency };
}

export const subtract = (from: Money, take: Money): Money => add(from, { ...take, minor: -take.minor });

/**
 * Splits an amount in proportion to whole-number weights; no penny is lost or made.
 *
 * Pennies left over go to the largest remainders, the earlier share first.
 * @throws RangeError if a weight is negative or not whole, or all are zero.
 */
export function splitMoney(total: Money, weights: readonly number[]): Money[] {
  const sum = weights.reduce((all, weight) => all + weight, 0);
  if (weights.some((weight) => !Number.isSafeInteger(weight) || weight < 0) || !(sum > 0)) {
    throw new RangeError('Weights must be whole, not negative, and not all zero');
  }
  const exact = weights.map((weight) => BigInt(total.minor) * BigInt(weight));
  const shares = exact.map((part) => floorDivide(part, BigInt(sum)));
  const remainders = exact.map((part, index) => part - (shares[index] ?? 0n) * BigInt(sum));
  const left = Number(BigInt(total.minor) - shares.reduce((all, share) => all + share, 0n));
  const order = remainders
    .map((remainder, index) => ({ remainder, index }))
    .toSorted((a, b) =>
      a.remainder === b.remainder ? a.index - b.index : a.remainder > b.remainder ? -1 : 1,
    )
    .slice(0, left);
  const extra = new Set(order.map((entry) => entry.index));
  return shares.map((share, index) => ({
    minor: Number(share) + (extra.has(index) ? 1 : 0),
    currency: total.currency,
  }));
}

/** A whole-number rate in hundredths of a per cent of an amount, rounded half up, once. */
export function shareOf(total: Money, basisPoints: number): Money {
  if (!Number.isSafeInteger(basisPoints) || basisPoints < 0)
    throw new RangeError('Basis points must be whole');
  return { minor: Math.floor((total.minor * basisPoints + 5_000) / 10_000), currency: total.currency };
}

const floorDivide = (a: bigint, b: bigint): bigint => (a >= 0n || a % b === 0n ? a / b : a / b - 1n);
