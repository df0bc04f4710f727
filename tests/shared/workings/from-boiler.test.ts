import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { examinedOf } from '#shared/surveys/examined.ts';
import { partsOf } from '#shared/surveys/parts.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { calculatorOf } from '#shared/workings/index.ts';
import { impliedBy, workingOfCheck } from '#shared/workings/implied.ts';
import { engineInputs, partsInputs } from '#shared/workings/from-boiler.ts';
import type { KnownBoiler } from '#shared/workings/from-boiler.ts';
import { matchOnBoiler } from '#shared/workings/match.ts';
import { anyFacts } from '../surveys/arbitrary.ts';
import { goodFacts, goodSurvey, withFinding } from '../surveys/example.ts';

const known = ({ facts, record } = goodSurvey()): KnownBoiler => ({
  facts,
  record,
  items: examinedOf({ facts, record }),
});

const engine = {
  boreMm: 19.05,
  strokeMm: 19.05,
  cylinders: 1,
  action: 'double',
  speedRpm: 300,
  cutOffPercent: 75,
  pressurePa: 300_000,
} as const;

describe('a boiler’s figures filled into the calculators', () => {
  test('every one is taken as it is, whatever the boiler', () => {
    fc.assert(
      fc.property(anyFacts, (facts) => {
        const boiler: KnownBoiler = { facts, items: [], record: null };
        const checks = scoreSurvey(goodSurvey()).checks;
        const all = [...impliedBy(boiler), ...checks.flatMap(({ id }) => workingOfCheck(boiler, id) ?? [])];
        for (const { calculator, inputs } of all) {
          const read = calculatorOf(calculator)!.schema.safeParse(inputs);
          expect(read.error?.issues ?? []).toEqual([]);
        }
      }),
      { numRuns: 300 },
    );
  });

  test('the page works out what the report did', () => {
    const survey = withFinding('shell.barrel', { measurements: [{ quantity: 'thinnestMm', value: 1.7 }] });
    const boiler = known(survey);
    const calculator = calculatorOf('pressure-by-parts')!;
    const { answers } = calculator.work(calculator.schema.parse(partsInputs(boiler)));
    const onPage = answers.find(({ label }) => label === 'Barrel')?.value;
    const inReport = partsOf(boiler.facts, boiler.items).find(({ id }) => id === 'barrel')?.standsPa;
    expect(onPage).toBe(inReport);
  });

  test('what nobody measured is left open, not taken from the example', () => {
    const facts = { ...goodFacts, dimensions: { ...goodFacts.dimensions, tubeThicknessMm: null } };
    expect(partsInputs({ facts, items: [], record: null })).toMatchObject({
      tubeWallMm: null,
      pitchMm: null,
      stayMm: null,
    });
  });

  test('an engine on it: the page agrees with the listing, and measured steam beats estimated', () => {
    const boiler = known();
    const found = matchOnBoiler(boiler, engine)!;
    const calculator = calculatorOf('engine')!;
    const { answers } = calculator.work(calculator.schema.parse(engineInputs(boiler, engine)));
    expect(answers[0]?.value).toBe(found.ratio.low.result.value);
    // The good survey timed 2 kg/h; its heating surface would have said 1.5 to 3.
    expect(found.ratio.low.terms.find(({ symbol }) => symbol === 'W')?.value).toBe(2);
    const unsurveyed = matchOnBoiler({ ...boiler, record: null }, engine)!;
    expect(unsurveyed.ratio.low.terms.find(({ symbol }) => symbol === 'W')?.value).toBeCloseTo(1.5, 9);
  });
});
