import { absolutePressure, saturatedLines } from '../engineering/saturation.ts';
import { barLitresLine, mainPartBarLitres } from '../engineering/papers.ts';
import { evaporationBySurface } from '../engineering/evaporation.ts';
import { testPressure } from '../engineering/hydraulic-test.ts';
import { isRefusal } from '../engineering/working.ts';
import type { Line, Term } from '../engineering/working.ts';
import { weakestOf, partsOf } from '../surveys/parts.ts';
import type { Inputs } from './calculator.ts';
import {
  balanceInputs,
  barLitresInputs,
  evaporationInputs,
  gaugeInputs,
  hydraulicInputs,
  jetInputs,
  jointsInputs,
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

/** A calculator with figures filled in. */
export interface FilledIn {
  calculator: string;
  inputs: Inputs;
}

const fillers: Readonly<Record<string, (boiler: KnownBoiler) => Inputs | null>> = {
  'pressure-by-parts': partsInputs,
  joints: jointsInputs,
  'hydraulic-test': hydraulicInputs,
  'pressure-gauge': gaugeInputs,
  'safety-valve': valveInputs,
  'gas-jet': jetInputs,
  'steam-balance': balanceInputs,
  'bar-litres': barLitresInputs,
};

/** The calculator that works out what an engineering check of a report goes by. */
const calculatorOfCheck: Readonly<Record<string, string>> = {
  'bar-litres': 'bar-litres',
  'hydraulic-test': 'hydraulic-test',
  'parts-pressure': 'pressure-by-parts',
  'joint-material': 'joints',
  'gauge-range': 'pressure-gauge',
  'gauge-error': 'pressure-gauge',
  'valve-lift': 'safety-valve',
  accumulation: 'safety-valve',
  'valve-reseat': 'safety-valve',
  'valve-capacity': 'safety-valve',
  'water-reserve': 'steam-balance',
  'feed-rate': 'steam-balance',
  'gas-heat': 'gas-jet',
};

/** The working behind an engineering check, with this boiler's figures; null where there is none, or too little to fill it in with. */
export function workingOfCheck(boiler: KnownBoiler, checkId: string): FilledIn | null {
  const calculator = calculatorOfCheck[checkId];
  const inputs = calculator === undefined ? null : (fillers[calculator]?.(boiler) ?? null);
  return calculator === undefined || inputs === null ? null : { calculator, inputs };
}
