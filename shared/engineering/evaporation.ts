import type { FiringId } from '../boilers/boiler.ts';
import { saturatedAt, waterAt } from './steam.ts';
import { atmospherePa } from './steam.ts';
import { measureIt, outOfRange, work } from './working.ts';
import type { Line, Refusal } from './working.ts';

/** A figure nobody measured, as a band. */
export interface Band {
  low: number;
  high: number;
}

/** Steam made for each square metre of heating surface, kg/h. */
export const steamingRates: Readonly<Partial<Record<FiringId, Band>>> = {
  spirit: { low: 11, high: 15 },
  gas: { low: 15, high: 30 },
  coal: { low: 23, high: 46 },
};

/** A band as two lines, least and most. */
export interface BandLines {
  low: Line;
  high: Line;
}

const bandLines = (make: (word: 'Least' | 'Most', end: 'low' | 'high') => Line): BandLines => ({
  low: make('Least', 'low'),
  high: make('Most', 'high'),
});

export const bandOf = ({ low, high }: BandLines): Band => ({
  low: low.result.value,
  high: high.result.value,
});

/** Steam made, by heating surface and firing. Refused for a firing with no rate, or where the surface is not known. */
export function evaporationBySurface(firing: FiringId, surfaceM2: number | null): BandLines | Refusal {
  const rates = steamingRates[firing];
  if (rates === undefined)
    return measureIt(
      'There is no rate for this firing: time the feed in a steam test, or give the heat input.',
    );
  if (surfaceM2 === null) return measureIt('Measure the heating surface, or time the feed in a steam test.');
  return bandLines((word, end) =>
    work({
      result: [`W_${end}`, `${word} steam made`, 'massRate'],
      formula: '{H}·{r}',
      terms: {
        H: ['Heating surface', 'surface', surfaceM2],
        r: [`${word} rate for this firing`, 'steamingRate', rates[end]],
      },
      compute: ({ H, r }) => H * r,
      source: 'steaming-rate',
      holds: 'Small boilers, clean, fired as usual; coal from natural draught to strong blast',
    }),
  );
}

/** Share of the fire's heat that a small boiler takes up; common practice. */
export const boilerEfficiency: Band = { low: 50, high: 70 };

const feedHeat = (feedK: number, pressurePa: number): number =>
  waterAt(feedK, pressurePa + atmospherePa).enthalpy;

/** Steam made, by the heat of the fire and what each kilogram takes. */
export function evaporationByHeat(of: {
  heatKw: number;
  pressurePa: number;
  feedK: number;
  efficiencyPercent?: Band;
}): BandLines | Refusal {
  const { temperatureK, steam } = saturatedAt(of.pressurePa);
  if (!(of.feedK >= 273.15 && of.feedK < temperatureK))
    return outOfRange('The feed must be water: above freezing, and cooler than the steam.');
  const efficiency = of.efficiencyPercent ?? boilerEfficiency;
  return bandLines((word, end) =>
    work({
      result: [`W_${end}`, `${word} steam made`, 'massRate'],
      formula: '{Q}·{η} / ({h_g} − {h_w})',
      terms: {
        Q: ['Heat of the fire', 'power', of.heatKw],
        η: [`${word} share the boiler takes up`, 'percent', efficiency[end]],
        h_g: ['Heat of the steam', 'enthalpy', steam.enthalpy],
        h_w: ['Heat of the feed', 'enthalpy', feedHeat(of.feedK, of.pressurePa)],
      },
      compute: ({ Q, η, h_g, h_w }) => (Q * (η / 100) * 3_600) / (h_g - h_w),
      source: 'heat-balance',
      holds: 'Dry steam; 50 to 70 % taken up is common practice for small boilers',
    }),
  );
}

/** How much more heat this steam takes than water boiled off at 100 °C. */
export const factorOfEvaporation = (pressurePa: number, feedK: number): Line => {
  const open = saturatedAt(0);
  return work({
    result: ['f', 'Factor of evaporation', 'ratio'],
    formula: '({h_g} − {h_w}) / {h_0}',
    terms: {
      h_g: ['Heat of the steam', 'enthalpy', saturatedAt(pressurePa).steam.enthalpy],
      h_w: ['Heat of the feed', 'enthalpy', feedHeat(feedK, pressurePa)],
      h_0: ['Heat to boil off at 100 °C', 'enthalpy', open.steam.enthalpy - open.water.enthalpy],
    },
    compute: ({ h_g, h_w, h_0 }) => (h_g - h_w) / h_0,
    source: 'heat-balance',
    holds: 'Dry steam',
  });
};

/** Heat a boiler must take up to make steam at a rate. */
export const heatToMake = (of: { steamKgPerH: number; pressurePa: number; feedK: number }): Line =>
  work({
    result: ['Q', 'Heat taken up', 'power'],
    formula: '{W}·({h_g} − {h_w})',
    terms: {
      W: ['Steam made', 'massRate', of.steamKgPerH],
      h_g: ['Heat of the steam', 'enthalpy', saturatedAt(of.pressurePa).steam.enthalpy],
      h_w: ['Heat of the feed', 'enthalpy', feedHeat(of.feedK, of.pressurePa)],
    },
    compute: ({ W, h_g, h_w }) => (W * (h_g - h_w)) / 3_600,
    source: 'heat-balance',
    holds: 'Dry steam',
  });
