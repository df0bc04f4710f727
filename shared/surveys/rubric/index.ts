import { traitsOf } from '../../boilers/boiler.ts';
import type { BoilerFacts } from '../../boilers/boiler.ts';
import { invalidField } from '../../problem.ts';
import { casing } from './casing.ts';
import { feed } from './feed.ts';
import { firing } from './firing.ts';
import { identity } from './identity.ts';
import { safety } from './safety.ts';
import { shell } from './shell.ts';
import { addedIn110 } from './measured-more.ts';
import type { AppliesTo, Criterion, DefectSpec, MeasurementSpec, Rubric, Section } from './types.ts';

/** What decides which criteria apply: type, fittings and firing, and nothing else the seller says. */
export type ApplicableFacts = Pick<BoilerFacts, 'type' | 'fittings' | 'firing'>;

/** The version a new survey is scored with. */
export const rubricVersion = '1.1.0';

/** Sections with more to measure under some criteria. */
const measuringMore = (
  sections: readonly Section[],
  added: Readonly<Record<string, readonly MeasurementSpec[]>>,
): Section[] =>
  sections.map((part) => ({
    ...part,
    criteria: part.criteria.map((criterion) => ({
      ...criterion,
      measurements: [...criterion.measurements, ...(added[criterion.id] ?? [])],
    })),
  }));

const firstSections: Section[] = [identity, shell, safety, feed, firing, casing];

/** Every version ever published, oldest first. A report keeps the one it was scored with. */
export const rubricVersions: readonly Rubric[] = [
  {
    version: '1.0.0',
    publishedOn: '2026-12-01',
    changes: ['First published version.'],
    sections: firstSections,
  },
  {
    version: '1.1.0',
    publishedOn: '2026-12-01',
    changes: [
      'Pressure is worked out for every part: barrel, end plates, flue, tubes and stays. Before, it was barrel, flue and stayed plate.',
      'Metal in the fire is taken 15 °C hotter than the steam, and a seam at what its kind carries. Copper barrels are held to the trade’s older rule as well; the lower governs.',
      'A part that falls short on the seller’s figures alone is to be measured; it no longer passes unseen behind a measured one.',
      'Feed is checked against the estimated steam where no feed was timed. Water in hand, and the heat and air of a gas flame, are worked out and shown.',
      'A hydraulic test is judged by the profile the surveyor picks, and the report says which.',
    ],
    sections: measuringMore(firstSections, addedIn110),
  },
];

/** Whether a version of the method was published no earlier than another. An unknown version is none. */
export const isFrom = (version: string, since: string): boolean => {
  const order = rubricVersions.map((rubric) => rubric.version);
  return order.indexOf(version) >= order.indexOf(since);
};

/** @throws Problem `invalid-input` if no such version was published. */
export function rubricOf(version: string): Rubric {
  const found = rubricVersions.find((rubric) => rubric.version === version);
  if (!found)
    throw invalidField(['record', 'rubricVersion'], `There is no version ${version} of the method.`);
  return found;
}

export const currentRubric = rubricOf(rubricVersion);

/** All criteria of a rubric, in the order of examination. */
export const criteriaOf = (rubric: Rubric): Criterion[] => rubric.sections.flatMap((part) => part.criteria);

/** Whether a criterion with this predicate applies to a boiler. */
export function applies(when: AppliesTo, facts: ApplicableFacts): boolean {
  const traits = traitsOf(facts);
  const isNamed = when.traits.length > 0 || when.fittings.length > 0;
  const has =
    when.traits.some((trait) => traits.has(trait)) ||
    when.fittings.some((fitting) => facts.fittings.includes(fitting));
  return (!isNamed || has) && (when.firings.length === 0 || when.firings.includes(facts.firing));
}

/** The criteria that apply to a boiler, in the order of examination. */
export const criteriaFor = (facts: ApplicableFacts, rubric: Rubric = currentRubric): Criterion[] =>
  criteriaOf(rubric).filter((criterion) => applies(criterion.appliesTo, facts));

/** Each applicable criterion's share of the whole; the shares add up to 1. */
export function sharesFor(facts: ApplicableFacts, rubric: Rubric = currentRubric): Map<string, number> {
  const criteria = criteriaFor(facts, rubric);
  const total = criteria.reduce((sum, criterion) => sum + criterion.weight, 0);
  return new Map(criteria.map((criterion) => [criterion.id, criterion.weight / total]));
}

export const criterionOf = (id: string, rubric: Rubric = currentRubric): Criterion | undefined =>
  criteriaOf(rubric).find((criterion) => criterion.id === id);

export const defectOf = (criterion: Criterion, code: string): DefectSpec | undefined =>
  criterion.defects.find((spec) => spec.code === code);

/** What to look for on this boiler: the general line, and the line of its type where there is one. */
export const lookForOn = (criterion: Criterion, type: BoilerFacts['type']): string[] => {
  const special = criterion.lookFor.byType[type];
  return special === undefined ? [criterion.lookFor.line] : [criterion.lookFor.line, special];
};
