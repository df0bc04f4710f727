import { absolutePressure, saturatedLines } from '../engineering/saturation.ts';
import { barLitresLine, mainPartBarLitres } from '../engineering/papers.ts';
import { evaporationBySurface } from '../engineering/evaporation.ts';
import { testPressure } from '../engineering/hydraulic-test.ts';
import { isRefusal } from '../engineering/working.ts';
import type { Line, Term } from '../engineering/working.ts';
import { weakestOf, partsOf } from '../surveys/parts.ts';
import type { Inputs } from './calculator.ts';
import { calculatorOf } from './index.ts';
import {
  balanceInputs,
  barLitresInputs,
  evaporationInputs,
  gaugeInputs,
  hydraulicInputs,
  jetInputs,
  partsInputs,
  steamInputs,
  testPercent,
  valveInputs,
} from './from-boiler.ts';
import type { KnownBoiler } from './from-boiler.ts';

/** Something that follows from a boiler's figures, with the calculator that shows how, filled in. */
export interface Implied {
  label: string;
  /** One figure, or the two ends of a band. */
  figures: readonly Term[];
  note: string | null;
  calculator: string;
  inputs: Inputs;
}

const results = (...lines: readonly Line[]): Term[] => lines.map(({ result }) => result);

function steamMade(boiler: KnownBoiler): Implied {
  const timed = boiler.record?.steam?.evaporationKgPerH ?? null;
  const estimated = evaporationBySurface(boiler.facts.firing, boiler.facts.dimensions.heatingSurfaceM2);
  const isTimed = timed !== null;
  return {
    label: isTimed ? 'Steam made, timed' : 'Steam made, estimated',
    figures: isTimed
      ? [{ symbol: 'W', label: 'Steam made', value: timed, quantity: 'massRate' }]
      : isRefusal(estimated)
        ? []
        : results(estimated.low, estimated.high),
    note: !isTimed && isRefusal(estimated) ? estimated.text : null,
    calculator: 'evaporation',
    inputs: evaporationInputs(boiler),
  };
}

function partsImplied(boiler: KnownBoiler): Implied {
  const parts = partsOf(boiler.facts, boiler.items);
  const weakest = weakestOf(parts);
  const gaps = parts.filter(({ standsPa }) => standsPa === null).length;
  return {
    label:
      weakest === null ? 'What the parts stand' : `Weakest part worked out: ${weakest.title.toLowerCase()}`,
    figures: weakest?.governing ? [weakest.governing.result] : [],
    note:
      weakest === null
        ? (parts.find(({ refusal }) => refusal !== null)?.refusal?.text ?? null)
        : `${weakest.isMeasured ? 'As measured.' : 'On the seller’s figures.'}${gaps > 0 ? ` ${String(gaps)} of ${String(parts.length)} parts cannot be worked out yet.` : ''}`,
    calculator: 'pressure-by-parts',
    inputs: partsInputs(boiler),
  };
}

/** What follows from the figures of a boiler, each with its working. The code and the inspector decide the rest. */
export function impliedBy(boiler: KnownBoiler): Implied[] {
  const { facts } = boiler;
  const steam = saturatedLines(facts.workingPressurePa);
  const product = barLitresLine(facts.workingPressurePa, facts.waterCapacityL);
  const percent = testPercent(boiler);
  return [
    {
      label: 'Temperature of its steam',
      figures: results(isRefusal(steam) ? absolutePressure(facts.workingPressurePa) : steam.temperature),
      note: null,
      calculator: 'saturated-steam',
      inputs: steamInputs(boiler),
    },
    {
      label: `Hydraulic test, ${String(percent / 100)} times`,
      figures: results(testPressure(facts.workingPressurePa, percent)),
      note: null,
      calculator: 'hydraulic-test',
      inputs: hydraulicInputs(boiler),
    },
    {
      label: 'Bar·litres',
      figures: results(product),
      note:
        product.result.value < mainPartBarLitres
          ? 'The small-boiler part of the UK hobby code usually applies.'
          : 'The main part of the UK hobby code usually applies.',
      calculator: 'bar-litres',
      inputs: barLitresInputs(boiler),
    },
    partsImplied(boiler),
    steamMade(boiler),
  ];
}

interface FilledIn {
  title: string;
  calculator: string;
  inputs: Inputs;
}

/** The calculators that a boiler's figures can be put through, with those figures. */
export function workingsOf(boiler: KnownBoiler): FilledIn[] {
  const filledIn: readonly (readonly [calculator: string, inputs: Inputs | null])[] = [
    ['pressure-by-parts', partsInputs(boiler)],
    ['hydraulic-test', hydraulicInputs(boiler)],
    ['pressure-gauge', gaugeInputs(boiler)],
    ['safety-valve', valveInputs(boiler)],
    ['evaporation', evaporationInputs(boiler)],
    ['gas-jet', jetInputs(boiler)],
    ['steam-balance', balanceInputs(boiler)],
    ['saturated-steam', steamInputs(boiler)],
    ['bar-litres', barLitresInputs(boiler)],
  ];
  return filledIn.flatMap(([calculator, inputs]) =>
    inputs === null ? [] : [{ title: calculatorOf(calculator)?.title ?? '', calculator, inputs }],
  );
}
