import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Stripe } from 'stripe';
import { afterAll, beforeAll, describe, expect, test, vi } from 'vitest';
import { startStripeFake } from '#api/fakes/stripe/index.ts';
import type { StripeFake } from '#api/fakes/stripe/index.ts';
import { createPayments } from '#api/services/payments/index.ts';
import { Problem } from '#shared/problem.ts';
import { silentLog } from '#tests/support/log.ts';
import { cards, payByCard } from '#tests/support/orders.ts';

/** One suite through the SDK against the stand-in. What only a person at the card page can do is done by its form. */
const secret = 'whsec_hosted_suite';
const folder = mkdtempSync(path.join(tmpdir(), 'tubeplate-hosted-'));
const received: { body: Buffer; signature: string }[] = [];
const inbox = createServer((request, response) => {
  const parts: Buffer[] = [];
  request.on('data', (part: Buffer) => parts.push(part));
  request.on('end', () => {
    received.push({ body: Buffer.concat(parts), signature: String(request.headers['stripe-signature']) });
    response.end('{}');
  });
});
let bank: StripeFake;
let stripe: Stripe;

const start = () =>
  startStripeFake({
    port: 0,
    host: '127.0.0.1',
    dataDir: folder,
    webhookUrl: `http://127.0.0.1:${String((inbox.address() as AddressInfo).port)}/`,
    webhookSecret: secret,
    log: silentLog,
  });
const connect = ({ url, apiKey }: StripeFake): Stripe => {
  const { hostname, port } = new URL(url);
  return new Stripe(apiKey, {
    host: hostname,
    port: Number(port),
    protocol: 'http',
    maxNetworkRetries: 0,
    telemetry: false,
  });
};

beforeAll(async () => {
  await new Promise<void>((resolve) => {
    inbox.listen(0, '127.0.0.1', resolve);
  });
  bank = await start();
  stripe = connect(bank);
});
afterAll(async () => {
  await bank.close();
  await new Promise((resolve) => {
    inbox.close(resolve);
    inbox.closeAllConnections();
  });
  rmSync(folder, { recursive: true, force: true });
});

const newSession = (key?: string, amount = 12_345) =>
  stripe.checkout.sessions.create(
    {
      mode: 'payment',
      success_url: 'http://localhost/ok',
      cancel_url: 'http://localhost/no',
      client_reference_id: 'order-1',
      line_items: [
        {
          quantity: 1,
          price_data: { currency: 'gbp', unit_amount: amount, product_data: { name: 'A survey' } },
        },
      ],
      payment_intent_data: { transfer_group: 'order-1', metadata: { orderId: 'order-1' } },
    },
    key ? { idempotencyKey: key } : {},
  );

async function paidCharge(amount?: number): Promise<{ intent: string; charge: string }> {
  const session = await newSession(undefined, amount);
  expect(await payByCard(session.url!)).toBe(303);
  const paid = await stripe.checkout.sessions.retrieve(session.id);
  const intent = await stripe.paymentIntents.retrieve(paid.payment_intent as string);
  return { intent: intent.id, charge: intent.latest_charge as string };
}

const codeOf = async (work: Promise<unknown>): Promise<string | undefined> =>
  work.then(
    () => undefined,
    (error: unknown) =>
      error instanceof Stripe.errors.StripeError ? (error.code ?? error.rawType) : String(error),
  );

describe('the shapes of its answers', () => {
  // The service's own published example objects (stripe/openapi fixtures3, MIT).
  const examples = JSON.parse(
    readFileSync(path.join(import.meta.dirname, 'data/payment-objects.json'), 'utf8'),
  ) as {
    resources: Record<string, Record<string, unknown>>;
  };
  const missing = (kind: string, answer: object): string[] =>
    Object.keys(examples.resources[kind]!).filter((field) => !Object.hasOwn(answer, field));

  test('carry every field of the published examples', async () => {
    const session = await newSession();
    const { intent, charge } = await paidCharge();
    const account = await stripe.accounts.create({ type: 'express', email: 'a@example.test' });
    const transfer = await stripe.transfers.create({
      amount: 100,
      currency: 'gbp',
      destination: account.id,
      source_transaction: charge,
    });
    const [event] = (await stripe.events.list({ limit: 1 })).data;
    const found = {
      'checkout.session': missing('checkout.session', session),
      payment_intent: missing('payment_intent', await stripe.paymentIntents.retrieve(intent)),
      charge: missing('charge', await stripe.charges.retrieve(charge)),
      account: missing('account', account),
      account_link: missing(
        'account_link',
        await stripe.accountLinks.create({
          account: account.id,
          type: 'account_onboarding',
          return_url: 'http://a',
          refresh_url: 'http://b',
        }),
      ),
      transfer: missing('transfer', transfer),
      transfer_reversal: missing(
        'transfer_reversal',
        await stripe.transfers.createReversal(transfer.id, { amount: 40 }),
      ),
      refund: missing('refund', await stripe.refunds.create({ payment_intent: intent, amount: 5 })),
      balance: missing('balance', await stripe.balance.retrieve()),
      event: missing('event', event!),
    };
    expect(found).toEqual(Object.fromEntries(Object.keys(found).map((kind) => [kind, []])));
  });
});

describe('cards', () => {
  test('one that is declined leaves the session open, and another pays it', async () => {
    const session = await newSession();
    expect(await payByCard(session.url!, cards.declined)).toBe(402);
    expect((await stripe.checkout.sessions.retrieve(session.id)).status).toBe('open');
    expect(await payByCard(session.url!)).toBe(303);
    expect((await stripe.checkout.sessions.retrieve(session.id)).payment_status).toBe('paid');
    expect(await payByCard(session.url!)).toBe(404);
  });

  test('one with a wrong check digit, or out of date, is refused beside its field', async () => {
    const session = await newSession();
    const send = (fields: Record<string, string>) =>
      fetch(session.url!, { method: 'POST', body: new URLSearchParams(fields) });
    const wrong = await send({ number: '4242424242424241', expiry: '01/20', cvc: '1' });
    const page = await wrong.text();
    expect(wrong.status).toBe(422);
    expect(page).toContain('That is not a card number.');
    expect(page).toContain('That card has expired.');
    expect(page).toContain('three or four digits');
  });

  test('one that needs authentication is paid when it is given', async () => {
    const session = await newSession();
    expect(await payByCard(session.url!, '4000002500003155')).toBe(200);
    const given = await fetch(`${session.url!}/authorise`, {
      method: 'POST',
      redirect: 'manual',
      body: new URLSearchParams({ answer: 'authorise' }),
    });
    expect(given.status).toBe(303);
    expect((await stripe.checkout.sessions.retrieve(session.id)).status).toBe('complete');
  });
});

describe('doing a thing once', () => {
  test('the same key gives the same answer, another body under it is refused', async () => {
    const first = await newSession('key-1');
    const again = await newSession('key-1');
    expect(again.id).toBe(first.id);
    expect(await codeOf(newSession('key-1', 999))).toBe('idempotency_error');
  });

  test('a charge is not refunded beyond what was paid', async () => {
    const { intent, charge } = await paidCharge(1_000);
    await stripe.refunds.create({ payment_intent: intent, amount: 400 });
    expect(await codeOf(stripe.refunds.create({ payment_intent: intent, amount: 601 }))).toBe(
      'invalid_request_error',
    );
    await stripe.refunds.create({ payment_intent: intent });
    expect(await codeOf(stripe.refunds.create({ payment_intent: intent }))).toBe('charge_already_refunded');
    expect((await stripe.charges.retrieve(charge)).amount_refunded).toBe(1_000);
  });

  test('no more is transferred out of a charge than it brought in, and a reversal brings it back', async () => {
    const { charge } = await paidCharge(1_000);
    const { id: destination } = await stripe.accounts.create({ type: 'express' });
    const before = (await stripe.balance.retrieve()).available[0]!.amount;
    const sent = await stripe.transfers.create({
      amount: 900,
      currency: 'gbp',
      destination,
      source_transaction: charge,
    });
    expect(
      await codeOf(
        stripe.transfers.create({ amount: 101, currency: 'gbp', destination, source_transaction: charge }),
      ),
    ).toBe('invalid_request_error');
    await stripe.transfers.createReversal(sent.id, { amount: 300 });
    expect((await stripe.balance.retrieve()).available[0]!.amount).toBe(before - 600);
    expect(await codeOf(stripe.transfers.create({ amount: 90_000_000, currency: 'gbp', destination }))).toBe(
      'balance_insufficient',
    );
  });

  test.each([
    ['0', 0],
    ['a fraction', 1.5],
    ['below nothing', -5],
  ])('an amount of %s is refused', async (_what, amount) => {
    expect(await codeOf(newSession(undefined, amount))).toBe('parameter_invalid_integer');
  });
});

test('lists come in pages that neither skip nor repeat', async () => {
  const ids: string[] = [];
  for await (const event of stripe.events.list({ limit: 3 })) ids.push(event.id);
  expect(ids.length).toBeGreaterThan(6);
  expect(new Set(ids).size).toBe(ids.length);
});

test('an unknown key and an unknown object are refused in the service’s shape', async () => {
  const { hostname, port } = new URL(bank.url);
  const stranger = new Stripe('sk_test_wrong', {
    host: hostname,
    port: Number(port),
    protocol: 'http',
    maxNetworkRetries: 0,
  });
  await expect(stranger.balance.retrieve()).rejects.toMatchObject({ statusCode: 401 });
  expect(await codeOf(stripe.transfers.retrieve('tr_none'))).toBe('resource_missing');
});

describe('notices', () => {
  const reader = () => createPayments({ secretKey: bank.apiKey, webhookSecret: secret, url: bank.url });

  test('are signed; a changed body, a wrong secret and an old time are refused', async () => {
    await paidCharge();
    await vi.waitFor(() => {
      expect(received.some(({ body }) => body.includes('checkout.session.completed'))).toBe(true);
    });
    const { body, signature } = received.findLast((one) => one.body.includes('checkout.session.completed'))!;
    expect(reader().readNotice(body, signature).kind).toBe('checkout-paid');
    expect(() => reader().readNotice(Buffer.from(body.toString().replace('gbp', 'usd')), signature)).toThrow(
      Problem,
    );
    const payload = body.toString();
    const forged = Stripe.webhooks.generateTestHeaderString({ payload, secret: 'whsec_other' });
    expect(() => reader().readNotice(body, forged)).toThrow(Problem);
    const timestamp = Math.floor(Date.now() / 1000) - 3_600;
    const old = Stripe.webhooks.generateTestHeaderString({ payload, secret, timestamp });
    expect(() => reader().readNotice(body, old)).toThrow(Problem);
  });

  test('can be held back, released in reverse, and sent again', async () => {
    const desk = (what: string) =>
      fetch(`${bank.url}/control/${what}`, { method: 'POST', redirect: 'manual' });
    await desk('mode/hold');
    const before = received.length;
    await paidCharge();
    expect(received).toHaveLength(before);
    await desk('release-reversed');
    const kinds = received
      .slice(before)
      .map(({ body }) => (JSON.parse(body.toString()) as { type: string }).type);
    expect(kinds).toEqual(['checkout.session.completed', 'payment_intent.succeeded', 'charge.succeeded']);
    const { id } = JSON.parse(received.at(-1)!.body.toString()) as { id: string };
    await desk(`repeat/${id}`);
    expect((JSON.parse(received.at(-1)!.body.toString()) as { id: string }).id).toBe(id);
    expect(received).toHaveLength(before + 4);
    await desk('mode/send');
  });
});

test('what it knows outlives it', async () => {
  const { charge } = await paidCharge(777);
  const balance = (await stripe.balance.retrieve()).available[0]!.amount;
  await bank.close();
  bank = await start();
  stripe = connect(bank);
  expect((await stripe.charges.retrieve(charge)).amount).toBe(777);
  expect((await stripe.balance.retrieve()).available[0]!.amount).toBe(balance);
});
