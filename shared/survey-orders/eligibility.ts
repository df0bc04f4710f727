import type { BoilerFacts } from '../boilers/boiler.ts';
import type { SurveyorTerms } from '../surveyors/contract.ts';
import type { ExtraId } from '../surveys/scopes.ts';
import type { Day } from '../time.ts';

export interface Candidate {
  userId: string;
  isGranted: boolean;
  terms: SurveyorTerms;
  distanceKm: number;
  /** People this surveyor has traded or quarrelled with in the last twelve months. */
  recentDealings: ReadonlySet<string>;
}

export interface Commission {
  facts: Pick<BoilerFacts, 'type' | 'material'>;
  sellerId: string;
  buyerId: string;
  extras: readonly ExtraId[];
  today: Day;
}

/** Why a surveyor may not take a commission; empty when they may. Plain words, for the office and for tests. */
export function reasonsAgainst(candidate: Candidate, commission: Commission): string[] {
  const { terms } = candidate;
  const parties = [commission.sellerId, commission.buyerId];
  const checks: [boolean, string][] = [
    [candidate.isGranted, 'not approved by the office'],
    [terms.isTakingJobs, 'not taking jobs'],
    [terms.insuredUntilOn > commission.today, 'insurance out of date'],
    [candidate.distanceKm <= terms.rangeKm, 'out of range'],
    [terms.types.includes(commission.facts.type), 'not competent for this type'],
    [terms.materials.includes(commission.facts.material), 'not competent for this material'],
    [
      commission.extras.every((extra) => terms.fees[extra] !== null),
      'does not offer an extra that is wanted',
    ],
    [!parties.includes(candidate.userId), 'is a party to the sale'],
    [!parties.some((party) => candidate.recentDealings.has(party)), 'has had recent dealings with a party'],
  ];
  return checks.filter(([holds]) => !holds).map(([, reason]) => reason);
}
