import type { MethodData } from '#shared/surveys/method.ts';
import { formatNumber, formatPence } from '#web/lib/format.ts';

type Limit = MethodData['limits'][number];

/** A limit as it is said: pence as money, everything else with its unit. */
const valueText = ({ value, unit }: Limit): string =>
  unit.startsWith('pence')
    ? formatPence(value) + unit.slice('pence'.length)
    : `${formatNumber(value, 2)} ${unit}`;

/** The limits the method works by, each with where it comes from. */
export function LimitsList({ limits }: { limits: readonly Limit[] }) {
  return (
    <dl>
      {limits.map((limit) => (
        <div
          key={limit.id}
          className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-6 border-b border-rule py-2 leading-6 md:grid-cols-[minmax(0,5fr)_9rem_minmax(0,5fr)]"
        >
          <dt>{limit.label}</dt>
          <dd className="text-right font-medium whitespace-nowrap md:text-left">{valueText(limit)}</dd>
          <dd className="col-span-2 text-sm leading-6 text-pencil first-letter:uppercase md:col-span-1">
            {limit.source}
          </dd>
        </div>
      ))}
    </dl>
  );
}
