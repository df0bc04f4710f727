import { describe, expect, it } from 'vitest';
import { surveyOrderMachine } from '#shared/survey-orders/machine.ts';
import { nextWords } from '#web/features/survey-orders/next-words.ts';

const parts = ['buyer', 'seller', 'surveyor', 'office'] as const;

describe('what happens next, in words', () => {
  it('says something to every part at every stage', () => {
    for (const status of surveyOrderMachine.states) {
      for (const part of parts)
        expect(nextWords({ status, part, proposedTimes: [] }), `${status} ${part}`).toMatch(/^[A-Z].*\.$/u);
    }
  });

  it('asks only the person whose turn it is: the surveyor to propose, then the seller to agree', () => {
    const before = { status: 'arranging' as const, proposedTimes: [] };
    expect(nextWords({ ...before, part: 'surveyor' })).toMatch(/^Propose times/u);
    expect(nextWords({ ...before, part: 'seller' })).toMatch(/^The surveyor proposes/u);
    const after = { status: 'arranging' as const, proposedTimes: ['2027-03-01T10:00:00.000Z'] };
    expect(nextWords({ ...after, part: 'seller' })).toMatch(/^Agree/u);
    expect(nextWords({ ...after, part: 'surveyor' })).toMatch(/^The seller has your times/u);
  });
});
