import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { gbp } from '#shared/money.ts';
import {
  imbalanceMinor,
  postEarned,
  postPaid,
  postRefunded,
  postTransferred,
} from '#shared/payments/ledger.ts';
import type { Posting } from '#shared/payments/ledger.ts';

const part = fc.integer({ min: 1, max: 1_000_000 }).map(gbp);
const total = (a: { minor: number }, b: { minor: number }) => gbp(a.minor + b.minor);

/** Balances after postings of which each key counts once, as the database sees to. */
function balancesAfter(postings: readonly Posting[]): Map<string, number> {
  const balances = new Map<string, number>();
  const once = new Map(postings.map((posting) => [posting.key, posting]));
  for (const { account, amount } of [...once.values()].flatMap(({ lines }) => lines))
    balances.set(account, (balances.get(account) ?? 0) + amount.minor);
  return balances;
}

describe('postings', () => {
  test('each adds up to nothing', () => {
    fc.assert(
      fc.property(part, part, (fee, charge) => {
        const all = [
          postPaid('o', total(fee, charge)),
          postEarned('o', 's', fee, charge),
          postTransferred('o', 's', fee),
          postRefunded('o', total(fee, charge)),
        ];
        expect(all.map(({ lines }) => imbalanceMinor(lines))).toEqual([0, 0, 0, 0]);
        expect(new Set(all.map(({ key }) => key)).size).toBe(all.length);
      }),
    );
  });

  test('an order that is settled leaves our charge and nothing else, however often each step is told', () => {
    fc.assert(
      fc.property(part, part, fc.integer({ min: 1, max: 3 }), (fee, charge, times) => {
        const steps = [
          postPaid('o', total(fee, charge)),
          postEarned('o', 's', fee, charge),
          postTransferred('o', 's', fee),
        ];
        const balances = balancesAfter(Array.from({ length: times }, () => steps).flat());
        expect(Object.fromEntries(balances)).toEqual({
          'held:o': 0,
          'surveyor:s': 0,
          processor: charge.minor,
          'platform-charge': -charge.minor,
        });
      }),
    );
  });

  test('an order that is refunded leaves nothing', () => {
    fc.assert(
      fc.property(part, part, (fee, charge) => {
        const sum = total(fee, charge);
        const balances = balancesAfter([postPaid('o', sum), postRefunded('o', sum)]);
        expect([...balances.values()].every((balance) => balance === 0)).toBe(true);
      }),
    );
  });
});
