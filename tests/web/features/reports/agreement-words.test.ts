import { describe, expect, it } from 'vitest';
import { agreementOf } from '#shared/surveys/agreement.ts';
import type { Agreement } from '#shared/surveys/agreement.ts';
import { alikeText, kappaText, meaningOf } from '#web/features/reports/agreement-words.ts';
import { goodSurvey } from '#tests/shared/surveys/example.ts';

const differing: Agreement['differences'] = [
  { criterionId: 'casing.mount', title: 'Base', first: 'sound', second: 'attention', steps: 2 },
];
const at = (kappa: number | null, differences = differing, common = 33): Agreement => ({
  common,
  kappa,
  differences,
});

describe('how far two surveys agree, in words', () => {
  it('gives kappa to two places, and none where it is not defined', () => {
    expect(kappaText(0.352_941)).toBe('0.35');
    expect(kappaText(1)).toBe('1.00');
    expect(kappaText(-0.001)).toBe('0.00');
    expect(kappaText(null)).toBeNull();
  });

  it('has other words for each, from agreed to opposed', () => {
    const said = [0.95, 0.8, 0.5, 0.2, 0, -0.5].map((kappa) => meaningOf(at(kappa)));
    expect(new Set(said).size).toBe(6);
  });

  it('says why no figure can be given', () => {
    const alike = agreementOf(goodSurvey(), goodSurvey());
    expect(alike.kappa).toBeNull();
    expect(meaningOf(alike)).toMatch(/one and the same grade/);
    expect(meaningOf(at(null, [], 0))).toMatch(/no item in common/);
    expect(meaningOf(at(null, [], 1))).toMatch(/Only one item/);
  });

  it('counts what is alike', () => {
    expect(alikeText(at(0.5))).toBe('32 of 33 items that both graded got the same grade.');
  });
});
