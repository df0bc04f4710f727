import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { agreementOf } from '#shared/surveys/agreement.ts';
import { quadraticKappa } from '#shared/engineering/kappa.ts';
import { anySurvey } from './arbitrary.ts';
import { goodSurvey, withFinding } from './example.ts';

describe('quadratic weighted kappa', () => {
  it('agrees with the published table', () => {
    // Agresti 1990, a four-grade table as in R package vcd; 0.3320 by its Fleiss-Cohen weights (derived).
    const table = [
      [7, 7, 2, 3],
      [2, 8, 3, 7],
      [1, 5, 4, 9],
      [2, 8, 9, 14],
    ];
    expect(quadraticKappa(table)).toBeCloseTo(0.332, 4);
  });

  it('of two grades is plain kappa', () => {
    // Common textbook two-by-two example (from memory): 0.40.
    expect(
      quadraticKappa([
        [20, 5],
        [10, 15],
      ]),
    ).toBeCloseTo(0.4, 12);
  });

  it('is not defined where all fall in one grade, and refuses what is no table of counts', () => {
    expect(
      quadraticKappa([
        [9, 0],
        [0, 0],
      ]),
    ).toBeNull();
    expect(() => quadraticKappa([[1, 2]])).toThrow(RangeError);
    expect(() => quadraticKappa([[-1]])).toThrow(RangeError);
  });
});

describe('two surveys of one boiler', () => {
  it('differ where they were graded differently, widest apart first', () => {
    const second = withFinding('shell.barrel', { grade: 'serviceable' });
    const findings = second.record.findings.map((finding) =>
      finding.criterionId === 'casing.finish' ? { ...finding, grade: 'unfit' as const } : finding,
    );
    const { common, differences, kappa } = agreementOf(goodSurvey(), {
      ...second,
      record: { ...second.record, findings },
    });
    expect(common).toBe(33);
    expect(differences.map(({ criterionId, steps }) => [criterionId, steps])).toEqual([
      ['casing.finish', 3],
      ['shell.barrel', 1],
    ]);
    expect(kappa).toBeCloseTo(0, 12);
  });

  it('agree wholly with themselves, and the same either way round', () => {
    fc.assert(
      fc.property(anySurvey, anySurvey, (one, other) => {
        const same = agreementOf(one, one);
        expect(same.differences).toEqual([]);
        expect(same.kappa ?? 1).toBe(1);
        const forth = agreementOf(one, { ...other, facts: one.facts });
        const back = agreementOf({ ...other, facts: one.facts }, one);
        expect(forth.kappa).toBe(back.kappa);
        expect(forth.differences.length).toBe(back.differences.length);
      }),
      { numRuns: 500 },
    );
  });
});
