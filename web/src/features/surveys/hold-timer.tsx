import { holdState, raisingSteps } from '#shared/surveys/test-steps.ts';
import type { HydraulicTest } from '#shared/surveys/record.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Button } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';
import type { TestClock } from './test-clock.ts';

/** “6:30”. */
const clockText = (minutes: number): string => {
  const seconds = Math.round(minutes * 60);
  return `${String(Math.floor(seconds / 60))}:${String(seconds % 60).padStart(2, '0')}`;
};

interface Props {
  test: HydraulicTest;
  clock: TestClock;
  onChange: (change: Partial<HydraulicTest>) => void;
}

/** The last reading, if it was taken within a minute of now: what a hold may begin or end on. */
const freshReading = (test: HydraulicTest, minutes: number) => {
  const last = test.readings.at(-1);
  return last !== undefined && minutes - last.minute <= 1 ? last : null;
};

/** Begins the hold on a reading at test pressure, keeps its time, asks for readings, and ends it on another. */
export function HoldTimer({ test, clock, onChange }: Props) {
  const { show } = useUnits();
  const isRaised = raisingSteps(test).every(({ isReached }) => isReached);
  const state = clock.isRunning ? holdState(test, clock.minutes) : null;
  const fresh = freshReading(test, clock.minutes);
  if (test.holdEndMinute !== null || !clock.isRunning) return null;
  if (state === null)
    return (
      <div className="grid gap-2">
        <Button
          kind="quiet"
          isWide
          disabled={!isRaised || fresh === null || fresh.pressurePa < test.wantedPa}
          onClick={() => {
            if (fresh) onChange({ holdStartMinute: fresh.minute });
          }}
        >
          Begin the hold
        </Button>
        <p className="text-sm leading-5 text-pencil">
          Read the gauge at {show('pressure', test.wantedPa)} or a little over, add the reading, and begin.
        </p>
      </div>
    );
  return (
    <div className="grid gap-3 border border-ink bg-sheet p-4">
      <p>
        <span className="block text-label text-pencil">
          {state.isLongEnough ? 'Held long enough' : 'Still to hold'}
        </span>
        <span className="text-[2.75rem] leading-none font-medium tabular-nums" role="timer">
          {clockText(state.leftMinutes)}
        </span>
      </p>
      <div aria-live="polite">
        {state.wantsReading && (
          <Notice>
            {state.isLongEnough
              ? 'Read the gauge, add the reading, and end the hold.'
              : 'Read the gauge now, add the reading, and look for wet all over.'}
          </Notice>
        )}
      </div>
      <Button
        kind="quiet"
        isWide
        disabled={!state.isLongEnough || fresh === null}
        onClick={() => {
          if (fresh) onChange({ holdEndMinute: fresh.minute });
        }}
      >
        End the hold
      </Button>
      {state.isLongEnough && fresh === null && (
        <p className="text-sm leading-5 text-pencil">It ends on a reading taken now.</p>
      )}
    </div>
  );
}
