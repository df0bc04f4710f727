import { mmPerInch } from './units.ts';
import { outOfRange, work } from './working.ts';
import type { Answer, Line } from './working.ts';

/** Fuel lost through ordinary scale: thickness in inches, loss in per cent. */
const lossTable = [
  [0, 0],
  [1 / 64, 1],
  [1 / 32, 2],
  [3 / 64, 3],
  [1 / 16, 3.9],
] as const;

/** Fuel lost through a thickness of scale. Refused past 1/16 in, where the table ends. */
export function scaleLoss(thicknessMm: number): Answer {
  const inches = thicknessMm / mmPerInch;
  const after = lossTable.findIndex(([thick]) => inches <= thick + 1e-9);
  const right = lossTable[Math.max(1, after)];
  const left = lossTable[Math.max(1, after) - 1];
  if (after < 0 || right === undefined || left === undefined)
    return outOfRange('The table of losses ends at 1/16 in (1.6 mm) of scale.');
  return work({
    result: ['l', 'Fuel lost', 'percent'],
    formula: '{l_1} + ({l_2} − {l_1})·({s} − {s_1}) / ({s_2} − {s_1})',
    terms: {
      s: ['Scale', 'length', thicknessMm],
      s_1: ['Thinner entry of the table', 'length', left[0] * mmPerInch],
      s_2: ['Thicker entry', 'length', right[0] * mmPerInch],
      l_1: ['Loss at the thinner', 'percent', left[1]],
      l_2: ['Loss at the thicker', 'percent', right[1]],
    },
    compute: ({ s, s_1, s_2, l_1, l_2 }) => l_1 + ((l_2 - l_1) * (s - s_1)) / (s_2 - s_1),
    source: 'scale-loss',
    holds: 'Ordinary scale up to 1/16 in; full-size boilers',
  });
}

/** g/mol. */
const citricAcid = 192.124;
const chalk = 100.087;
const carbonDioxide = 44.01;

/** Anhydrous citric acid that dissolves a weight of chalk scale: two parts of acid to three of chalk. */
export const acidForScale = (scaleG: number): Line =>
  work({
    result: ['m_a', 'Citric acid, anhydrous', 'smallMass'],
    formula: '{m}·2·192.124 / (3·100.087)',
    terms: { m: ['Chalk scale', 'smallMass', scaleG] },
    compute: ({ m }) => (m * 2 * citricAcid) / (3 * chalk),
    source: 'scale-acid',
    holds: 'Scale that is all chalk; gypsum and silica do not dissolve',
  });

/** Carbon dioxide that comes off. */
export const gasFromScale = (scaleG: number): Line =>
  work({
    result: ['m_g', 'Carbon dioxide given off', 'smallMass'],
    formula: '{m}·44.01 / 100.087',
    terms: { m: ['Chalk scale', 'smallMass', scaleG] },
    compute: ({ m }) => (m * carbonDioxide) / chalk,
    source: 'scale-acid',
    holds: 'Leave a way out for it',
  });
