import { atmospherePa, saturatedAt } from './steam.ts';
import { outOfRange, work } from './working.ts';
import type { Answer, Line } from './working.ts';

/** Test pressure wanted, Pa gauge, at a percentage of the working pressure. */
export const wantedTestPa = (workingPa: number, percent: number): number => (workingPa * percent) / 100;

/** Test pressure wanted, line by line. */
export const testPressure = (workingPa: number, percent: number): Line =>
  work({
    result: ['P_t', 'Test pressure', 'pressure'],
    formula: '{P}·{m}',
    terms: { P: ['Working pressure', 'pressure', workingPa], m: ['Multiple', 'percent', percent] },
    compute: ({ P, m }) => wantedTestPa(P, m),
    source: 'test-profile',
    holds: 'Water only, cold, all air let out',
  });

/** Full scale a test gauge may have: 1.5 to 4 times the test pressure (ASME VIII-1 UG-102). */
export const gaugeWindowPa = (testPa: number): { least: number; most: number } => ({
  least: (testPa * 15) / 10,
  most: testPa * 4,
});

/** The same, line by line. */
export function gaugeWindow(testPa: number): { least: Line; most: Line } {
  const line = (label: string, symbol: string, times: number): Line =>
    work({
      result: [symbol, label, 'pressure'],
      formula: `${String(times)}·{P_t}`,
      terms: { P_t: ['Test pressure', 'pressure', testPa] },
      compute: ({ P_t }) => times * P_t,
      source: 'gauge-window',
      holds: 'Dial gauge used for the test',
    });
  return {
    least: line('Least full scale of the test gauge', 'S_least', 1.5),
    most: line('Most full scale of the test gauge', 'S_most', 4),
  };
}

/** Whether the boiler's own gauge must come off before a test to this pressure. */
export const mustGaugeComeOff = (testPa: number, fullScalePa: number): boolean => testPa > fullScalePa;

/** Energy of compressed air at a test pressure. */
export const airEnergy = (testPa: number, volumeL: number): Line =>
  work({
    result: ['E_air', 'Energy if it were filled with air', 'energy'],
    formula: '2.5·{P_t}·{V}·(1 − ({P_0} / {P_t})^0.286)',
    terms: {
      P_t: ['Test pressure', 'absolutePressure', testPa + atmospherePa],
      V: ['Volume', 'volume', volumeL],
      P_0: ['Atmosphere', 'absolutePressure', atmospherePa],
    },
    compute: ({ P_t, V, P_0 }) => 2.5 * P_t * (V / 1_000) * (1 - (P_0 / P_t) ** 0.286),
    source: 'stored-gas',
    holds: 'Air or nitrogen, cold. Never test with compressed air',
  });

const waterBulkPa = 2.2e9;

/** Energy of water at a test pressure: a small matter beside air. */
export const waterEnergy = (testPa: number, volumeL: number): Line =>
  work({
    result: ['E_water', 'Energy when filled with water', 'energy'],
    formula: '{P}²·{V} / (2·{K})',
    terms: {
      P: ['Test pressure', 'pressure', testPa],
      V: ['Volume', 'volume', volumeL],
      K: ['Bulk modulus of water', 'stress', waterBulkPa],
    },
    compute: ({ P, V, K }) => (P ** 2 * (V / 1_000)) / (2 * K),
    source: 'stored-water',
    holds: 'Water alone, without the stretch of the shell',
  });

/** Share of hot water that flashes to steam when a boiler is let down to the open air at once. */
export function flashShare(pressurePa: number): Answer {
  if (!(pressurePa >= 0 && pressurePa <= 16e6)) return outOfRange('Worked out from 0 to 160 bar gauge.');
  const hot = saturatedAt(pressurePa);
  const open = saturatedAt(0);
  return work({
    result: ['x', 'Share of the water that flashes to steam', 'ratio'],
    formula: '({h_f} − {h_0}) / {h_fg}',
    terms: {
      h_f: ['Heat of the water at pressure', 'enthalpy', hot.water.enthalpy],
      h_0: ['Heat of water at 1 atmosphere', 'enthalpy', open.water.enthalpy],
      h_fg: ['Heat to turn it to steam there', 'enthalpy', open.steam.enthalpy - open.water.enthalpy],
    },
    compute: ({ h_f, h_0, h_fg }) => (h_f - h_0) / h_fg,
    source: 'flash-steam',
    holds: 'Water at saturation, let down to 1 atmosphere',
  });
}

/** Work of a kilogram of water at saturation let down to the open air, kJ: what a burst shell lets go. */
export function burstWork(pressurePa: number): Answer {
  if (!(pressurePa > 0 && pressurePa <= 16e6)) return outOfRange('Worked out up to 160 bar gauge.');
  const hot = saturatedAt(pressurePa).water;
  const open = saturatedAt(0);
  const dry = (hot.entropy - open.water.entropy) / (open.steam.entropy - open.water.entropy);
  return work({
    result: ['w', 'Work of a kilogram of the hot water', 'enthalpy'],
    formula: '{u_1} − (1 − {x})·{u_0} − {x}·{u_s}',
    terms: {
      u_1: ['Internal energy of the water at pressure', 'enthalpy', hot.internalEnergy],
      x: ['Dryness after it, by equal entropy', 'ratio', dry],
      u_0: ['Internal energy of water at 1 atmosphere', 'enthalpy', open.water.internalEnergy],
      u_s: ['Internal energy of steam at 1 atmosphere', 'enthalpy', open.steam.internalEnergy],
    },
    compute: ({ u_1, x, u_0, u_s }) => u_1 - (1 - x) * u_0 - x * u_s,
    source: 'flash-steam',
    holds: 'Water at saturation, let down to 1 atmosphere without loss',
  });
}
