import type { Notices } from './notices.ts';
import { make, record } from './shapes.ts';
import type { Store, Thing } from './store.ts';

export type CardOutcome = 'pays' | 'declined' | 'no-funds' | 'authenticate' | 'pays-then-disputed';

/** The service's public test numbers that this stand-in knows; any other number that checks out pays. */
const special: Record<string, CardOutcome> = {
  '4000000000000002': 'declined',
  '4000000000009995': 'no-funds',
  '4000002500003155': 'authenticate',
  '4000000000003220': 'authenticate',
  '4000000000000259': 'pays-then-disputed',
};

export interface Card {
  number: string;
  expiry: string;
  cvc: string;
}

export type CardFaults = Partial<Record<keyof Card, string>>;

function passesCheckDigit(number: string): boolean {
  const sum = Array.from(number)
    .toReversed()
    .reduce((total, digit, index) => {
      const value = Number(digit) * (index % 2 === 1 ? 2 : 1);
      return total + (value > 9 ? value - 9 : value);
    }, 0);
  return sum % 10 === 0;
}

/** What is wrong with a card as typed; empty when nothing is. */
export function faultsOf(card: Card, today: Date): CardFaults {
  const faults: CardFaults = {};
  const number = card.number.replaceAll(/\s/g, '');
  if (!/^\d{13,19}$/.test(number) || !passesCheckDigit(number)) faults.number = 'That is not a card number.';
  const [, month, year] = /^\s*(\d{1,2})\s*\/\s*(\d{2})\s*$/.exec(card.expiry) ?? [];
  const lastDay = month && year ? new Date(Date.UTC(2000 + Number(year), Number(month), 1)) : undefined;
  if (!lastDay || Number(month) < 1 || Number(month) > 12)
    faults.expiry = 'Give the expiry as month and year, such as 08/31.';
  else if (lastDay <= today) faults.expiry = 'That card has expired.';
  if (!/^\d{3,4}$/.test(card.cvc.trim())) faults.cvc = 'The security code has three or four digits.';
  return faults;
}

export const outcomeOf = (number: string): CardOutcome => special[number.replaceAll(/\s/g, '')] ?? 'pays';

/** The session's intent, made at the first card offered, as the service does. */
function intentOf(store: Store, session: Thing): Thing {
  const existing = store.find('payment_intent', String(session['payment_intent']));
  if (existing) return existing;
  const { transfer_group: group, metadata } = session['fake'] as {
    transfer_group: string | null;
    metadata: object;
  };
  const intent = make(store, 'payment_intent', {
    amount: session['amount_total'],
    amount_received: 0,
    currency: session['currency'],
    transfer_group: group,
    metadata,
    status: 'requires_payment_method',
    latest_charge: null,
  });
  session['payment_intent'] = intent.id;
  return intent;
}

/** Marks the last attempt as refused. */
export function decline(store: Store, notices: Notices, session: Thing, code: string, message: string): void {
  const intent = intentOf(store, session);
  intent['last_payment_error'] = { type: 'card_error', code: 'card_declined', decline_code: code, message };
  notices.tell('payment_intent.payment_failed', intent);
}

/** Charges the card, completes the session and tells of it, in the order the service does. */
export function pay(store: Store, notices: Notices, session: Thing, outcome: CardOutcome): void {
  const intent = intentOf(store, session);
  const charge = make(store, 'charge', {
    amount: intent['amount'],
    amount_captured: intent['amount'],
    amount_refunded: 0,
    currency: intent['currency'],
    captured: true,
    paid: true,
    refunded: false,
    disputed: false,
    payment_intent: intent.id,
    transfer_group: intent['transfer_group'],
    metadata: intent['metadata'],
    status: 'succeeded',
  });
  charge['balance_transaction'] = record(
    store,
    'charge',
    charge.id,
    Number(charge['amount']),
    charge['currency'],
  ).id;
  Object.assign(intent, {
    status: 'succeeded',
    amount_received: intent['amount'],
    latest_charge: charge.id,
    last_payment_error: null,
  });
  Object.assign(session, { status: 'complete', payment_status: 'paid', url: null });
  notices.tell('charge.succeeded', charge);
  notices.tell('payment_intent.succeeded', intent);
  notices.tell('checkout.session.completed', session);
  if (outcome === 'pays-then-disputed') {
    charge['disputed'] = true;
    const dispute = make(store, 'dispute', {
      amount: charge['amount'],
      currency: charge['currency'],
      charge: charge.id,
      payment_intent: intent.id,
      reason: 'fraudulent',
      status: 'needs_response',
    });
    record(store, 'adjustment', dispute.id, -Number(charge['amount']), charge['currency']);
    notices.tell('charge.dispute.created', dispute);
  }
}
