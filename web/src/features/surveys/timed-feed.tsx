import { useState } from 'react';
import { Button } from '#web/ui/button.tsx';
import { FigureInput } from './figure-input.tsx';
import { useTestClock } from './test-clock.ts';

/** Cold water, kg in a litre. */
const coldKgPerL = 0.998_2;

/** Times how long a measure of feed lasts with level and pressure held, and works the evaporation out. */
export function TimedFeed({ name, onTimed }: { name: string; onTimed: (kgPerH: number) => void }) {
  const clock = useTestClock(name);
  const [litres, setLitres] = useState<number | null>(null);
  const end = () => {
    if (litres === null || clock.minutes <= 0) return;
    onTimed(Math.round((litres * coldKgPerL * 600) / clock.minutes) / 10);
    clock.stop();
  };
  return (
    <div className="grid gap-3 border-l-8 border-rule pl-3">
      <p className="text-[0.9375rem] leading-6 text-pencil">
        Fill the feed tank to a mark. Start, keep level and pressure where they are, and end at the same level
        and pressure. Give the water it took.
      </p>
      {clock.isRunning ? (
        <>
          <p role="timer" className="text-xl font-medium">
            {clock.minutes.toFixed(1)} min
          </p>
          <FigureInput label="Water it took" unit="L" min={0} max={50} value={litres} onChange={setLitres} />
          <Button kind="quiet" disabled={litres === null || clock.minutes < 1} onClick={end}>
            End, and work it out
          </Button>
        </>
      ) : (
        <Button kind="quiet" onClick={clock.start}>
          Time a feed
        </Button>
      )}
    </div>
  );
}
