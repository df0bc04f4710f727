import type { Units } from '#shared/accounts/contract.ts';
import {
  kgPerPound,
  kmPerMile,
  litresPerPint,
  mmPerInch,
  paPerBar,
  paPerPsi,
} from '#shared/engineering/units.ts';
import type { Money } from '#shared/money.ts';

const locale = 'en-GB';

export const formatMoney = ({ minor, currency }: Money): string =>
  new Intl.NumberFormat(locale, {
    style: 'currency',
    currency,
    ...(minor % 100 === 0 ? { minimumFractionDigits: 0 } : {}),
  }).format(minor / 100);

/** Money in a column that adds up: pence always, so that the figures stand under one another. */
export const formatSum = ({ minor, currency }: Money): string =>
  new Intl.NumberFormat(locale, { style: 'currency', currency }).format(minor / 100);

export const formatPence = (minor: number): string => formatMoney({ minor, currency: 'GBP' });

/** A band of money; one figure where both ends are the same. */
export const formatBand = (lowMinor: number, highMinor: number): string =>
  lowMinor === highMinor ? formatPence(lowMinor) : `${formatPence(lowMinor)}–${formatPence(highMinor)}`;

export const formatNumber = (value: number, digits = 0): string =>
  new Intl.NumberFormat(locale, { maximumFractionDigits: digits }).format(value);

const read = (text: string): Date => new Date(text.length === 10 ? `${text}T12:00:00` : text);

export const formatDay = (day: string): string =>
  new Intl.DateTimeFormat(locale, { day: 'numeric', month: 'long', year: 'numeric' }).format(read(day));

export const formatInstant = (at: string): string =>
  new Intl.DateTimeFormat(locale, {
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
  }).format(read(at));

/** A year, a month or a day, as far as it is known. */
export function formatRough(when: string): string {
  if (when.length === 4) return when;
  if (when.length === 7)
    return new Intl.DateTimeFormat(locale, { month: 'long', year: 'numeric' }).format(read(`${when}-15`));
  return formatDay(when);
}

/** How far off an instant is, in words: "in 2 days", "3 hours ago". */
export function formatFromNow(at: string, now: Date = new Date()): string {
  const minutes = Math.round((read(at).getTime() - now.getTime()) / 60_000);
  const words = new Intl.RelativeTimeFormat(locale, { numeric: 'auto' });
  if (Math.abs(minutes) < 60) return words.format(minutes, 'minute');
  if (Math.abs(minutes) < 48 * 60) return words.format(Math.round(minutes / 60), 'hour');
  return words.format(Math.round(minutes / 1_440), 'day');
}

const factors = {
  pressure: {
    imperial: { per: paPerPsi, unit: 'psi', digits: 0 },
    metric: { per: paPerBar, unit: 'bar', digits: 2 },
  },
  length: { imperial: { per: mmPerInch, unit: 'in', digits: 3 }, metric: { per: 1, unit: 'mm', digits: 1 } },
  volume: {
    imperial: { per: litresPerPint, unit: 'pints', digits: 2 },
    metric: { per: 1, unit: 'litres', digits: 2 },
  },
  mass: { imperial: { per: kgPerPound, unit: 'lb', digits: 1 }, metric: { per: 1, unit: 'kg', digits: 1 } },
  distance: {
    imperial: { per: kmPerMile, unit: 'miles', digits: 0 },
    metric: { per: 1, unit: 'km', digits: 0 },
  },
} as const;
/** pressure in Pa, length in mm, volume in litres, mass in kg, distance in km. */
export type Quantity = keyof typeof factors;

export const unitOf = (quantity: Quantity, units: Units): string => factors[quantity][units].unit;
export const fromSi = (quantity: Quantity, units: Units, value: number): number =>
  value / factors[quantity][units].per;
export const toSi = (quantity: Quantity, units: Units, value: number): number =>
  value * factors[quantity][units].per;

/** A figure in the reader's units with its unit; a dash for none. */
export function formatQuantity(quantity: Quantity, units: Units, value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '–';
  const { digits, unit } = factors[quantity][units];
  return `${formatNumber(fromSi(quantity, units, value), digits)} ${unit}`;
}

export const formatBytes = (bytes: number): string =>
  bytes < 1_000_000
    ? `${formatNumber(Math.ceil(bytes / 1_000))} kB`
    : `${formatNumber(bytes / 1_000_000, 1)} MB`;
