import { useState } from 'react';
import { boilerTypeIds, boilerTypes } from '#shared/boilers/boiler-types.ts';
import type { BoilerTypeId } from '#shared/boilers/boiler-types.ts';
import type { Criterion, Rubric } from '#shared/surveys/rubric/types.ts';
import { Section } from '#web/ui/page.tsx';
import { Select } from '#web/ui/select.tsx';
import { CriterionEntry } from './criterion-entry.tsx';

const every = 'every';
const typeOptions = {
  [every]: 'Every type',
  ...Object.fromEntries(boilerTypeIds.map((id) => [id, boilerTypes[id].label])),
} as Readonly<Record<BoilerTypeId | typeof every, string>>;

/** Whether a boiler of this type can have the item: what depends on a fitting stays, since any may have it. */
const concerns = ({ appliesTo: { traits, fittings } }: Criterion, type: BoilerTypeId): boolean =>
  traits.length === 0 ||
  fittings.length > 0 ||
  traits.some((trait) => (boilerTypes[type].traits as readonly string[]).includes(trait));

export const weightOf = (own: readonly { weight: number }[]): number =>
  own.reduce((sum, { weight }) => sum + weight, 0);

/** Every item of the method, section by section, for every type of boiler or for one. */
export function Criteria({ rubric }: { rubric: Rubric }) {
  const [type, setType] = useState<BoilerTypeId | null>(null);
  return (
    <>
      <Section title="What is examined" id="examined">
        <div className="grid gap-x-10 gap-y-4 md:grid-cols-[minmax(0,7fr)_minmax(0,4fr)]">
          <p className="max-w-prose">
            The items in the order a surveyor takes them. Each carries a weight, out of 100 in all. One marked
            safety-critical can stop a boiler by itself. The defects are the usual ones, with the grade that
            each usually calls for; the surveyor decides.
          </p>
          <Select
            label="What to look for on"
            value={type ?? every}
            options={typeOptions}
            onChange={(chosen) => {
              setType(chosen === every ? null : chosen);
            }}
          />
        </div>
      </Section>
      {rubric.sections.map((section) => {
        const own = section.criteria.filter((criterion) => type === null || concerns(criterion, type));
        return (
          <Section
            key={section.id}
            id={section.id}
            title={section.title}
            aside={<span className="text-pencil">Weight {weightOf(section.criteria)} of 100</span>}
          >
            {own.map((criterion) => (
              <CriterionEntry key={criterion.id} criterion={criterion} type={type} />
            ))}
          </Section>
        );
      })}
    </>
  );
}
