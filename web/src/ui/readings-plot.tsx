import type { SteamTest } from '#shared/surveys/record.ts';
import { fromSi, unitOf } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Plot } from './plot.tsx';

interface Props {
  title: string;
  readings: SteamTest['readings'];
  levels: readonly { label: string; pa: number }[];
  /** What happened, at a pressure read off the gauge: the first reading that reaches it marks the minute. */
  events?: readonly { label: string; pa: number | null }[];
  /** Minutes between which the pressure was held. */
  hold?: { from: number; to: number } | null;
}

/** Readings of a test against time, with the pressures they are judged by. */
export function ReadingsPlot({ title, readings, levels, events = [], hold = null }: Props) {
  const { units } = useUnits();
  const sorted = readings.toSorted((a, b) => a.minute - b.minute);
  if (sorted.length < 2) return null;
  const shown = (pa: number) => fromSi('pressure', units, pa);
  const marks = events.flatMap(({ label, pa }) => {
    const at = pa === null ? undefined : sorted.find(({ pressurePa }) => pressurePa >= pa);
    return pa === null || at === undefined ? [] : [{ label, x: at.minute, y: shown(pa) }];
  });
  return (
    <Plot
      title={title}
      x={{ label: 'Time', unit: 'minutes' }}
      y={{ label: 'Pressure', unit: unitOf('pressure', units) }}
      series={[
        {
          label: 'Gauge',
          points: sorted.map(({ minute, pressurePa }) => [minute, shown(pressurePa)] as const),
        },
      ]}
      levels={levels.map(({ label, pa }) => ({ label, y: shown(pa) }))}
      marks={marks}
      isRead
      {...(hold && { stretch: { label: 'Hold', ...hold } })}
    />
  );
}
