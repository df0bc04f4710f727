import type { Units } from '#shared/accounts/contract.ts';
import type { MeasureUnit } from '#shared/surveys/rubric/types.ts';
import { toSi, unitOf } from '#web/lib/format.ts';

/** How a figure kept in SI is typed and shown. */
export interface Quantity {
  unit: string;
  places: number;
  /** What one shown unit is in the unit it is kept in. */
  factor: number;
}

const of = (quantity: 'pressure' | 'length' | 'volume', units: Units, places: number): Quantity => ({
  unit: unitOf(quantity, units),
  places,
  factor: toSi(quantity, units, 1),
});
/** Finer than a page shows: a surveyor reads a gauge to the half pound and a wall to the thou. */
const pressureIn = (units: Units) => of('pressure', units, units === 'imperial' ? 1 : 2);
const lengthIn = (units: Units) => of('length', units, units === 'imperial' ? 3 : 2);

/** A figure's unit as this person measures; null for what is not a figure. */
export function quantityOf(unit: MeasureUnit | 'min', units: Units): Quantity | null {
  switch (unit) {
    case 'Pa':
      return pressureIn(units);
    case 'Pa/min':
      return { ...pressureIn(units), unit: `${unitOf('pressure', units)} a minute` };
    case 'mm':
      return lengthIn(units);
    case 'ppm':
    case 'kg/h':
      return { unit, places: 1, factor: 1 };
    case 'min':
      return { unit: 'min', places: 1, factor: 1 };
    case 'L':
      return of('volume', units, 3);
    case 'count':
      return { unit: '', places: 0, factor: 1 };
    case 'text':
    case 'yes-no':
    case 'choice':
      return null;
    default:
      return unit satisfies never;
  }
}

/** A kept figure in the unit shown, without noughts at its end. */
export const shownText = (si: number, { factor, places }: Quantity): string =>
  String(Number((si / factor).toFixed(places)));
