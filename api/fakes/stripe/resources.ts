import { Router } from 'express';
import type { Request } from 'express';
import { balanceOf, make, plain, record } from './shapes.ts';
import { invalid, missing, poor } from './errors.ts';
import type { Notices } from './notices.ts';
import { child, metadataOf, needAmount, needText, text } from './read.ts';
import type { Body } from './read.ts';
import { nowSeconds } from './store.ts';
import type { Store, Thing } from './store.ts';

interface Parts {
  store: Store;
  notices: Notices;
  /** Address of the stand-in's own pages. */
  pagesUrl: () => string;
}

const bodyOf = (request: Request): Body => (request.body ?? {}) as Body;

function need(store: Store, object: string, id: unknown): Thing {
  const found = store.find(object, String(id));
  if (!found) throw missing(object.replace('.', ' '), String(id));
  return found;
}

function listPage(store: Store, object: string, query: Request['query'], url: string): object {
  const limit = Math.min(100, Math.max(1, Number(query['limit'] ?? 10)));
  const filters = ['payment_intent', 'charge', 'transfer_group', 'destination', 'status', 'type'];
  const created = (query['created'] ?? {}) as Record<string, string>;
  const all = store
    .list(object)
    .filter((thing) => filters.every((name) => query[name] === undefined || thing[name] === query[name]))
    .filter((thing) => created['gte'] === undefined || thing.created >= Number(created['gte']));
  const after =
    typeof query['starting_after'] === 'string'
      ? all.findIndex((thing) => thing.id === query['starting_after'])
      : -1;
  if (typeof query['starting_after'] === 'string' && after < 0)
    throw missing(object, query['starting_after']);
  const data = all.slice(after + 1, after + 1 + limit);
  return { object: 'list', url, has_more: after + 1 + limit < all.length, data };
}

function checkoutSessions({ store, notices, pagesUrl }: Parts): Router {
  const router = Router();
  router.post('/v1/checkout/sessions', (request, response) => {
    const body = bodyOf(request);
    const items = Object.values(child(body, 'line_items')) as Body[];
    const [item] = items;
    if (!item) throw invalid('Missing required param: line_items.', 'line_items', 'parameter_missing');
    const price = child(item, 'price_data');
    const amount =
      needAmount(price['unit_amount'], 'line_items[0][price_data][unit_amount]') *
      Number(item['quantity'] ?? 1);
    const currency = needText(price, 'currency');
    const intentData = child(body, 'payment_intent_data');
    const expiresAt = body['expires_at'] === undefined ? nowSeconds() + 86_400 : Number(body['expires_at']);
    const session = make(store, 'checkout.session', {
      mode: needText(body, 'mode'),
      amount_subtotal: amount,
      amount_total: amount,
      currency,
      client_reference_id: text(body, 'client_reference_id'),
      customer_email: text(body, 'customer_email'),
      success_url: needText(body, 'success_url'),
      cancel_url: text(body, 'cancel_url'),
      metadata: metadataOf(body),
      expires_at: expiresAt,
      status: 'open',
      payment_status: 'unpaid',
      payment_intent: null,
    });
    session['url'] = `${pagesUrl()}/pay/${session.id}`;
    // What the buyer reads on the card page, and what the intent will carry once a card is given.
    session['fake'] = {
      title: text(child(price, 'product_data'), 'name') ?? 'Payment',
      transfer_group: text(intentData, 'transfer_group'),
      metadata: metadataOf(intentData),
    };
    response.json(session);
  });
  router.get('/v1/checkout/sessions', (request, response) => {
    response.json(listPage(store, 'checkout.session', request.query, '/v1/checkout/sessions'));
  });
  router.get('/v1/checkout/sessions/:id', (request, response) => {
    response.json(need(store, 'checkout.session', request.params.id));
  });
  router.post('/v1/checkout/sessions/:id/expire', (request, response) => {
    const session = need(store, 'checkout.session', request.params.id);
    if (session['status'] !== 'open') {
      throw invalid(
        `Only Checkout Sessions with a status in ["open"] can be expired. This Checkout Session has a status of \`${String(session['status'])}\`.`,
      );
    }
    Object.assign(session, { status: 'expired', url: null });
    notices.tell('checkout.session.expired', session);
    response.json(session);
  });
  return router;
}

function refunds({ store, notices }: Parts): Router {
  const router = Router();
  router.post('/v1/refunds', (request, response) => {
    const body = bodyOf(request);
    const charge = body['charge']
      ? need(store, 'charge', body['charge'])
      : need(
          store,
          'charge',
          need(store, 'payment_intent', needText(body, 'payment_intent'))['latest_charge'],
        );
    const left = Number(charge['amount']) - Number(charge['amount_refunded']);
    const amount = body['amount'] === undefined ? left : needAmount(body['amount'], 'amount');
    if (left === 0)
      throw invalid(`Charge ${charge.id} has already been refunded.`, undefined, 'charge_already_refunded');
    if (amount > left) {
      throw invalid(
        `Refund amount (${String(amount)}) is greater than unrefunded amount on charge (${String(left)})`,
        'amount',
      );
    }
    if (balanceOf(store, charge['currency']) < amount) throw poor();
    const refund = make(store, 'refund', {
      amount,
      currency: charge['currency'],
      charge: charge.id,
      payment_intent: charge['payment_intent'],
      reason: text(body, 'reason'),
      metadata: metadataOf(body),
      status: 'succeeded',
    });
    refund['balance_transaction'] = record(store, 'refund', refund.id, -amount, charge['currency']).id;
    charge['amount_refunded'] = Number(charge['amount_refunded']) + amount;
    charge['refunded'] = charge['amount_refunded'] === charge['amount'];
    notices.tell('charge.refunded', charge);
    notices.tell('refund.updated', refund);
    response.json(refund);
  });
  return router;
}

function transfers({ store, notices }: Parts): Router {
  const router = Router();
  router.post('/v1/transfers', (request, response) => {
    const body = bodyOf(request);
    const amount = needAmount(body['amount'], 'amount');
    const currency = needText(body, 'currency');
    const account = need(store, 'account', needText(body, 'destination'));
    const source = text(body, 'source_transaction');
    if (source !== null) {
      const charge = need(store, 'charge', source);
      const sent = store
        .list('transfer')
        .filter((transfer) => transfer['source_transaction'] === source)
        .reduce((sum, transfer) => sum + Number(transfer['amount']) - Number(transfer['amount_reversed']), 0);
      if (sent + amount > Number(charge['amount'])) {
        throw invalid(
          'Transfers using this transaction as a source must not exceed the source amount.',
          'amount',
        );
      }
    }
    if (balanceOf(store, currency) < amount) throw poor();
    const transfer = make(store, 'transfer', {
      amount,
      amount_reversed: 0,
      currency,
      destination: account.id,
      destination_payment: store.newId('py'),
      source_transaction: source,
      transfer_group: text(body, 'transfer_group'),
      description: text(body, 'description'),
      metadata: metadataOf(body),
      reversed: false,
    });
    transfer['reversals'] = {
      object: 'list',
      data: [],
      has_more: false,
      url: `/v1/transfers/${transfer.id}/reversals`,
    };
    transfer['balance_transaction'] = record(store, 'transfer', transfer.id, -amount, currency).id;
    notices.tell('transfer.created', transfer);
    response.json(transfer);
  });
  router.post('/v1/transfers/:id/reversals', (request, response) => {
    const transfer = need(store, 'transfer', request.params.id);
    const left = Number(transfer['amount']) - Number(transfer['amount_reversed']);
    const body = bodyOf(request);
    const amount = body['amount'] === undefined ? left : needAmount(body['amount'], 'amount');
    if (left === 0) throw invalid(`Transfer ${transfer.id} has already been fully reversed.`);
    if (amount > left)
      throw invalid(
        `Reversal amount is greater than unreversed amount on transfer (${String(left)})`,
        'amount',
      );
    const reversal = make(store, 'transfer_reversal', {
      amount,
      currency: transfer['currency'],
      transfer: transfer.id,
      metadata: metadataOf(body),
    });
    reversal['balance_transaction'] = record(
      store,
      'transfer_refund',
      reversal.id,
      amount,
      transfer['currency'],
    ).id;
    transfer['amount_reversed'] = Number(transfer['amount_reversed']) + amount;
    transfer['reversed'] = transfer['amount_reversed'] === transfer['amount'];
    notices.tell('transfer.reversed', transfer);
    response.json(reversal);
  });
  return router;
}

function accounts({ store, pagesUrl }: Parts): Router {
  const router = Router();
  router.post('/v1/accounts', (request, response) => {
    const body = bodyOf(request);
    response.json(
      make(store, 'account', {
        type: text(body, 'type') ?? 'express',
        country: text(body, 'country') ?? 'GB',
        default_currency: 'gbp',
        email: text(body, 'email'),
        metadata: metadataOf(body),
        charges_enabled: false,
        payouts_enabled: false,
        details_submitted: false,
      }),
    );
  });
  router.post('/v1/account_links', (request, response) => {
    const body = bodyOf(request);
    const account = need(store, 'account', needText(body, 'account'));
    account['fake_return_url'] = needText(body, 'return_url');
    response.json({
      ...plain('account_link'),
      object: 'account_link',
      created: nowSeconds(),
      expires_at: nowSeconds() + 300,
      url: `${pagesUrl()}/set-up/${account.id}`,
    });
  });
  return router;
}

function readOnly({ store }: Parts): Router {
  const router = Router();
  const kinds = {
    payment_intents: 'payment_intent',
    charges: 'charge',
    refunds: 'refund',
    transfers: 'transfer',
    accounts: 'account',
    events: 'event',
    balance_transactions: 'balance_transaction',
    disputes: 'dispute',
  };
  for (const [path, object] of Object.entries(kinds)) {
    router.get(`/v1/${path}`, (request, response) => {
      response.json(listPage(store, object, request.query, `/v1/${path}`));
    });
    router.get(`/v1/${path}/:id`, (request, response) => {
      response.json(need(store, object, request.params.id));
    });
  }
  router.get('/v1/balance', (_request, response) => {
    const currencies = [
      ...new Set(store.list('balance_transaction').map((entry) => String(entry['currency']))),
    ];
    const available = currencies.map((currency) => ({
      amount: balanceOf(store, currency),
      currency,
      source_types: { card: balanceOf(store, currency) },
    }));
    const nothing = [{ amount: 0, currency: 'gbp', source_types: { card: 0 } }];
    response.json({
      ...plain('balance'),
      object: 'balance',
      livemode: false,
      available: available.length > 0 ? available : nothing,
      pending: nothing,
    });
  });
  return router;
}

/** The operations of the service that the product calls. */
export function resources(parts: Parts): Router {
  const router = Router();
  router.use(checkoutSessions(parts), refunds(parts), transfers(parts), accounts(parts), readOnly(parts));
  return router;
}
