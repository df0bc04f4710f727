import { Stripe } from 'stripe';
import { currency as currencySchema } from '#shared/money.ts';
import type { Money } from '#shared/money.ts';
import { Problem } from '#shared/problem.ts';

/** What happened at the payment service, in our words. */
export type Notice = { id: string } & (
  | { kind: 'checkout-paid' | 'checkout-lapsed'; checkoutId: string }
  | { kind: 'account-changed'; accountId: string; isReady: boolean }
  | { kind: 'charged-back'; paymentIntentId: string }
  | { kind: 'other'; type: string }
);

export interface Checkout {
  status: 'open' | 'paid' | 'lapsed';
  url: string | null;
  amount: Money;
  paymentIntentId: string | null;
  chargeId: string | null;
}

interface StartCheckout {
  /** Our own id: the same one never makes two. */
  key: string;
  orderId: string;
  title: string;
  amount: Money;
  email: string;
  successUrl: string;
  cancelUrl: string;
}

/** What we need of a card payment service. Every call that moves money takes a key and does its work once for it. */
export interface Payments {
  startCheckout: (order: StartCheckout) => Promise<{ checkoutId: string; url: string }>;
  getCheckout: (checkoutId: string) => Promise<Checkout>;
  /** Makes sure that nobody can pay it any more. @returns false if it has been paid. */
  closeCheckout: (checkoutId: string) => Promise<boolean>;
  refund: (refund: { key: string; paymentIntentId: string; amount: Money }) => Promise<{ refundId: string }>;
  transfer: (transfer: {
    key: string;
    amount: Money;
    accountId: string;
    orderId: string;
    chargeId: string;
  }) => Promise<{ transferId: string }>;
  createAccount: (account: { key: string; email: string }) => Promise<{ accountId: string }>;
  isAccountReady: (accountId: string) => Promise<boolean>;
  startAccountSetUp: (setUp: { accountId: string; returnUrl: string }) => Promise<{ url: string }>;
  /** Everything the service holds for us, available and on its way. */
  getBalance: (currency: Money['currency']) => Promise<Money>;
  /** @throws Problem bad-request if the signature is not the service's or is too old. */
  readNotice: (body: Buffer, signature: string) => Notice;
}

type Options = { secretKey: string; webhookSecret: string; url?: string };

const idOf = (value: string | { id: string } | null | undefined): string | null =>
  typeof value === 'string' ? value : (value?.id ?? null);

const moneyOf = (minor: number | null, code: string | null): Money => ({
  minor: minor ?? 0,
  currency: currencySchema.parse((code ?? '').toUpperCase()),
});

/** Runs a call of the service; whatever it throws becomes a problem in plain words, and its own text stays with us. */
async function asking<T>(call: () => Promise<T>): Promise<T> {
  try {
    return await call();
  } catch (error) {
    const code = error instanceof Stripe.errors.StripeError ? (error.code ?? error.type) : 'no answer';
    const problem = new Problem(
      'payment-service',
      'The payment service did not do what was asked. Nothing was lost; try again in a minute.',
    );
    problem.cause = new Error(code, { cause: error });
    throw problem;
  }
}

function connect({ secretKey, url }: Options): Stripe {
  if (!url) return new Stripe(secretKey, { maxNetworkRetries: 2 });
  const { hostname, port } = new URL(url);
  return new Stripe(secretKey, {
    host: hostname,
    port: Number(port),
    protocol: 'http',
    maxNetworkRetries: 1,
    telemetry: false,
  });
}

function noticeOf(event: Stripe.Event): Notice {
  const { id } = event;
  // The service tells of hundreds of things; these are the ones we act on.
  // oxlint-disable-next-line typescript/switch-exhaustiveness-check
  switch (event.type) {
    case 'checkout.session.completed':
    case 'checkout.session.async_payment_succeeded':
      return { id, kind: 'checkout-paid', checkoutId: event.data.object.id };
    case 'checkout.session.expired':
      return { id, kind: 'checkout-lapsed', checkoutId: event.data.object.id };
    case 'account.updated':
      return {
        id,
        kind: 'account-changed',
        accountId: event.data.object.id,
        isReady: event.data.object.payouts_enabled,
      };
    case 'charge.dispute.created':
      return { id, kind: 'charged-back', paymentIntentId: idOf(event.data.object.payment_intent) ?? '' };
    default:
      return { id, kind: 'other', type: event.type };
  }
}

/** The card payment service through its own SDK. With a `url` it speaks to a stand-in there. */
export function createPayments(options: Options): Payments {
  const stripe = connect(options);
  return {
    startCheckout: ({ key, orderId, title, amount, email, successUrl, cancelUrl }) =>
      asking(async () => {
        const session = await stripe.checkout.sessions.create(
          {
            mode: 'payment',
            client_reference_id: orderId,
            customer_email: email,
            success_url: successUrl,
            cancel_url: cancelUrl,
            line_items: [
              {
                quantity: 1,
                price_data: {
                  currency: amount.currency.toLowerCase(),
                  unit_amount: amount.minor,
                  product_data: { name: title },
                },
              },
            ],
            payment_intent_data: { transfer_group: orderId, metadata: { orderId } },
            metadata: { orderId },
          },
          { idempotencyKey: key },
        );
        return { checkoutId: session.id, url: session.url ?? '' };
      }),
    getCheckout: (checkoutId) =>
      asking(async () => {
        const session = await stripe.checkout.sessions.retrieve(checkoutId);
        const paymentIntentId = idOf(session.payment_intent);
        const isPaid = session.status === 'complete' && session.payment_status === 'paid';
        const intent =
          isPaid && paymentIntentId ? await stripe.paymentIntents.retrieve(paymentIntentId) : undefined;
        return {
          status: isPaid ? 'paid' : session.status === 'expired' ? 'lapsed' : 'open',
          url: session.url,
          amount: moneyOf(session.amount_total, session.currency),
          paymentIntentId,
          chargeId: idOf(intent?.latest_charge),
        };
      }),
    closeCheckout: (checkoutId) =>
      asking(async () => {
        const session = await stripe.checkout.sessions.retrieve(checkoutId);
        if (session.status === 'complete') return false;
        if (session.status === 'open') await stripe.checkout.sessions.expire(checkoutId);
        return true;
      }),
    refund: ({ key, paymentIntentId, amount }) =>
      asking(async () => {
        const refund = await stripe.refunds.create(
          { payment_intent: paymentIntentId, amount: amount.minor },
          { idempotencyKey: key },
        );
        return { refundId: refund.id };
      }),
    transfer: ({ key, amount, accountId, orderId, chargeId }) =>
      asking(async () => {
        const transfer = await stripe.transfers.create(
          {
            amount: amount.minor,
            currency: amount.currency.toLowerCase(),
            destination: accountId,
            transfer_group: orderId,
            source_transaction: chargeId,
          },
          { idempotencyKey: key },
        );
        return { transferId: transfer.id };
      }),
    createAccount: ({ key, email }) =>
      asking(async () => {
        const account = await stripe.accounts.create(
          { type: 'express', country: 'GB', email, capabilities: { transfers: { requested: true } } },
          { idempotencyKey: key },
        );
        return { accountId: account.id };
      }),
    isAccountReady: (accountId) =>
      asking(async () => (await stripe.accounts.retrieve(accountId)).payouts_enabled),
    startAccountSetUp: ({ accountId, returnUrl }) =>
      asking(async () => {
        const link = await stripe.accountLinks.create({
          account: accountId,
          type: 'account_onboarding',
          return_url: returnUrl,
          refresh_url: returnUrl,
        });
        return { url: link.url };
      }),
    getBalance: (currency) =>
      asking(async () => {
        const balance = await stripe.balance.retrieve();
        const minor = [...balance.available, ...balance.pending]
          .filter((part) => part.currency === currency.toLowerCase())
          .reduce((sum, part) => sum + part.amount, 0);
        return { minor, currency };
      }),
    readNotice: (body, signature) => {
      try {
        return noticeOf(stripe.webhooks.constructEvent(body, signature, options.webhookSecret));
      } catch {
        throw new Problem('bad-request', 'The signature of this notice is not right.');
      }
    },
  };
}
