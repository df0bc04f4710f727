import { useState } from 'react';
import type { HydraulicTest } from '#shared/surveys/record.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Button } from '#web/ui/button.tsx';
import { FigureInput } from './figure-input.tsx';
import { quantityOf, shownText } from './quantities.ts';
import type { TestClock } from './test-clock.ts';

type Reading = HydraulicTest['readings'][number];

interface Props {
  readings: readonly Reading[];
  /** What the first minute counts from. */
  from: string;
  clock: TestClock;
  onChange: (readings: Reading[]) => void;
}

const maxPa = 6_000_000;

/** Pressure against time as read off the test gauge, with a clock for whoever has a hand on the pump. */
export function ReadingsTable({ readings, from, clock, onChange }: Props) {
  const { units } = useUnits();
  const [pressurePa, setPressurePa] = useState<number | null>(null);
  const [minute, setMinute] = useState<number | null>(null);
  const [count, setCount] = useState(0);
  const quantity = quantityOf('Pa', units);
  const at = minute ?? (clock.isRunning ? clock.minutes : null);
  const add = () => {
    if (pressurePa === null || at === null) return;
    onChange([...readings, { minute: at, pressurePa }].toSorted((a, b) => a.minute - b.minute));
    setPressurePa(null);
    setMinute(null);
    setCount(count + 1);
  };
  return (
    <section className="grid gap-3" aria-label="Readings">
      <div className="flex flex-wrap items-center justify-between gap-2">
        <h2 className="text-lg">Readings</h2>
        <Button kind="quiet" onClick={clock.start}>
          {clock.isRunning ? `${clock.minutes.toFixed(1)} min: start again` : 'Start the clock'}
        </Button>
      </div>
      {readings.length > 0 && (
        <table className="w-full border-collapse">
          <caption className="sr-only">Readings of the test gauge</caption>
          <thead>
            <tr className="border-b border-rule text-left text-label text-pencil">
              <th scope="col" className="py-2">
                Minute
              </th>
              <th scope="col">Pressure{quantity && `, ${quantity.unit}`}</th>
              <th scope="col">
                <span className="sr-only">Take off</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {readings.map((reading, index) => (
              // Two readings may be alike in all but their place.
              // eslint-disable-next-line react/no-array-index-key
              <tr key={index} className="border-b border-rule">
                <td>{reading.minute}</td>
                <td>{quantity && shownText(reading.pressurePa, quantity)}</td>
                <td className="text-right">
                  <Button
                    kind="plain"
                    aria-label={`Take off the reading at minute ${String(reading.minute)}`}
                    onClick={() => {
                      onChange(readings.filter((_each, place) => place !== index));
                    }}
                  >
                    Take off
                  </Button>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
      <p className="text-sm leading-5 text-pencil">
        Minutes count from {from}. With the clock running, leave the minute empty and it is read off for you.
      </p>
      <div className="grid grid-cols-2 items-start gap-3" key={count}>
        <FigureInput
          label="Pressure"
          unit="Pa"
          min={0}
          max={maxPa}
          value={pressurePa}
          onChange={setPressurePa}
        />
        <FigureInput label="Minute" unit="min" min={0} max={600} value={minute} onChange={setMinute} />
      </div>
      <Button
        kind="quiet"
        isWide
        disabled={pressurePa === null || (minute === null && !clock.isRunning) || readings.length >= 200}
        onClick={add}
      >
        Add the reading
      </Button>
    </section>
  );
}
