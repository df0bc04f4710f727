import { atmospherePa, saturatedAt, saturationPressurePaAbs, saturationTemperatureK } from './steam.ts';
import { outOfRange, work } from './working.ts';
import type { Answer, Line, Refusal } from './working.ts';

/** Most that the two regions used here hold for, Pa gauge. */
const mostPa = 16e6;

/** Steam and water in a boiler at a gauge pressure, line by line. Refused outside 0 to 160 bar. */
export interface SaturatedLines {
  absolute: Line;
  temperature: Line;
  waterVolume: Line;
  steamVolume: Line;
  waterHeat: Line;
  steamHeat: Line;
  latentHeat: Line;
}

const regions = 'Water and steam in balance, 0 to 160 bar gauge';

/** Absolute pressure from a gauge's, the atmosphere at 1.01325 bar. */
export const absolutePressure = (pressurePa: number): Line =>
  work({
    result: ['p_a', 'Absolute pressure', 'absolutePressure'],
    formula: '{p} + {p_0}',
    terms: {
      p: ['Gauge pressure', 'pressure', pressurePa],
      p_0: ['Atmosphere', 'absolutePressure', atmospherePa],
    },
    compute: ({ p, p_0 }) => p + p_0,
    source: 'geometry',
    holds: 'At sea level on an ordinary day',
  });

// IF97 is two pages of powers: the line names the equation rather than printing its 34 terms.
const property = (
  [symbol, label, quantity]: Parameters<typeof work>[0]['result'],
  value: number,
  source: 'steam-saturation' | 'steam-regions',
): Line =>
  work({
    result: [symbol, label, quantity],
    formula: `{${symbol}}`,
    terms: { [symbol]: [label, quantity, value] },
    compute: () => value,
    source,
    holds: regions,
  });

/** Every property of saturated water and steam that the workings use. */
export function saturatedLines(pressurePa: number): SaturatedLines | Refusal {
  if (!(pressurePa >= 0 && pressurePa <= mostPa))
    return outOfRange('Steam is worked out here from 0 to 160 bar (2,320 psi) gauge.');
  const { temperatureK, water, steam } = saturatedAt(pressurePa);
  return {
    absolute: absolutePressure(pressurePa),
    temperature: property(
      ['T_s', 'Temperature of the steam', 'temperature'],
      temperatureK,
      'steam-saturation',
    ),
    waterVolume: property(
      ['v_f', 'Volume of the water', 'specificVolume'],
      water.specificVolume,
      'steam-regions',
    ),
    steamVolume: property(
      ['v_g', 'Volume of the steam', 'specificVolume'],
      steam.specificVolume,
      'steam-regions',
    ),
    waterHeat: property(['h_f', 'Heat of the water', 'enthalpy'], water.enthalpy, 'steam-regions'),
    steamHeat: property(['h_g', 'Heat of the steam', 'enthalpy'], steam.enthalpy, 'steam-regions'),
    latentHeat: work({
      result: ['h_fg', 'Heat to turn water to steam', 'enthalpy'],
      formula: '{h_g} − {h_f}',
      terms: {
        h_g: ['Heat of the steam', 'enthalpy', steam.enthalpy],
        h_f: ['Heat of the water', 'enthalpy', water.enthalpy],
      },
      compute: ({ h_g, h_f }) => h_g - h_f,
      source: 'steam-regions',
      holds: regions,
    }),
  };
}

/** Gauge pressure of steam at a temperature, K. Refused below 100 °C, where a gauge shows nothing, and above 347 °C. */
export function pressureOfSteamAt(temperatureK: number): Answer {
  const least = saturationTemperatureK(atmospherePa);
  if (!(temperatureK >= least && temperatureK <= 620.5))
    return outOfRange('Steam under pressure is between 100 °C (212 °F) and 347 °C (657 °F).');
  const absolute = saturationPressurePaAbs(temperatureK);
  return work({
    result: ['p', 'Gauge pressure', 'pressure'],
    formula: '{p_a} − {p_0}',
    terms: {
      p_a: ['Saturation pressure at that temperature', 'absolutePressure', absolute],
      p_0: ['Atmosphere', 'absolutePressure', atmospherePa],
    },
    compute: ({ p_a, p_0 }) => Math.max(0, p_a - p_0),
    source: 'steam-saturation',
    holds: regions,
  });
}
