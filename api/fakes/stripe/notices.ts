import { Stripe } from 'stripe';
import type { Log } from '../../ctx.ts';
import { plain } from './shapes.ts';
import { nowSeconds } from './store.ts';
import type { Delivery, Store, Thing } from './store.ts';

const retryAfterMs = [500, 2_000, 5_000, 15_000, 60_000, 300_000];

interface Options {
  store: Store;
  url: string;
  secret: string;
  log: Log;
}

/** Sends signed notices of what happened, again until they are taken, unless told to hold or drop them. */
export class Notices {
  readonly #options: Options;
  #timer: NodeJS.Timeout | undefined;
  #sending: Promise<void> = Promise.resolve();
  #isClosed = false;

  constructor(options: Options) {
    this.#options = options;
    this.#plan();
  }

  /** Records that something happened to an object and queues the notice. */
  tell(type: string, object: Thing): void {
    const { store } = this.#options;
    const event = store.put({
      ...plain('event'),
      object: 'event',
      id: store.newId('evt'),
      created: nowSeconds(),
      livemode: false,
      type,
      api_version: Stripe.API_VERSION,
      data: { object: structuredClone(object) },
      pending_webhooks: 1,
      request: { id: null, idempotency_key: null },
    });
    const states = { send: 'waiting', hold: 'held', drop: 'dropped' } as const;
    store.state.deliveries.push({
      eventId: event.id,
      attempts: 0,
      state: states[store.state.mode],
      notBefore: 0,
    });
    this.#plan();
  }

  /** Sends what is held, in order or in reverse; answers when each has been tried. */
  async release(isReversed = false): Promise<void> {
    const { deliveries } = this.#options.store.state;
    const held = deliveries.filter((delivery) => delivery.state === 'held');
    for (const delivery of isReversed ? held.toReversed() : held) await this.#deliver(delivery);
    this.#options.store.save();
  }

  /** Sends one notice again, whatever became of it before. */
  async repeat(eventId: string): Promise<void> {
    const found = this.#options.store.state.deliveries.find((delivery) => delivery.eventId === eventId);
    if (found) await this.#deliver(found);
    this.#options.store.save();
  }

  async close(): Promise<void> {
    this.#isClosed = true;
    clearTimeout(this.#timer);
    await this.#sending;
  }

  #plan(): void {
    if (this.#isClosed) return;
    clearTimeout(this.#timer);
    const waiting = this.#options.store.state.deliveries.filter((delivery) => delivery.state === 'waiting');
    if (waiting.length === 0) return;
    const next = Math.max(0, Math.min(...waiting.map((delivery) => delivery.notBefore)) - Date.now());
    this.#timer = setTimeout(() => {
      this.#sending = this.#sendDue().finally(() => {
        this.#plan();
      });
    }, next);
    this.#timer.unref();
  }

  async #sendDue(): Promise<void> {
    const { store } = this.#options;
    const due = store.state.deliveries.filter(
      (delivery) => delivery.state === 'waiting' && delivery.notBefore <= Date.now(),
    );
    for (const delivery of due) {
      if (this.#isClosed) return;
      await this.#deliver(delivery);
    }
    store.save();
  }

  async #deliver(delivery: Delivery): Promise<void> {
    const { store, url, secret, log } = this.#options;
    const payload = JSON.stringify(store.state.things[delivery.eventId]);
    const signature = Stripe.webhooks.generateTestHeaderString({ payload, secret });
    delivery.attempts += 1;
    try {
      const answer = await fetch(url, {
        method: 'POST',
        headers: { 'Content-Type': 'application/json', 'Stripe-Signature': signature },
        body: payload,
        signal: AbortSignal.timeout(10_000),
      });
      if (answer.ok) {
        delivery.state = 'delivered';
        return;
      }
      log.debug({ status: answer.status }, 'notice not taken');
    } catch {
      log.debug({ attempts: delivery.attempts }, 'notice not delivered');
    }
    const wait = retryAfterMs[delivery.attempts - 1];
    if (wait === undefined) delivery.state = 'dropped';
    else {
      delivery.state = 'waiting';
      delivery.notBefore = Date.now() + wait;
    }
  }
}
