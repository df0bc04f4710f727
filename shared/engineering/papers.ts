import type { MaterialId } from '../boilers/boiler.ts';
import { work } from './working.ts';
import type { Line } from './working.ts';

/** Bar·litres from which the main part of the UK hobby code applies rather than its small-boiler part. */
export const mainPartBarLitres = 3;

/** Working pressure times the whole volume. */
export const barLitresLine = (workingPa: number, volumeL: number): Line =>
  work({
    result: ['PV', 'Bar·litres', 'barLitres'],
    formula: '{P}·{V}',
    terms: {
      P: ['Working pressure', 'pressure', workingPa],
      V: ['Whole volume', 'volume', volumeL],
    },
    compute: ({ P, V }) => (P / 100_000) * V,
    source: 'bar-litres',
    holds: 'Gauge pressure and the whole inside, steam space too',
    units: 'metric',
  });

/** Classes of pressure-equipment law for fired boilers, in words. */
export const pressureLawClasses = {
  outside: 'Not over half a bar: outside the directive',
  practice: 'Up to 2 litres: sound engineering practice, article 4(3)',
  I: 'Category I',
  II: 'Category II',
  III: 'Category III',
  IV: 'Category IV',
} as const;
export type PressureLawClassId = keyof typeof pressureLawClasses;

/** Class of a fired boiler by Directive 2014/68/EU, annex II table 5; from memory. */
export function pressureLawClass(workingPa: number, volumeL: number): PressureLawClassId {
  const bar = workingPa / 100_000;
  const product = Math.round(bar * volumeL * 1e6) / 1e6;
  if (bar <= 0.5) return 'outside';
  if (volumeL <= 2) return 'practice';
  if (bar > 32 || volumeL > 1_000 || product > 3_000) return 'IV';
  if (product <= 50) return 'I';
  return product <= 200 ? 'II' : 'III';
}

/** Months after which a test is due again: one figure, or a band where it turns on which test it was. */
export interface DueMonths {
  low: number;
  high: number;
}

/** Months to the next hydraulic test. The inspector may ask for it sooner. */
export function hydraulicDueMonths(material: MaterialId, wasFirst: boolean | null): DueMonths {
  const isSteel = material === 'steel' || material === 'stainless';
  if (!isSteel || wasFirst === true) return { low: 48, high: 48 };
  return wasFirst === null ? { low: 24, high: 48 } : { low: 24, high: 24 };
}

/** Months to the next steam test. */
export const steamDueMonths: DueMonths = { low: 12, high: 12 };
