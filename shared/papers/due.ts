import type { BoilerFacts, MaterialId } from '../boilers/boiler.ts';
import { hydraulicDueMonths, steamDueMonths } from '../engineering/papers.ts';
import type { DueMonths } from '../engineering/papers.ts';
import { dayText, daysBetween, monthsLater } from '../time.ts';
import type { Day } from '../time.ts';

/** When one test is due again; null where no paper gives a date. Never “valid”. */
export interface NextTest {
  id: 'hydraulic' | 'steam';
  testedOn: Day | null;
  /** The earlier and the later day where it turns on which test it was. */
  dueFrom: Day | null;
  dueBy: Day | null;
  isOverdue: boolean | null;
  text: string;
}

interface Tested {
  material: MaterialId;
  hydraulicOn: Day | null;
  /** Whether it was the first since the boiler was built; null where nobody knows. */
  wasFirst: boolean | null;
  steamOn: Day | null;
  /** The day to reckon from; null to give dates alone. */
  onDay: Day | null;
}

const words = { hydraulic: 'Hydraulic test', steam: 'Steam test' } as const;

function nextTest(id: NextTest['id'], testedOn: Day | null, months: DueMonths, onDay: Day | null): NextTest {
  if (testedOn === null)
    return {
      id,
      testedOn,
      dueFrom: null,
      dueBy: null,
      isOverdue: null,
      text: `${words[id]}: due. No paper gives the date of one.`,
    };
  const dueFrom = monthsLater(testedOn, months.low);
  const dueBy = monthsLater(testedOn, months.high);
  const isOverdue = onDay === null ? null : daysBetween(onDay, dueFrom) < 0;
  const isBand = dueFrom !== dueBy;
  const when = isBand
    ? `between ${dayText(dueFrom)} and ${dayText(dueBy)}, by whether it was the first`
    : `on ${dayText(dueFrom)}`;
  const verb = isOverdue === true && !isBand ? 'was due again' : 'due again';
  return {
    id,
    testedOn,
    dueFrom,
    dueBy,
    isOverdue,
    text: `${words[id]} of ${dayText(testedOn)}: ${verb} ${when}. The inspector may ask for one sooner.`,
  };
}

/** When the two tests are due again: copper 48 months, steel 48 after the first and then 24, steam 12. */
export const nextTests = ({ material, hydraulicOn, wasFirst, steamOn, onDay }: Tested): NextTest[] => [
  nextTest('hydraulic', hydraulicOn, hydraulicDueMonths(material, wasFirst), onDay),
  nextTest('steam', steamOn, steamDueMonths, onDay),
];

const latest = (papers: BoilerFacts['papers'], kind: 'hydraulic-certificate' | 'steam-certificate') =>
  papers
    .filter((paper) => paper.kind === kind)
    .flatMap(({ datedOn }) => datedOn ?? [])
    .toSorted()
    .at(-1) ?? null;

/** When tests are due again by the dates on a boiler's papers. Whether a paper was of its first test is not known. */
export const testsDueByPapers = (
  facts: Pick<BoilerFacts, 'material' | 'papers'>,
  onDay: Day | null,
): NextTest[] =>
  nextTests({
    material: facts.material,
    hydraulicOn: latest(facts.papers, 'hydraulic-certificate'),
    wasFirst: facts.papers.filter(({ kind }) => kind === 'hydraulic-certificate').length > 1 ? false : null,
    steamOn: latest(facts.papers, 'steam-certificate'),
    onDay,
  });
