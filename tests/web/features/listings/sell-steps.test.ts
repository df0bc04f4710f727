import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { boilerTypeIds } from '#shared/boilers/boiler-types.ts';
import { emptyDraft } from '#shared/listings/draft.ts';
import { photoFaults } from '#shared/listings/policy.ts';
import { verdictId } from '#shared/surveys/verdicts.ts';
import { readFilter, writeFilter } from '#web/features/listings/filter-address.ts';
import { missingFrom, sellSteps, stepOf } from '#web/features/listings/sell-steps.ts';
import { completeDraft } from '#tests/support/factories.ts';

describe('what keeps a draft from being listed', () => {
  test('each mistake leads to a step before the last, where it can be put right', () => {
    const mistakes = [...missingFrom(emptyDraft()), ...photoFaults([])];
    expect(mistakes.length).toBeGreaterThan(10);
    expect(mistakes.filter(({ pointer }) => stepOf(pointer) === 'list')).toEqual([]);
  });

  test('every step but the last holds something that an empty draft lacks, or nothing that must be there', () => {
    const reached = new Set(
      [...missingFrom(emptyDraft()), ...photoFaults([])].map(({ pointer }) => stepOf(pointer)),
    );
    // Papers and history may be empty: a boiler with neither can be listed.
    const wanted = sellSteps.map(({ id }) => id).filter((id) => id !== 'list' && id !== 'history');
    expect([...reached].toSorted()).toEqual(wanted.toSorted());
  });

  test('nothing, when it is complete', () => {
    expect(missingFrom(completeDraft())).toEqual([]);
  });
});

describe('the filter in the address', () => {
  const price = fc.option(fc.integer({ min: 0, max: 100_000_000 }), { nil: undefined });
  const filter = fc.record({
    type: fc.option(fc.constantFrom(...boilerTypeIds), { nil: undefined }),
    verdict: fc.option(fc.constantFrom(...verdictId.options, 'not-surveyed' as const), { nil: undefined }),
    priceMinMinor: price,
    priceMaxMinor: price,
    sort: fc.option(fc.constantFrom('price-low' as const, 'price-high' as const), { nil: undefined }),
  });

  test('comes back as it went in', () => {
    fc.assert(
      fc.property(filter, (wanted) => {
        const given = Object.fromEntries(Object.entries(wanted).filter(([, value]) => value !== undefined));
        expect(readFilter(writeFilter(wanted))).toEqual(given);
      }),
      { numRuns: 500 },
    );
  });

  test('what makes no sense there is left out', () => {
    const search = new URLSearchParams(
      'type=teapot&verdict=lovely&priceMinMinor=-5&priceMaxMinor=ten&colour=red',
    );
    expect(readFilter(search)).toEqual({});
  });
});
