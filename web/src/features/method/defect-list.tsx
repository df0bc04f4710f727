import { remedies } from '#shared/surveys/record.ts';
import { consequences, stopKinds } from '#shared/surveys/rubric/types.ts';
import type { DefectSpec } from '#shared/surveys/rubric/types.ts';
import { formatBand, formatNumber } from '#web/lib/format.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';

function hoursText({ allowance: { hoursLow, hoursHigh } }: DefectSpec): string {
  if (hoursHigh === 0) return '';
  const hours =
    hoursLow === hoursHigh
      ? formatNumber(hoursLow, 2)
      : `${formatNumber(hoursLow, 2)}–${formatNumber(hoursHigh, 2)}`;
  return `${hours} ${hoursHigh === 1 && hoursLow === 1 ? 'hour' : 'hours'}`;
}

/** One band where copper and steel cost the same. */
function partsText({ allowance: { parts } }: DefectSpec): string {
  const { copper, steel } = parts;
  if (copper.highMinor === 0 && steel.highMinor === 0) return '';
  const inCopper = formatBand(copper.lowMinor, copper.highMinor);
  const inSteel = formatBand(steel.lowMinor, steel.highMinor);
  return inCopper === inSteel ? `parts ${inCopper}` : `parts ${inCopper} in copper, ${inSteel} in steel`;
}

const remedyText = (spec: DefectSpec): string =>
  [remedies[spec.remedy], hoursText(spec), partsText(spec)].filter(Boolean).join(', ');

/** The catalogue of an item: each defect, the grade it usually calls for, and what puts it right. */
export function DefectList({ defects, label }: { defects: readonly DefectSpec[]; label: string }) {
  return (
    <ul aria-label={label} className="border-t border-rule">
      {defects.map((spec) => (
        <li
          key={spec.code}
          className="grid gap-x-6 border-b border-rule py-2 leading-6 md:grid-cols-[minmax(0,4fr)_9.5rem_minmax(0,5fr)]"
        >
          <span>
            {spec.label}
            {spec.stop !== null && (
              <span className="block text-sm text-unfit">{stopKinds[spec.stop]}: Do not steam</span>
            )}
          </span>
          <span>
            <GradeMark grade={spec.grade} size={16} hasLabel />
          </span>
          <span className="text-[0.9375rem] text-pencil">
            {consequences[spec.consequence]}. {remedyText(spec)}.
          </span>
        </li>
      ))}
    </ul>
  );
}
