import type { Money } from '../money.ts';

/**
 * The ledger's accounts. Debits are positive, credits negative; every posting adds up to nothing.
 *
 * `processor` is what the card processor holds for us; `held:<order>` is what we owe on an order until it is settled;
 * `surveyor:<user>` is what a surveyor has earned and not yet been sent; `platform-charge` is what Tubeplate has earned.
 */
export type LedgerAccount = 'processor' | 'platform-charge' | `held:${string}` | `surveyor:${string}`;

export interface LedgerLine {
  account: LedgerAccount;
  /** Positive is a debit. */
  amount: Money;
}

export interface Posting {
  /** Unique: the same step cannot be entered twice. */
  key: string;
  what: string;
  orderId: string;
  lines: readonly LedgerLine[];
}

const minus = ({ minor, currency }: Money): Money => ({ minor: -minor, currency });
const move = (from: LedgerAccount, to: LedgerAccount, amount: Money): LedgerLine[] => [
  { account: to, amount },
  { account: from, amount: minus(amount) },
];

/** The buyer's card was charged: the processor holds it, we owe it on the order. */
export const postPaid = (orderId: string, total: Money): Posting => ({
  key: `paid:${orderId}`,
  what: 'Paid by the buyer and held',
  orderId,
  lines: move(`held:${orderId}`, 'processor', total),
});

/** The review is over: what was held is the surveyor's fee and our charge. */
export const postEarned = (
  orderId: string,
  surveyorId: string,
  surveyorPart: Money,
  platformPart: Money,
): Posting => ({
  key: `earned:${orderId}`,
  what: 'Fee earned by the surveyor, charge by Tubeplate',
  orderId,
  lines: [
    {
      account: `held:${orderId}`,
      amount: { ...surveyorPart, minor: surveyorPart.minor + platformPart.minor },
    },
    { account: `surveyor:${surveyorId}`, amount: minus(surveyorPart) },
    { account: 'platform-charge', amount: minus(platformPart) },
  ],
});

/** The transfer to the surveyor's own account went through. */
export const postTransferred = (orderId: string, surveyorId: string, surveyorPart: Money): Posting => ({
  key: `transferred:${orderId}`,
  what: 'Fee sent to the surveyor',
  orderId,
  lines: move('processor', `surveyor:${surveyorId}`, surveyorPart),
});

/** The whole sum went back to the buyer's card. */
export const postRefunded = (orderId: string, total: Money): Posting => ({
  key: `refunded:${orderId}`,
  what: 'Returned to the buyer',
  orderId,
  lines: move('processor', `held:${orderId}`, total),
});

/** What a posting adds up to: zero, or it is wrong. */
export const imbalanceMinor = (lines: readonly LedgerLine[]): number =>
  lines.reduce((sum, line) => sum + line.amount.minor, 0);
