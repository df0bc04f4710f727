import { work } from './working.ts';
import type { Line } from './working.ts';

/** Pitch of a BA thread by its number. */
export const baPitch = (number: number): Line =>
  work({
    result: ['p', 'Pitch', 'length'],
    formula: '{p_0}·0.9^{n}',
    terms: { p_0: ['Pitch of 0 BA', 'length', 1], n: ['BA number', 'count', number] },
    compute: ({ p_0, n }) => p_0 * 0.9 ** n,
    source: 'ba-thread',
    holds: '0 to 16 BA; tables round to hundredths',
  });

/** Outside diameter of a BA thread by its pitch, mm. */
export const baDiameter = (pitchMm: number): Line =>
  work({
    result: ['D', 'Outside diameter', 'length'],
    formula: '6·{p}^1.2',
    terms: { p: ['Pitch', 'length', pitchMm] },
    compute: ({ p }) => 6 * p ** 1.2,
    source: 'ba-thread',
    holds: 'In millimetres; tables round to tenths',
    units: 'metric',
  });
