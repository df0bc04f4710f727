import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { materials } from '#shared/boilers/boiler.ts';
import type { MaterialId } from '#shared/boilers/boiler.ts';
import { boilerTypeIds } from '#shared/boilers/boiler-types.ts';
import { reasonsAgainst } from '#shared/survey-orders/eligibility.ts';
import type { Candidate, Commission } from '#shared/survey-orders/eligibility.ts';

const materialIds = Object.keys(materials) as MaterialId[];

const candidate: Candidate = {
  userId: 'ida',
  isGranted: true,
  terms: {
    townId: 1,
    rangeKm: 100,
    types: [...boilerTypeIds],
    materials: materialIds,
    insuredUntilOn: '2026-06-02',
    fees: {
      external: 6_000,
      hydraulic: 11_000,
      full: 18_500,
      thickness: 2_500,
      borescope: null,
      perKmMinor: 40,
    },
    about: 'Second boiler tester of a club in the hills.',
    isTakingJobs: true,
  },
  distanceKm: 99.9,
  recentDealings: new Set(['somebody else']),
};
const commission: Commission = {
  facts: { type: 'vertical-multi-tube', material: 'copper' },
  sellerId: 'edna',
  buyerId: 'col',
  extras: ['thickness'],
  today: '2026-06-01',
};
const terms = (change: Partial<Candidate['terms']>): Candidate => ({
  ...candidate,
  terms: { ...candidate.terms, ...change },
});

describe('who may take a survey', () => {
  test('one to whom nothing applies', () => {
    expect(reasonsAgainst(candidate, commission)).toEqual([]);
  });

  const cases: [string, Candidate, Commission][] = [
    ['not approved by the office', { ...candidate, isGranted: false }, commission],
    ['not taking jobs', terms({ isTakingJobs: false }), commission],
    ['insurance out of date', terms({ insuredUntilOn: '2026-06-01' }), commission],
    ['out of range', { ...candidate, distanceKm: 100.1 }, commission],
    ['not competent for this type', terms({ types: ['locomotive'] }), commission],
    ['not competent for this material', terms({ materials: ['steel'] }), commission],
    ['does not offer an extra that is wanted', candidate, { ...commission, extras: ['borescope'] }],
    ['is a party to the sale', { ...candidate, userId: 'edna' }, commission],
    ['is a party to the sale', { ...candidate, userId: 'col' }, commission],
    ['has had recent dealings with a party', { ...candidate, recentDealings: new Set(['col']) }, commission],
    ['has had recent dealings with a party', { ...candidate, recentDealings: new Set(['edna']) }, commission],
  ];
  test.each(cases)('not one who: %s', (reason, one, wanted) => {
    expect(reasonsAgainst(one, wanted)).toEqual([reason]);
  });

  test('to extend range, competence or insurance never makes anybody less eligible', () => {
    const anyTerms = fc.record({
      rangeKm: fc.integer({ min: 5, max: 1_000 }),
      types: fc.subarray([...boilerTypeIds], { minLength: 1 }),
      materials: fc.subarray(materialIds, { minLength: 1 }),
      insuredUntilOn: fc.constantFrom('2026-05-01', '2026-06-01', '2026-07-01'),
    });
    fc.assert(
      fc.property(anyTerms, fc.double({ min: 0, max: 1_200, noNaN: true }), (change, distanceKm) => {
        const before = reasonsAgainst({ ...terms(change), distanceKm }, commission);
        const wider = {
          rangeKm: change.rangeKm + 50,
          types: [...boilerTypeIds],
          materials: materialIds,
          insuredUntilOn: '2027-01-01',
        };
        const after = reasonsAgainst({ ...terms(wider), distanceKm }, commission);
        expect(after.every((reason) => before.includes(reason))).toBe(true);
      }),
    );
  });
});
