import { useEffect, useState } from 'react';

/** A clock of a test: true time since it was started, through a locked screen and a page loaded again. */
export interface TestClock {
  isRunning: boolean;
  /** Minutes since the start, to a tenth; 0 before it. */
  minutes: number;
  start: () => void;
  stop: () => void;
}

const readStart = (key: string): number | null => {
  try {
    const text = localStorage.getItem(key);
    return text === null ? null : Number(text);
  } catch {
    return null;
  }
};

const writeStart = (key: string, startMs: number | null): void => {
  try {
    if (startMs === null) localStorage.removeItem(key);
    else localStorage.setItem(key, String(startMs));
  } catch {
    // Without storage the clock holds for as long as the page does.
  }
};

/** A day: whoever forgot to stop it is not told of a test a week long. */
const stalestMs = 24 * 3_600_000;

/** @param name the order and the test the clock belongs to; each has its own. */
export function useTestClock(name: string): TestClock {
  const key = `tubeplate.clock.${name}`;
  const [startMs, setStartMs] = useState<number | null>(() => {
    const kept = readStart(key);
    return kept !== null && Date.now() - kept < stalestMs ? kept : null;
  });
  const [nowMs, setNowMs] = useState(() => Date.now());
  useEffect(() => {
    if (startMs === null) return undefined;
    const tick = () => {
      setNowMs(Date.now());
    };
    const timer = setInterval(tick, 1_000);
    // A locked phone stops timers, not time: what is shown is put right the moment it wakes.
    document.addEventListener('visibilitychange', tick);
    return () => {
      clearInterval(timer);
      document.removeEventListener('visibilitychange', tick);
    };
  }, [startMs]);
  const set = (next: number | null) => {
    writeStart(key, next);
    setStartMs(next);
    setNowMs(Date.now());
  };
  return {
    isRunning: startMs !== null,
    minutes: startMs === null ? 0 : Math.max(0, Math.floor((nowMs - startMs) / 6_000) / 10),
    start: () => {
      set(Date.now());
    },
    stop: () => {
      set(null);
    },
  };
}
