import { fromKept, quantityText, unitOf } from '#shared/engineering/quantities.ts';
import type { Outcome, Plot as PlotData } from '#shared/workings/calculator.ts';
import { useUnits } from '#web/lib/units.tsx';
import { Plot } from '#web/ui/plot.tsx';

/** What came of it: the figures wanted, and what they mean. */
export function Answers({ outcome }: { outcome: Outcome }) {
  const { units } = useUnits();
  const [first, ...rest] = outcome.answers;
  return (
    <div aria-live="polite" className="grid gap-4">
      {first && (
        <p>
          <span className="block text-label text-pencil">{first.label}</span>
          <span className="text-[2.25rem] leading-tight font-medium tracking-tight">
            {quantityText(first.quantity, units, first.value)}
          </span>
        </p>
      )}
      {outcome.says.length > 0 && (
        <ul className="grid gap-2 text-lg leading-7">
          {outcome.says.map((text) => (
            <li key={text}>{text}</li>
          ))}
        </ul>
      )}
      {rest.length > 0 && (
        <dl className="border-t border-rule">
          {rest.map((term) => (
            <div
              key={term.symbol + term.label}
              className="flex items-baseline justify-between gap-4 border-b border-rule py-2"
            >
              <dt className="text-pencil">{term.label}</dt>
              <dd className="text-right font-medium">{quantityText(term.quantity, units, term.value)}</dd>
            </div>
          ))}
        </dl>
      )}
    </div>
  );
}

/** A curve of a calculator, in the reader's units. */
export function OutcomePlot({ plot }: { plot: PlotData }) {
  const { units } = useUnits();
  const x = (value: number) => fromKept(plot.x.quantity, units, value);
  const y = (value: number) => fromKept(plot.y.quantity, units, value);
  return (
    <Plot
      title={plot.title}
      x={{ label: plot.x.label, unit: unitOf(plot.x.quantity, units) }}
      y={{ label: plot.y.label, unit: unitOf(plot.y.quantity, units) }}
      series={plot.series.map(({ label, points }) => ({
        label,
        points: points.map((point) => [x(point[0]), y(point[1])] as const),
      }))}
      marks={plot.marks.map((mark) => ({ label: mark.label, x: x(mark.x), y: y(mark.y) }))}
      levels={plot.levels.map((level) => ({ label: level.label, y: y(level.y) }))}
    />
  );
}
