import type { MaterialId } from '../boilers/boiler.ts';
import { atmospherePa, saturationTemperatureK } from './steam.ts';
import { fahrenheitZeroK, kelvinPerFahrenheit, paPerPsi } from './units.ts';
import { notPublished, work } from './working.ts';
import type { Answer, Line } from './working.ts';

/** Allowable stress, psi, by metal temperature, °F; straight lines between. */
type StressTable = readonly (readonly [fahrenheit: number, psi: number])[];

/** Annealed copper: brazed work is always annealed. */
const annealedCopper: StressTable = [
  [100, 6_000],
  [150, 5_100],
  [200, 4_900],
  [250, 4_800],
  [300, 4_700],
  [350, 4_000],
  [400, 3_000],
];
const stainless304: StressTable = [
  [100, 20_000],
  [200, 16_700],
  [300, 15_000],
  [400, 13_800],
  [500, 12_900],
];

/** How much hotter than the steam metal in the fire is taken to be. */
export const fireMarginK = 15;

/** Metal temperature, K: saturation at a gauge pressure, and a margin for metal the fire touches. */
export const metalTemperature = (pressurePa: number, marginK: number): Line =>
  work({
    result: ['T', 'Temperature of the metal', 'temperature'],
    formula: '{T_s} + {ΔT}',
    terms: {
      T_s: ['Steam at working pressure', 'temperature', saturationTemperatureK(pressurePa + atmospherePa)],
      ΔT: ['Margin for the fire', 'temperatureRise', marginK],
    },
    compute: ({ T_s, ΔT }) => T_s + ΔT,
    source: marginK === 0 ? 'steam-saturation' : 'metal-margin',
    holds: 'Metal wetted on the other side. Metal above the water is hotter than this',
  });

const kelvinOf = (fahrenheit: number): number => fahrenheit * kelvinPerFahrenheit + fahrenheitZeroK;

function fromTable(table: StressTable, temperatureK: number, line: Pick<Line, 'source' | 'holds'>): Answer {
  // To a millionth of a degree, so that a figure on the table is found there however it was converted.
  const kelvin = Math.round(temperatureK * 1e6) / 1e6;
  const after = table.findIndex(([fahrenheit]) => kelvin <= Math.round(kelvinOf(fahrenheit) * 1e6) / 1e6);
  const right = table[after];
  if (right === undefined || Number.isNaN(kelvin)) {
    const last = table.at(-1)?.[0] ?? 0;
    return notPublished(
      `No allowable stress is published here for this metal above ${String(last)} °F (${String(Math.round((last - 32) / 1.8))} °C).`,
    );
  }
  const left = table[after - 1];
  if (left === undefined)
    return work({
      result: ['S', 'Allowable stress', 'stress'],
      formula: '{S_1}',
      terms: { S_1: ['At the coolest of the table, and below it', 'stress', right[1] * paPerPsi] },
      compute: ({ S_1 }) => S_1,
      ...line,
    });
  return work({
    result: ['S', 'Allowable stress', 'stress'],
    formula: '{S_1} + ({S_2} − {S_1})·({T} − {T_1}) / ({T_2} − {T_1})',
    terms: {
      T: ['Temperature of the metal', 'temperature', kelvin],
      T_1: ['Cooler entry of the table', 'temperature', kelvinOf(left[0])],
      T_2: ['Hotter entry', 'temperature', kelvinOf(right[0])],
      S_1: ['Stress at the cooler', 'stress', left[1] * paPerPsi],
      S_2: ['Stress at the hotter', 'stress', right[1] * paPerPsi],
    },
    compute: ({ T, T_1, T_2, S_1, S_2 }) => S_1 + ((S_2 - S_1) * (T - T_1)) / (T_2 - T_1),
    ...line,
  });
}

const steelMostK = 273.15 + 200;
const steelStressPa = 95_000_000;

/**
 * Allowable stress of a metal, Pa, at a temperature, K.
 *
 * Refused where none is published here: brass at any heat, copper above 400 °F, type 304 above 500 °F, mild steel above
 * 200 °C.
 */
export function allowableStress(material: MaterialId, temperatureK: number): Answer {
  switch (material) {
    case 'copper':
    case 'copper-brass':
      return fromTable(annealedCopper, temperatureK, {
        source: 'copper-stress',
        holds: 'Annealed copper up to 400 °F (204 °C); below 100 °F the figure for 100 °F',
      });
    case 'stainless':
      return fromTable(stainless304, temperatureK, {
        source: 'stainless-stress',
        holds: 'Type 304 up to 500 °F (260 °C); below 100 °F the figure for 100 °F',
      });
    case 'steel':
      return temperatureK > steelMostK
        ? notPublished('No allowable stress is given here for mild steel above 200 °C (392 °F).')
        : work({
            result: ['S', 'Allowable stress', 'stress'],
            formula: '{S_1}',
            terms: { S_1: ['Mild steel', 'stress', steelStressPa] },
            compute: ({ S_1 }) => S_1,
            source: 'steel-stress',
            holds: 'Mild steel plate and tube of no known grade, up to 200 °C',
          });
    case 'brass':
      return notPublished(
        'No allowable stress for brass is published here: it loses its zinc to hot water, and grades differ.',
      );
    default:
      return material satisfies never;
  }
}

/** Young’s modulus, Pa, and Poisson’s ratio; from general handbooks. */
export const elasticity: Record<MaterialId, { youngPa: number; poisson: number }> = {
  copper: { youngPa: 117e9, poisson: 0.34 },
  'copper-brass': { youngPa: 117e9, poisson: 0.34 },
  brass: { youngPa: 105e9, poisson: 0.34 },
  steel: { youngPa: 200e9, poisson: 0.3 },
  stainless: { youngPa: 190e9, poisson: 0.3 },
};
