import { boilerTypes } from '#shared/boilers/boiler-types.ts';
import type { BoilerTypeId } from '#shared/boilers/boiler-types.ts';
import { firings, fittings } from '#shared/boilers/boiler.ts';
import type { AppliesTo, Criterion } from '#shared/surveys/rubric/types.ts';
import { formatNumber } from '#web/lib/format.ts';
import { DefectList } from './defect-list.tsx';

const list = new Intl.ListFormat('en-GB', { type: 'disjunction' });

/** Where an item stands on the Method page. */
export const criterionAnchor = (criterionId: string): string => criterionId.replace('.', '-');

/** When an item applies, in words; nothing where it always does. */
function appliesText({ traits, fittings: fitted, firings: fired }: AppliesTo): string {
  const things = [
    ...traits.map((trait) => trait.replaceAll('-', ' ')),
    ...fitted.map((id) => fittings[id].toLowerCase()),
  ];
  const where = things.length > 0 ? `a boiler with ${list.format(things)}` : '';
  const how = fired.length > 0 ? `fired by ${list.format(fired.map((id) => firings[id].toLowerCase()))}` : '';
  return [where || (how && 'a boiler'), how].filter(Boolean).join(' ');
}

const missingText = ({ ifNotFitted }: Criterion): string =>
  ifNotFitted === 'nothing'
    ? ''
    : ` Where there is none at all, the verdict is ${ifNotFitted === 'do-not-steam' ? 'Do not steam' : 'Repair before steaming'}.`;

interface Props {
  criterion: Criterion;
  /** The type of boiler the reader asks about; null for every type. */
  type: BoilerTypeId | null;
}

/** One item of the method: what to look for, and behind a press its defects, ways, measurements and photographs. */
export function CriterionEntry({ criterion, type }: Props) {
  const { number, title, weight, safetyCritical, lookFor, defects } = criterion;
  const special = type === null ? undefined : lookFor.byType[type];
  const applies = appliesText(criterion.appliesTo);
  const count = `${String(defects.length)} defects`;
  return (
    <article
      id={criterionAnchor(criterion.id)}
      className="grid grid-cols-[2rem_minmax(0,1fr)] border-b border-rule pt-4 pb-1"
    >
      <span className="text-lg leading-6 text-pencil">{number}</span>
      <div>
        <div className="flex flex-wrap items-baseline justify-between gap-x-6">
          <h3>{title}</h3>
          <span className="text-sm text-pencil">
            Weight {weight}
            {safetyCritical && ', safety-critical'}
          </span>
        </div>
        <p className="mt-1 max-w-prose">{lookFor.line}</p>
        {special !== undefined && <p className="mt-1 max-w-prose font-medium">{special}</p>}
        {(applies !== '' || criterion.ifNotFitted !== 'nothing') && (
          <p className="mt-1 max-w-prose text-sm text-pencil">
            {applies !== '' && `Applies to ${applies}.`}
            {missingText(criterion)}
          </p>
        )}
        <details>
          <summary className="min-h-11 py-2.5 font-medium marker:text-copper">
            {count}, and how it is examined
            <span className="sr-only">: {title}</span>
          </summary>
          <div className="grid gap-4 pb-4">
            <DefectList defects={defects} label={`Defects of ${title.toLowerCase()}`} />
            <HowExamined criterion={criterion} isEveryType={type === null} />
          </div>
        </details>
      </div>
    </article>
  );
}

function HowExamined({ criterion, isEveryType }: { criterion: Criterion; isEveryType: boolean }) {
  const { ways, measurements, photosWanted, lookFor } = criterion;
  const rows: readonly (readonly [label: string, text: string])[] = [
    ...(isEveryType
      ? Object.entries(lookFor.byType).map(
          ([type, line]) => [boilerTypes[type as BoilerTypeId].label, line] as const,
        )
      : []),
    [
      'How surely each way shows it, alone',
      ways
        .map(({ label, strength }) => `${label.toLowerCase()} ${formatNumber(strength * 100)} %`)
        .join(', '),
    ],
    ['Measured', measurements.map(({ label }) => label.toLowerCase()).join('; ')],
    ['Photographs wanted', photosWanted.join('; ').toLowerCase()],
  ];
  return (
    <dl className="grid max-w-prose gap-2">
      {rows
        .filter(([, text]) => text !== '')
        .map(([label, text]) => (
          <div key={label}>
            <dt className="text-label text-pencil">{label}</dt>
            <dd className="text-[0.9375rem] leading-6 first-letter:uppercase">{text}</dd>
          </div>
        ))}
    </dl>
  );
}
