import { figureText, listedText } from '../engineering/quantities.ts';
import type { UnitSystem } from '../engineering/quantities.ts';
import type { Measurement } from './record.ts';
import type { Figure } from './result.ts';
import type { MeasurementSpec } from './rubric/types.ts';

/** A figure of a result as a reader of these units writes it. */
export function figureWords({ value, unit }: Pick<Figure, 'value' | 'unit'>, units: UnitSystem): string {
  switch (unit) {
    case 'Pa':
      return listedText('pressure', units, value);
    case 'mm':
      return listedText('length', units, value);
    case 'L':
      return listedText('volume', units, value);
    case 'count':
      return figureText(value);
    case '%':
      return `${figureText(value, 3)} %`;
    case 'day':
      return value === 1 ? '1 day' : `${figureText(value)} days`;
    case 'ppm':
    case 'kg/h':
    case 'min':
    case 'bar·L':
    case 'kW':
      return `${figureText(Math.round(value * 100) / 100)} ${unit}`;
    default:
      return unit satisfies never;
  }
}

/** What was measured, in words: a figure with its unit, yes or no, or the words of a choice. */
export function measuredWords(spec: MeasurementSpec, value: Measurement['value'], units: UnitSystem): string {
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return spec.choices.find(({ id }) => id === value)?.label ?? value;
  switch (spec.unit) {
    case 'Pa/min':
      return `${figureWords({ value, unit: 'Pa' }, units)} a minute`;
    case 'text':
    case 'yes-no':
    case 'choice':
      return String(value);
    case 'Pa':
    case 'mm':
    case 'ppm':
    case 'kg/h':
    case 'L':
    case 'count':
      return figureWords({ value, unit: spec.unit }, units);
    default:
      return spec.unit satisfies never;
  }
}
