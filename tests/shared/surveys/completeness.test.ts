import { describe, expect, it } from 'vitest';
import { missingForFiling } from '#shared/surveys/completeness.ts';
import { contradictions } from '#shared/surveys/contradictions.ts';
import type { SurveyInput } from '#shared/surveys/examined.ts';
import { emptyRecord } from '#shared/surveys/record.ts';
import { criteriaFor, rubricVersion } from '#shared/surveys/rubric/index.ts';
import { goodFacts, goodHydraulic, goodSteam, goodSurvey, withFinding } from './example.ts';

const photo = '7d0c2b1e-5c58-4d5e-9f3a-0a4b7c9d1e2f';
const defect = (code: string) => ({ code, where: '', note: '', remedy: null, allowance: null });
const missing = ({ facts, record, scope }: SurveyInput, photoIds: string[] = []) =>
  missingForFiling(facts, record, scope, { photoIds }).map(({ sentence }) => sentence);
const odd = ({ facts, record }: SurveyInput) => contradictions(facts, record).map(({ sentence }) => sentence);

describe('what is missing before filing', () => {
  it('is nothing for a whole survey', () => {
    expect(missing(goodSurvey())).toEqual([]);
  });

  it('is every criterion that applies, the day and the tests, for an empty one', () => {
    const list = missingForFiling(goodFacts, emptyRecord(rubricVersion), 'full', { photoIds: [] });
    expect(list.filter(({ criterionId }) => criterionId !== null)).toHaveLength(
      criteriaFor(goodFacts).length,
    );
    expect(list.map(({ pointer }) => pointer)).toEqual(
      expect.arrayContaining(['#/examinedOn', '#/hydraulic', '#/steam']),
    );
  });

  it('asks a bad grade for a defect, and for a photograph or a measurement', () => {
    const bad = withFinding('shell.barrel', { grade: 'attention' });
    expect(missing(bad)).toEqual([
      'Barrel: name the defect behind the grade.',
      'Barrel: add a photograph or a measurement that shows it.',
    ]);
    const shown = { grade: 'attention' as const, defects: [defect('barrel-pitting')], photoIds: [photo] };
    expect(missing(withFinding('shell.barrel', shown), [photo])).toEqual([]);
    expect(missing(withFinding('shell.barrel', shown))).toContain(
      'Barrel: a photograph has not arrived yet.',
    );
    const measurements = [{ quantity: 'dentDepthMm', value: 1.2 }];
    expect(missing(withFinding('shell.barrel', { ...shown, photoIds: [], measurements }))).toEqual([]);
  });

  it('asks why a thing was not examined, and how a graded one was', () => {
    expect(missing(withFinding('casing.finish', { grade: 'notExamined', ways: [] }))).toEqual([
      'Paint and finish: say why it was not examined.',
    ]);
    expect(missing(withFinding('casing.finish', { ways: [] }))).toEqual([
      'Paint and finish: say how it was examined.',
    ]);
  });

  it('asks only for the tests in the scope, or for the reason there was none', () => {
    const bare = goodSurvey({ hydraulic: null, steam: null });
    expect(missing({ ...bare, scope: 'external' })).toEqual([]);
    expect(missing({ ...bare, scope: 'hydraulic' })).toEqual([
      'Record the hydraulic test, or say why there was none.',
    ]);
    const told = goodSurvey({ steam: null, noSteamReason: 'The seller had no gas.' });
    expect(missing(told)).toEqual([]);
  });

  it('asks for the instruments by name', () => {
    expect(missing(goodSurvey({ instruments: [] }))).toEqual([
      'Name the test pressure gauge used for the hydraulic test.',
      'Name the carbon monoxide meter used for carbon monoxide at the operator.',
    ]);
  });

  it('points at the finding in the record', () => {
    const survey = withFinding('shell.barrel', { grade: 'attention' });
    const index = survey.record.findings.findIndex(({ criterionId }) => criterionId === 'shell.barrel');
    const [first] = missingForFiling(survey.facts, survey.record, 'full', { photoIds: [] });
    expect(first?.pointer).toBe(`#/findings/${String(index)}/defects`);
  });
});

describe('where a record contradicts itself', () => {
  it('is nowhere in a whole survey', () => {
    expect(odd(goodSurvey())).toEqual([]);
  });

  const measurements = [
    { quantity: 'fullScalePa', value: 700_000 },
    { quantity: 'workingPointErrorPa', value: -40_000 },
  ];
  it.each([
    [
      'a gauge graded Sound that is out',
      withFinding('safety.gauge', { measurements }),
      /class 2\.5\. The item is graded Sound/,
    ],
    [
      'Sound with a crack',
      withFinding('shell.plates', { defects: [defect('plates-crack')] }),
      /graded Sound, though “crack/,
    ],
    [
      'Sound with a defect that wants attention',
      withFinding('shell.barrel', { defects: [defect('barrel-weep')] }),
      /graded Sound, though “weep/,
    ],
    ['attention without a defect', withFinding('shell.barrel', { grade: 'attention' }), /no defect is named/],
    [
      'a defect of another criterion',
      withFinding('shell.barrel', { defects: [defect('plates-crack')] }),
      /not in its defect catalogue/,
    ],
    [
      'a way of another criterion',
      withFinding('casing.finish', { ways: ['sight', 'steam'] }),
      /not a way of examining it/,
    ],
    [
      'a thing not measured there',
      withFinding('casing.finish', { measurements: [{ quantity: 'jetMm', value: 1 }] }),
      /is not measured here/,
    ],
    [
      'a figure out of its range',
      withFinding('shell.barrel', { measurements: [{ quantity: 'thinnestMm', value: 90 }] }),
      /at most 25 mm/,
    ],
    [
      'a figure in words',
      withFinding('shell.barrel', { measurements: [{ quantity: 'thinnestMm', value: 'thin' }] }),
      /is a figure/,
    ],
    [
      'Not fitted though listed',
      withFinding('safety.blowdown', { grade: 'notFitted', ways: [] }),
      /though the listing has/,
    ],
    [
      'two findings on one thing',
      goodSurvey({ findings: [...goodSurvey().record.findings, goodSurvey().record.findings[0]!] }),
      /two findings/,
    ],
    ['a way without its test', goodSurvey({ steam: null }), /no steam test is recorded/],
    [
      'a hold that ends before it begins',
      goodSurvey({ hydraulic: { ...goodHydraulic, holdEndMinute: 2 } }),
      /ends before it begins/,
    ],
    [
      'a valve that reseats above its lift',
      goodSurvey({ steam: { ...goodSteam, valveReseatsAtPa: 410_000 } }),
      /reseats above/,
    ],
  ] as const)('%s', (_, survey, sentence) => {
    expect(odd(survey).some((text) => sentence.test(text))).toBe(true);
  });
});
