import { boilerTypes } from '#shared/boilers/boiler-types.ts';
import type { BoilerTypeId } from '#shared/boilers/boiler-types.ts';
import { firings, fittings } from '#shared/boilers/boiler.ts';
import { remedies } from '#shared/surveys/record.ts';
import { consequences, measureUnits, stopKinds } from '#shared/surveys/rubric/types.ts';
import type { AppliesTo, Criterion, DefectSpec } from '#shared/surveys/rubric/types.ts';
import { formatBand, formatNumber } from '#web/lib/format.ts';
import { Disclosure } from '#web/ui/disclosure.tsx';
import { GradeMark } from '#web/ui/grade-mark.tsx';
import { Table } from '#web/ui/table.tsx';
import type { Column } from '#web/ui/table.tsx';

const list = new Intl.ListFormat('en-GB', { type: 'disjunction' });

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

const hours = ({ allowance: { hoursLow, hoursHigh } }: DefectSpec): string =>
  hoursLow === hoursHigh
    ? formatNumber(hoursLow, 2)
    : `${formatNumber(hoursLow, 2)}–${formatNumber(hoursHigh, 2)}`;

const partsIn = (metal: 'copper' | 'steel') => (spec: DefectSpec) => {
  const band = spec.allowance.parts[metal];
  return formatBand(band.lowMinor, band.highMinor);
};

const defectCell = ({ label, stop }: DefectSpec) => (
  <>
    {label}
    {stop !== null && <span className="block text-sm text-unfit">{stopKinds[stop]}: Do not steam</span>}
  </>
);

const columns: readonly Column<DefectSpec>[] = [
  { head: 'Defect', cell: defectCell },
  { head: 'Usually', cell: ({ grade }) => <GradeMark grade={grade} size={16} hasLabel /> },
  { head: 'Bears on', cell: ({ consequence }) => consequences[consequence] },
  { head: 'Remedy', cell: ({ remedy }) => remedies[remedy] },
  { head: 'Hours', isNumber: true, cell: hours },
  { head: 'Parts, copper', isNumber: true, cell: partsIn('copper') },
  { head: 'Parts, steel', isNumber: true, cell: partsIn('steel') },
];

/** One item of the method: what to look for, how it may be examined and what each way is worth, and its defects. */
export function CriterionEntry({ criterion }: { criterion: Criterion }) {
  const { number, title, weight, safetyCritical, lookFor, ways, measurements, defects } = criterion;
  const applies = appliesText(criterion.appliesTo);
  return (
    <article id={criterion.id.replace('.', '-')} className="border-b border-rule py-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h3>
          <span className="mr-3 inline-block min-w-6 font-normal text-pencil">{number}</span>
          {title}
        </h3>
        <span className="text-pencil">
          Weight {weight}
          {safetyCritical && ' · bears on the verdict'}
        </span>
      </div>
      <div className="mt-1 grid gap-2 sm:pl-9">
        <p className="max-w-prose">{lookFor.line}</p>
        {applies !== '' && <p className="text-sm text-pencil">Applies to {applies}.</p>}
        {criterion.ifNotFitted !== 'nothing' && (
          <p className="text-sm text-pencil">
            Where there is none at all, the verdict is{' '}
            {criterion.ifNotFitted === 'do-not-steam' ? 'Do not steam' : 'Repair before steaming'}.
          </p>
        )}
        <p className="text-sm text-pencil">
          Ways and what each is worth alone:{' '}
          {ways.map((way) => `${way.label.toLowerCase()} ${formatNumber(way.strength, 2)}`).join(', ')}.
        </p>
        <Disclosure summary="Defects, measurements and photographs">
          <div className="grid gap-4">
            <ul className="list-disc pl-5">
              {Object.entries(lookFor.byType).map(([type, line]) => (
                <li key={type}>
                  {boilerTypes[type as BoilerTypeId].label}: {line}
                </li>
              ))}
            </ul>
            <Table
              caption={`Defects of ${title.toLowerCase()}`}
              isCaptionHidden
              rows={defects}
              keyOf={({ code }) => code}
              columns={columns}
            />
            {measurements.length > 0 && (
              <p>
                Measured:{' '}
                {measurements
                  .map(({ label, unit }) => `${label.toLowerCase()} (${measureUnits[unit]})`)
                  .join('; ')}
                .
              </p>
            )}
            <p>Photographs wanted: {criterion.photosWanted.join('; ').toLowerCase()}.</p>
          </div>
        </Disclosure>
      </div>
    </article>
  );
}
