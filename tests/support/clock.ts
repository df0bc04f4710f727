import type { Instant } from '#shared/time.ts';
import { addMs } from '#shared/time.ts';

export interface TestClock {
  now: () => Instant;
  /** Moves the clock on. */
  pass: (ms: number) => void;
}

/** A clock that starts at the real time, because the payment service and the queue keep that, and moves when told. */
export function testClock(): TestClock {
  let ahead = 0;
  return {
    now: () => addMs(new Date().toISOString(), ahead),
    pass: (ms) => {
      ahead += ms;
    },
  };
}
