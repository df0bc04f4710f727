import { figureText, fromKept, unitOf } from '../engineering/quantities.ts';
import type { Quantity } from '../engineering/quantities.ts';
import type { Band } from '../engineering/evaporation.ts';

const bothOf = (quantity: Quantity, values: readonly number[]): string => {
  const [metric, imperial] = (['metric', 'imperial'] as const).map((units) => {
    const figures = [...new Set(values.map((value) => figureText(fromKept(quantity, units, value), 3)))];
    return `${figures.join(' to ')} ${unitOf(quantity, units)}`;
  });
  return `${metric ?? ''} (${imperial ?? ''})`;
};

/** A rate of water or steam in both the units in use, for a sentence. */
export const rateText = (kgPerH: number): string => bothOf('massRate', [kgPerH]);

/** The two ends of a band, in both. */
export const rateBandText = ({ low, high }: Band): string => bothOf('massRate', [low, high]);

/** A length in both. */
export const lengthText = (mm: number): string => bothOf('length', [mm]);
