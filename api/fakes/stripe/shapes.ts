import { createRequire } from 'node:module';
import type { Store, Thing } from './store.ts';
import { nowSeconds } from './store.ts';

/** Every field of the service's published example objects, emptied. */
const shapes = createRequire(import.meta.url)('./shapes.json') as Record<string, Record<string, unknown>>;

const prefixes: Record<string, string> = {
  account: 'acct',
  balance_transaction: 'txn',
  charge: 'ch',
  'checkout.session': 'cs_test',
  dispute: 'dp',
  event: 'evt',
  payment_intent: 'pi',
  refund: 're',
  transfer: 'tr',
  transfer_reversal: 'trr',
};

/** A new object of a kind with all its fields, those given filled in, and stored. */
export function make(store: Store, object: string, fields: Record<string, unknown>): Thing {
  const id = store.newId(prefixes[object] ?? 'obj');
  return store.put({
    ...structuredClone(shapes[object]),
    object,
    id,
    created: nowSeconds(),
    livemode: false,
    ...fields,
  });
}

/** The shape of something that has no id of its own. */
export const plain = (object: string): Record<string, unknown> => structuredClone(shapes[object] ?? {});

/** What an object adds to or takes from our balance with the service. */
export function record(store: Store, type: string, source: string, amount: number, currency: unknown): Thing {
  return make(store, 'balance_transaction', {
    amount,
    net: amount,
    fee: 0,
    fee_details: [],
    currency,
    source,
    type,
    reporting_category: type,
    status: 'available',
    available_on: nowSeconds(),
  });
}

/** Our balance in a currency, minor units. */
export const balanceOf = (store: Store, currency: unknown): number =>
  store
    .list('balance_transaction')
    .filter((entry) => entry['currency'] === currency)
    .reduce((sum, entry) => sum + Number(entry['net']), 0);
