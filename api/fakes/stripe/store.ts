import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';

export type Metadata = Record<string, string>;
export type Thing = Record<string, unknown> & { id: string; object: string; created: number };

export interface Delivery {
  eventId: string;
  attempts: number;
  state: 'waiting' | 'held' | 'delivered' | 'dropped';
  /** Epoch ms before which it is not tried again. */
  notBefore: number;
}

interface Answered {
  fingerprint: string;
  status: number;
  body: unknown;
}

interface State {
  things: Record<string, Thing>;
  answered: Record<string, Answered>;
  deliveries: Delivery[];
  mode: 'send' | 'hold' | 'drop';
  secretKey: string;
}

const letters = 'abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789';
const token = (length: number): string =>
  [...randomBytes(length)].map((byte) => letters[byte % letters.length]).join('');

export const nowSeconds = (): number => Math.floor(Date.now() / 1000);

/** What the stand-in knows, kept in one file that is written whole and renamed, so that a kill leaves the old or the new. */
export class Store {
  readonly #file: string;
  readonly state: State;

  constructor(dataDir: string) {
    mkdirSync(dataDir, { recursive: true, mode: 0o700 });
    this.#file = path.join(dataDir, 'state.json');
    this.state = existsSync(this.#file)
      ? (JSON.parse(readFileSync(this.#file, 'utf8')) as State)
      : { things: {}, answered: {}, deliveries: [], mode: 'send', secretKey: `sk_test_${token(24)}` };
    this.save();
  }

  save(): void {
    const next = `${this.#file}.next`;
    writeFileSync(next, JSON.stringify(this.state), { mode: 0o600 });
    renameSync(next, this.#file);
  }

  newId(prefix: string): string {
    return `${prefix}_${token(24)}`;
  }

  put<T extends Thing>(thing: T): T {
    this.state.things[thing.id] = thing;
    return thing;
  }

  find(object: string, id: string): Thing | undefined {
    const thing = this.state.things[id];
    return thing?.object === object ? thing : undefined;
  }

  /** All of a kind, newest first. */
  list(object: string): Thing[] {
    return Object.values(this.state.things)
      .filter((thing) => thing.object === object)
      .toReversed();
  }
}
