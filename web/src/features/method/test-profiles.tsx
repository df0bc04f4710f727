import type { MethodData } from '#shared/surveys/method.ts';
import { formatNumber } from '#web/lib/format.ts';

const times = (percent: number): string => `${formatNumber(percent / 100, 2)} times`;

/** How a hydraulic test may be made, and whose rule each is. */
export function TestProfiles({ profiles }: { profiles: MethodData['testProfiles'] }) {
  return (
    <ul className="grid gap-x-12 border-t border-rule md:grid-cols-2">
      {profiles.map(
        ({ id, label, firstPercent, repeatPercent, holdMinutes, fallPercent, source, sureness }) => (
          <li key={id} className="border-b border-rule py-3">
            <p className="font-medium">{label}</p>
            <p>
              First test {times(firstPercent)} working pressure, repeat {times(repeatPercent)}. Held{' '}
              {formatNumber(holdMinutes)} minutes; may fall {formatNumber(fallPercent, 1)} %.
            </p>
            <p className="text-sm text-pencil">
              {source}. {sureness}.
            </p>
          </li>
        ),
      )}
    </ul>
  );
}
