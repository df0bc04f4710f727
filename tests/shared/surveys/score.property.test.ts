import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { boilerTypeIds } from '#shared/boilers/boiler-types.ts';
import { firings, fittings } from '#shared/boilers/boiler.ts';
import type { FiringId, FittingId } from '#shared/boilers/boiler.ts';
import { allowanceOf } from '#shared/surveys/allowance.ts';
import { canonicalJson } from '#shared/surveys/canonical.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import type { Finding, Grade } from '#shared/surveys/record.ts';
import { surveyResult } from '#shared/surveys/result.ts';
import { criteriaFor, sharesFor } from '#shared/surveys/rubric/index.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { verdicts } from '#shared/surveys/verdicts.ts';
import { anyDefect, anyFacts, anyScope, anySurvey, examinedGrades } from './arbitrary.ts';
import { goodRecord } from './example.ts';

const cases = { numRuns: 1_000 };
const rank = (id: string) => Object.keys(verdicts).indexOf(id);
const isGraded = (grade: Grade) => (examinedGrades as readonly Grade[]).includes(grade);

const changed = (survey: SurveyInput, index: number, change: Partial<Finding>): SurveyInput => ({
  ...survey,
  record: {
    ...survey.record,
    findings: survey.record.findings.map((finding, at) =>
      at === index ? { ...finding, ...change } : finding,
    ),
  },
});

/** A survey, and one of its findings picked at random. */
const anySurveyAndFinding = fc
  .tuple(
    anySurvey.filter((survey) => survey.record.findings.length > 0),
    fc.nat(),
  )
  .map(([survey, pick]) => {
    const index = pick % survey.record.findings.length;
    const finding = survey.record.findings[index]!;
    const criterion = criteriaFor(survey.facts).find((each) => each.id === finding.criterionId)!;
    return { survey, index, finding, criterion };
  });

// Every key of every object in the opposite order.
const reversed = (value: unknown): unknown => {
  if (Array.isArray(value)) return value.map(reversed);
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(
    Object.entries(value)
      .toReversed()
      .map(([key, member]) => [key, reversed(member)]),
  );
};

describe('properties of the score, over random surveys', () => {
  it('a worse grade never raises Condition and never improves the verdict', () => {
    fc.assert(
      fc.property(anySurveyAndFinding, fc.nat(), ({ survey, index, finding }, step) => {
        fc.pre(isGraded(finding.grade) && finding.grade !== 'unfit');
        const worse = examinedGrades.slice((examinedGrades as readonly Grade[]).indexOf(finding.grade) + 1);
        const before = scoreSurvey(survey);
        const after = scoreSurvey(changed(survey, index, { grade: worse[step % worse.length]! }));
        expect(after.condition ?? -1).toBeLessThanOrEqual(before.condition ?? -1);
        expect(rank(after.verdict.id)).toBeGreaterThanOrEqual(rank(before.verdict.id));
      }),
      cases,
    );
  });

  it('another way of examining never lowers Evidence', () => {
    fc.assert(
      fc.property(anySurveyAndFinding, fc.nat(), ({ survey, index, finding, criterion }, pick) => {
        const way = criterion.ways[pick % criterion.ways.length]!.id;
        const before = scoreSurvey(survey);
        const after = scoreSurvey(changed(survey, index, { ways: [...finding.ways, way] }));
        expect(after.evidence).toBeGreaterThanOrEqual(before.evidence);
        expect(after.safetyEvidence).toBeGreaterThanOrEqual(before.safetyEvidence);
        for (const [at, section] of after.sections.entries())
          expect(section.evidence ?? 0).toBeGreaterThanOrEqual(before.sections[at]!.evidence ?? 0);
      }),
      cases,
    );
  });

  it('another defect never lowers the allowance', () => {
    const withDefect = anySurveyAndFinding.chain((picked) =>
      anyDefect(picked.criterion).map((defect) => ({ ...picked, defect })),
    );
    fc.assert(
      fc.property(withDefect, ({ survey, index, finding, defect }) => {
        const before = allowanceOf(survey.facts, survey.record);
        const more = changed(survey, index, { defects: [...finding.defects, defect] });
        const after = allowanceOf(more.facts, more.record);
        expect(after.total.lowMinor).toBeGreaterThanOrEqual(before.total.lowMinor);
        expect(after.total.highMinor).toBeGreaterThanOrEqual(before.total.highMinor);
      }),
      cases,
    );
  });

  it('the allowance is whole pence, low never above high, and its parts add up to its total', () => {
    fc.assert(
      fc.property(anySurvey, fc.integer({ min: 0, max: 12_000 }), ({ facts, record }, rate) => {
        const { groups, retestCosts, total } = allowanceOf(facts, record, rate);
        const retest = retestCosts.reduce((sum, cost) => sum + cost.minor, 0);
        const lines = groups.flatMap((group) => group.lines);
        expect(total.lowMinor).toBe(lines.reduce((sum, line) => sum + line.lowMinor, retest));
        expect(total.highMinor).toBe(lines.reduce((sum, line) => sum + line.highMinor, retest));
        expect(total.lowMinor).toBeLessThanOrEqual(total.highMinor);
        expect(Number.isSafeInteger(total.lowMinor) && Number.isSafeInteger(total.highMinor)).toBe(true);
      }),
      cases,
    );
  });

  it('the order of findings, photographs, ways, defects and keys changes nothing', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const { record } = survey;
        const shuffled: SurveyInput = {
          ...survey,
          record: {
            ...record,
            findings: record.findings.toReversed().map((finding) => ({
              ...finding,
              ways: finding.ways.toReversed(),
              defects: finding.defects.toReversed(),
              measurements: finding.measurements.toReversed(),
              photoIds: finding.photoIds.toReversed(),
            })),
            instruments: record.instruments.toReversed(),
          },
        };
        const turned = reversed(shuffled) as SurveyInput;
        expect(canonicalJson(scoreSurvey(turned))).toBe(canonicalJson(scoreSurvey(survey)));
      }),
      cases,
    );
  });

  it('scoring twice gives the same bytes, and a result is what its schema says', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const first = scoreSurvey(survey);
        expect(JSON.stringify(scoreSurvey(structuredClone(survey)))).toBe(JSON.stringify(first));
        expect(surveyResult.parse(JSON.parse(JSON.stringify(first)))).toEqual(first);
      }),
      cases,
    );
  });

  it('one safety-critical item Unfit is Do not steam, whatever else', () => {
    const oneUnfit = fc.tuple(anyFacts, anyScope, fc.nat()).map(([facts, scope, pick]) => {
      const critical = criteriaFor(facts).filter((criterion) => criterion.safetyCritical);
      const { id } = critical[pick % critical.length]!;
      const record = goodRecord(facts);
      const findings = record.findings.map((finding) =>
        finding.criterionId === id ? { ...finding, grade: 'unfit' as const } : finding,
      );
      return { id, survey: { facts, scope, record: { ...record, findings } } };
    });
    fc.assert(
      fc.property(oneUnfit, ({ id, survey }) => {
        const { verdict, reasons, condition } = scoreSurvey(survey);
        expect(verdict.id).toBe('do-not-steam');
        expect(condition).toBeGreaterThan(80);
        expect(reasons).toContainEqual(
          expect.objectContaining({ rule: 'safety-critical-unfit', criterionId: id }),
        );
      }),
      cases,
    );
  });

  it('Condition lies between the lowest and the highest section mean', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const { condition, sections } = scoreSurvey(survey);
        fc.pre(condition !== null);
        const means = sections.flatMap((section) => section.mean ?? []);
        expect(condition).toBeGreaterThanOrEqual(Math.min(...means));
        expect(condition).toBeLessThanOrEqual(Math.max(...means));
      }),
      cases,
    );
  });

  it('leaving out what does not apply keeps the ratios of the rest', () => {
    const anyApplicable = fc.record({
      type: fc.constantFrom(...boilerTypeIds),
      fittings: fc.uniqueArray(fc.constantFrom(...(Object.keys(fittings) as FittingId[]))),
      firing: fc.constantFrom(...(Object.keys(firings) as FiringId[])),
    });
    fc.assert(
      fc.property(anyApplicable, anyApplicable, (one, other) => {
        const a = sharesFor(one);
        const b = sharesFor(other);
        const common = [...a.keys()].filter((id) => b.has(id));
        const [first] = common;
        for (const id of common)
          expect(a.get(id)! / a.get(first!)!).toBeCloseTo(b.get(id)! / b.get(first!)!, 12);
        expect([...a.values()].reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
      }),
      cases,
    );
  });

  it('In steaming order is never given without both tests and four fifths of the evidence', () => {
    // Starting from a good survey, so that a fair part of the cases do come out in steaming order.
    const nearlyGood = anyFacts.chain((facts) => {
      const good = goodRecord(facts);
      return fc
        .record({
          hydraulic: fc.constantFrom(good.hydraulic, good.hydraulic, null),
          steam: fc.constantFrom(good.steam, good.steam, null),
          keep: fc.subarray(good.findings, { minLength: Math.ceil(good.findings.length * 0.7) }),
        })
        .map(({ hydraulic, steam, keep }) => ({
          facts,
          scope: 'full' as const,
          record: { ...good, hydraulic, steam, findings: keep },
        }));
    });
    fc.assert(
      fc.property(nearlyGood, (survey) => {
        const { verdict, safetyEvidence } = scoreSurvey(survey);
        if (verdict.id !== 'in-steaming-order') return;
        expect(survey.record.hydraulic).not.toBeNull();
        expect(survey.record.steam).not.toBeNull();
        expect(safetyEvidence).toBeGreaterThanOrEqual(80);
      }),
      cases,
    );
  });
});
